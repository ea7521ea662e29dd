import { readFileSync } from 'node:fs'

import { dictionary } from 'cmu-pronouncing-dictionary'
import loadHighs from 'highs'

import { deltaE00 } from '@/lib/color/ciede2000'
import type { Lab } from '@/lib/color/types'
import { checkColor } from '@/lib/naming/check-color'
import { checkFiber } from '@/lib/naming/check-fiber'
import { checkLabel } from '@/lib/naming/check-label'
import { checkLine } from '@/lib/naming/check-line'
import { checkSame } from '@/lib/naming/check-same'
import { checkSound } from '@/lib/naming/check-sound'
import { checkWording } from '@/lib/naming/check-wording'
import { COLOR_THINGS } from '@/lib/naming/color-things'
import { assign, dealHeap } from '@/lib/naming/deal'
import { IDIOMS } from '@/lib/naming/idioms'
import { DEFAULT_LABEL } from '@/lib/naming/label'
import { playOnWords } from '@/lib/naming/play'
import { playLists } from '@/lib/naming/play-lists'
import { heardApart, pronounceWord } from '@/lib/naming/pronounce'
import { NEAR } from '@/lib/naming/sound-distance'
import { wordsOf } from '@/lib/naming/words'

import type { Figure } from '../lib/figures.mjs'
import { labelFont } from '@/lib/names/label-font'
import { dyedLine, seededRandom } from './line'
import { median, ms } from './measure'

const percent = (part: number, whole: number): string => `${((100 * part) / whole).toFixed(1)} %`

const fixture = <T>(name: string): T =>
  JSON.parse(
    readFileSync(new URL(`../../tests/fixtures/naming/${name}.json`, import.meta.url), 'utf8'),
  ) as T

/** Only what differs: of “new leash on life” and “new lease on life”, leash and lease. */
function coreOf(one: string, other: string): [string, string] {
  const [a, b] = [one.split(' '), other.split(' ')]
  while (a.length > 1 && b.length > 1 && a[0] === b[0]) {
    a.shift()
    b.shift()
  }
  while (a.length > 1 && b.length > 1 && a.at(-1) === b.at(-1)) {
    a.pop()
    b.pop()
  }
  return [a.join(' '), b.join(' ')]
}

function slipsOfTheEar(): Figure[] {
  const { pairs } = fixture<{ pairs: [string, string][] }>('eggcorns')
  const near = (apart: (pair: [string, string]) => number) =>
    pairs.filter((pair) => apart(pair) <= NEAR).length
  const whole = near(([one, other]) => heardApart(one, other))
  const cores = near(([one, other]) => heardApart(...coreOf(one, other)))

  const random = seededRandom(303)
  const words = Object.keys(dictionary).filter((word) => /^[a-z]{3,}$/.test(word))
  const byLength = new Map<number, string[]>()
  for (const word of words) {
    const length = pronounceWord(word).sounds[0]!.length
    byLength.set(length, byLength.get(length) ?? [])
    byLength.get(length)!.push(word)
  }
  const any = (list: string[]) => list[Math.floor(random() * list.length)]!
  const count = 2000
  let alike = 0
  for (let pair = 0; pair < count; pair++) {
    const one = any(words)
    const same = byLength.get(pronounceWord(one).sounds[0]!.length)!
    let other = any(same)
    while (other === one && same.length > 1) other = any(same)
    if (heardApart(one, other) <= NEAR) alike++
  }
  return [
    {
      what: `slips of the ear within ${NEAR} (from memory, ${pairs.length} pairs)`,
      value: `${percent(whole, pairs.length)}; only what differs: ${percent(cores, pairs.length)}`,
      bar: '≥ 90 % each',
      met: whole >= 0.9 * pairs.length && cores >= 0.9 * pairs.length,
    },
    {
      what: `random pairs of words of equal length within ${NEAR}`,
      value: `${percent(alike, count)} of ${count}`,
      bar: '< 2 %',
      met: alike < 0.02 * count,
    },
  ]
}

const TOP = 20
/** A shade so near to the one written down suits the name as well as that does. */
const AS_SUITABLE = 10

interface Wanted {
  phrase: string
  source: string
  lab: Lab
}

const rankOf = ({ phrase }: Wanted, lab: Lab, limit = TOP): number =>
  playOnWords(lab, { limit }).findIndex((play) => play.name.toLowerCase() === phrase) + 1

/** Whether another shade, of the colour of some thing near the one written down, brings it up. */
const suitsAnother = (wanted: Wanted): boolean =>
  COLOR_THINGS.some(
    ({ lab }) => deltaE00(lab, wanted.lab) <= AS_SUITABLE && rankOf(wanted, lab) > 0,
  )

/** What is asked for when it only matters whether a play is heard at all. */
const ALL_OF_THEM = 1000

/** Why a play is not found, told by what its saying and its words are; no name is given away. */
function whyMissed(wanted: Wanted): string {
  const { phrase, source, lab } = wanted
  if (!IDIOMS.some((idiom) => idiom.phrase.toLowerCase() === source.toLowerCase()))
    return 'saying unknown'
  const old = new Set(wordsOf(source))
  const known = new Set(playLists().words.map(({ text }) => text))
  if (!wordsOf(phrase).every((word) => old.has(word) || known.has(word))) return 'word unknown'
  const rank = rankOf(wanted, lab, ALL_OF_THEM)
  return rank === 0
    ? 'not heard'
    : rank <= 2 * TOP
      ? `ranked below ${TOP}`
      : `ranked below ${2 * TOP}`
}

/**
 * `heldOut` asks for half of them only, since nobody can promise the whole of a list that nothing is
 * tuned to, and prints only how many are missed, and why: what tunes the generator must not read them.
 */
function mustFind(name: string, what: string, heldOut = false): Figure {
  const { plays } = fixture<{ plays: Wanted[] }>(name)
  const here = plays.filter((wanted) => rankOf(wanted, wanted.lab) > 0)
  const near = plays.filter((wanted) => !here.includes(wanted) && suitsAnother(wanted))
  const missed = plays.filter((wanted) => !here.includes(wanted) && !near.includes(wanted))
  const whys = new Map<string, number>()
  for (const one of missed) whys.set(whyMissed(one), (whys.get(whyMissed(one)) ?? 0) + 1)
  const told = heldOut
    ? [...whys].map(([why, times]) => `${why}: ${times}`)
    : missed.map(({ phrase }) => phrase)
  return {
    what,
    value:
      `${here.length} of ${plays.length} at the shade written down` +
      (near.length ? `, ${near.length} more within ΔE00 ${AS_SUITABLE} of it` : '') +
      (missed.length ? `; missed: ${told.join(', ')}` : ''),
    bar: `${heldOut ? 'at least half' : 'every one'} in the top ${TOP} of a suitable shade`,
    met: heldOut ? plays.length > 0 && 2 * missed.length <= plays.length : missed.length === 0,
  }
}

/** How much of what somebody thought of comes up; there is more that is good than twenty. */
function thoughtOf(): Figure {
  const { plays } = fixture<{ plays: { phrase: string; thing: string }[] }>('tuned-on')
  const found = plays.filter(({ phrase, thing }) => {
    const { lab } = COLOR_THINGS.find(({ word }) => word === thing)!
    return rankOf({ phrase, source: '', lab }, lab) > 0
  })
  return {
    what: 'wordplay made up while tuning',
    value: `${found.length} of ${plays.length} in the top ${TOP} for the very colour of its word`,
    bar: 'none',
    met: true,
  }
}

const PLAY_MS = 100

function wordplay(): Figure[] {
  const line = dyedLine(60, 5)
  let most = 0
  const times: number[] = []
  for (const { lab } of line) {
    const perIdiom = new Map<string, number>()
    const count = () => {
      for (const { source } of playOnWords(lab))
        perIdiom.set(source, (perIdiom.get(source) ?? 0) + 1)
    }
    times.push(processorMs(count))
    most = Math.max(most, ...perIdiom.values())
  }
  const [first, ...later] = times
  const worst = Math.max(...later)
  return [
    { what: 'sayings', value: `${IDIOMS.length}`, bar: '≥ 500', met: IDIOMS.length >= 500 },
    mustFind('must-find', 'wordplay that must be found'),
    mustFind('held-out', 'wordplay that the tuning never saw', true),
    thoughtOf(),
    {
      what: 'results of one saying, 60 shades',
      value: `at most ${most}`,
      bar: '≤ 2',
      met: most <= 2,
    },
    {
      what: 'wordplay for one of 60 shades, after the first',
      value: `median ${ms(median(later))}, worst ${ms(worst)} of the processor; the first of a process ${ms(first!)}`,
      bar: `≤ ${PLAY_MS} ms`,
      met: worst <= PLAY_MS,
    },
  ]
}

/** The largest sum of fits by trying every way; a pair of no fit adds nothing. */
function byBruteForce(fits: number[][]): number {
  const taken = new Set<number>()
  const from = (row: number): number => {
    if (row === fits.length) return 0
    let best = from(row + 1)
    fits[row]!.forEach((fit, column) => {
      if (taken.has(column)) return
      taken.add(column)
      best = Math.max(best, fit + from(row + 1))
      taken.delete(column)
    })
    return best
  }
  return from(0)
}

const sumOf = (fits: number[][]): number =>
  assign(fits).reduce((sum, [row, column]) => sum + fits[row]![column]!, 0)

function randomFits(random: () => number, rows: number, columns: number): number[][] {
  const ties = random() < 0.3
  return Array.from({ length: rows }, () =>
    Array.from({ length: columns }, () =>
      random() < 0.3 ? 0 : ties ? Math.ceil(random() * 4) / 4 : random(),
    ),
  )
}

async function assignments(): Promise<Figure[]> {
  const random = seededRandom(77)
  const size = () => 1 + Math.floor(random() * 7)
  const instances = 300
  let differing = 0
  for (let n = 0; n < instances; n++) {
    const fits = randomFits(random, size(), size())
    if (Math.abs(sumOf(fits) - byBruteForce(fits)) > 1e-9) differing++
  }

  const solver = await loadHighs()
  const large = 10
  let apart = 0
  for (let n = 0; n < large; n++) {
    const fits = randomFits(random, 40, 60)
    const variables = fits.flatMap((row, i) =>
      row.map((fit, j) => ({ name: `x${i}_${j}`, fit, i, j })),
    )
    const limit = (of: (v: { i: number; j: number }) => boolean) =>
      `${variables
        .filter(of)
        .map(({ name }) => name)
        .join(' + ')} <= 1`
    const problem = [
      'Maximize',
      variables.map(({ name, fit }) => `${fit} ${name}`).join(' + '),
      'Subject To',
      ...fits.map((_, i) => limit((v) => v.i === i)),
      ...fits[0]!.map((_, j) => limit((v) => v.j === j)),
      'Bounds',
      ...variables.map(({ name }) => `0 <= ${name} <= 1`),
      'End',
    ].join('\n')
    const { ObjectiveValue, Status } = solver.solve(problem)
    const same = Status === 'Optimal' && Math.abs(sumOf(fits) - ObjectiveValue) < 1e-6
    if (!same) apart++
  }
  return [
    {
      what: `heaps up to 7 × 7 dealt as brute force does`,
      value: `${instances - differing} of ${instances}`,
      bar: 'every one',
      met: differing === 0,
    },
    {
      what: 'heaps of 40 × 60 dealt as HiGHS does',
      value: `${large - apart} of ${large}`,
      bar: 'every one',
      met: apart === 0,
    },
  ]
}

/**
 * What a piece of work takes of the processor, in milliseconds: what a clock would say on a machine
 * that does nothing else.
 */
function processorMs(work: () => unknown): number {
  const before = process.cpuUsage()
  work()
  const { user, system } = process.cpuUsage(before)
  return (user + system) / 1000
}

const CHECK_MS = 100
const EARLIER = 2000

function checks(): Figure[] {
  const random = seededRandom(11)
  const any = <T>(list: readonly T[]) => list[Math.floor(random() * list.length)]!
  const earlier = Array.from({ length: EARLIER }, (_, at) => ({
    name:
      at % 2
        ? any(IDIOMS).phrase
        : `${any(COLOR_THINGS).word} ${any(COLOR_THINGS).word} ${any(COLOR_THINGS).word}`,
    where: `shade ${at}`,
  }))
  const line = dyedLine(60, 3).map(({ id, lab }, at) => ({
    id,
    lab,
    number: `${at + 1}`,
    name: any(playOnWords(lab, { limit: 10 })).name,
    family: `${Math.floor(at / 8)}`,
  }))
  const others = [
    ...earlier,
    ...line.map(({ name, number }) => ({ name, where: `shade ${number}` })),
  ]
  const font = labelFont()
  const loose = Array.from({ length: 40 }, (_, at) => ({ id: `${at}`, name: any(line).name }))
  const works: [string, (name: string, lab: Lab) => unknown][] = [
    ['same or near', (name) => checkSame(name, others)],
    ['sounds like', (name) => checkSound(name, others)],
    ['another colour', checkColor],
    ['a fibre that is absent', (name) => checkFiber(name, ['wool'])],
    ['wording', checkWording],
    ['label fit', (name) => checkLabel(name, font, DEFAULT_LABEL)],
    ['across the line', () => checkLine(line)],
    [
      'deal the heap (no bar)',
      () =>
        dealHeap(
          loose,
          line.map(({ id, lab }) => ({ id, lab, neighbours: [] })),
        ),
    ],
  ]
  const figures: Figure[] = []
  for (const [what, work] of works) {
    const times: number[] = []
    for (let at = 0; at < 30; at++) {
      const shade = line[at]!
      // As if typed: a name that nothing remembers.
      times.push(processorMs(() => work(`${shade.name} ${'abcdefghij'[at % 10]}`, shade.lab)))
    }
    const [first, ...rest] = times
    const worst = Math.max(...rest)
    figures.push({
      what: `check: ${what}`,
      value: `median ${ms(median(rest))}, worst ${ms(worst)} of the processor; the first ${ms(first!)}`,
      bar: what.includes('no bar')
        ? 'none'
        : `all ≤ ${CHECK_MS} ms (60 shades, ${EARLIER} earlier names)`,
      met: what.includes('no bar') || Math.max(first!, worst) <= CHECK_MS,
    })
  }
  return figures
}

/** Names: sounds, wordplay, the heap, and how long the checks take. */
export async function benchNames(): Promise<Figure[]> {
  return [...slipsOfTheEar(), ...wordplay(), ...(await assignments()), ...checks()]
}
