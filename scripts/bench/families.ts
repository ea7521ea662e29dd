import { cutHues, isNeutral, sortFamilies } from '@/lib/color/families'
import { nameFamilies } from '@/lib/color/family-names'
import { labToOklch } from '@/lib/color/oklch'
import type { Lab } from '@/lib/color/types'

import type { Figure } from '../lib/figures.mjs'
import { dyedLine, seededRandom } from './line'
import { median, ms, timed } from './measure'

const BAR_MS = 50
const INSTANCES = 2000

/** The least spread of all ways to cut the circle between neighbours, trying each. */
function bruteForceCut(hues: readonly { h: number; weight: number }[], count: number): number {
  const sorted = [...hues].sort((a, b) => a.h - b.h)
  const line = [...sorted, ...sorted.map(({ h, weight }) => ({ h: h + 360, weight }))]
  const spread = (from: number, to: number) => {
    const arc = line.slice(from, to)
    const whole = arc.reduce((sum, { weight }) => sum + weight, 0)
    const mean = arc.reduce((sum, { h, weight }) => sum + h * weight, 0) / whole
    return arc.reduce((sum, { h, weight }) => sum + weight * (h - mean) ** 2, 0)
  }
  const cheapest = (from: number, to: number, arcs: number): number => {
    if (arcs === 1) return spread(from, to)
    let least = Infinity
    for (let cut = from + 1; cut <= to - arcs + 1; cut++) {
      least = Math.min(least, spread(from, cut) + cheapest(cut, to, arcs - 1))
    }
    return least
  }
  return Math.min(...sorted.map((_, start) => cheapest(start, start + sorted.length, count)))
}

function againstBruteForce(): Figure {
  const random = seededRandom(2026)
  let differing = 0
  for (let n = 0; n < INSTANCES; n++) {
    const size = 2 + Math.floor(random() * 9)
    const hues = Array.from({ length: size }, () => ({
      h: random() * 360,
      weight: 0.01 + random() * 0.2,
    }))
    const count = 1 + Math.floor(random() * Math.min(6, size))
    const least = bruteForceCut(hues, count)
    if (Math.abs(cutHues(hues, count).spread - least) > 1e-6 * Math.max(1, least)) differing++
  }
  return {
    what: 'families: the cut equals brute force',
    value: `${differing} of ${INSTANCES} differ`,
    bar: 'none differs',
    met: differing === 0,
  }
}

/** Weighted squared distance of hues to their best centre, the circle opened at each in turn. */
function spreadOnCircle(hues: readonly { h: number; weight: number }[]): number {
  const line = [...hues].sort((a, b) => a.h - b.h)
  let whole = 0
  let first = 0
  let second = 0
  for (const { h, weight } of line) {
    whole += weight
    first += weight * h
    second += weight * h * h
  }
  let least = Infinity
  for (const { h, weight } of line) {
    least = Math.min(least, second - (first * first) / whole)
    // The next opening lays this hue a turn further on.
    first += weight * 360
    second += weight * ((h + 360) ** 2 - h * h)
  }
  return least
}

/** How many moves of one shade to another family would spread less. */
function bettering(labs: readonly Lab[], count: number): { better: number; tried: number } {
  const hues = labs
    .map(labToOklch)
    .filter((color) => !isNeutral(color))
    .map(({ h, c }) => ({ h, weight: c }))
  const arcs = cutHues(hues, count).arcs.map((arc) => arc.map((at) => hues[at]!))
  const spreads = arcs.map(spreadOnCircle)
  let [better, tried] = [0, 0]
  arcs.forEach((arc, from) =>
    arc.forEach((moved, at) => {
      const left = arc.length > 1 ? spreadOnCircle(arc.filter((_, other) => other !== at)) : 0
      arcs.forEach((other, to) => {
        if (to === from) return
        tried++
        const joined = spreadOnCircle([...other, moved])
        if (left + joined < spreads[from]! + spreads[to]! - 1e-6) better++
      })
    }),
  )
  return { better, tried }
}

function noMoveBetters(): Figure {
  const sums = [40, 500].map((size) => {
    const runs = [1, 2, 3].map((seed) =>
      bettering(
        dyedLine(size, seed).map(({ lab }) => lab),
        8,
      ),
    )
    const sum = (key: 'better' | 'tried') => runs.reduce((total, run) => total + run[key], 0)
    return { size, better: sum('better'), tried: sum('tried') }
  })
  return {
    what: 'families: moves of one shade that would better the cut (three lines each)',
    value: sums
      .map(({ size, better, tried }) => `${size} shades: ${better} of ${tried}`)
      .join('; '),
    bar: 'none',
    met: sums.every(({ better }) => better === 0),
  }
}

async function howLong(): Promise<Figure> {
  const times: number[] = []
  for (const seed of [1, 2, 3, 4, 5]) {
    const labs = dyedLine(500, seed).map(({ lab }) => lab)
    const runs: number[] = []
    for (let run = 0; run < 9; run++) {
      const [, took] = await timed(() => {
        const families = sortFamilies(labs, null)
        return nameFamilies(
          families.map(({ neutral, members }) => ({
            neutral,
            labs: members.map((at) => labs[at]!),
          })),
        )
      })
      runs.push(took)
    }
    times.push(median(runs))
  }
  const worst = Math.max(...times)
  return {
    what: 'families: 500 shades sorted, their number chosen, named (five lines, median of nine runs)',
    value: `median ${ms(median(times))}, worst line ${ms(worst)}`,
    bar: `every line < ${BAR_MS} ms`,
    met: worst < BAR_MS,
  }
}

/** The figures of tonal families: exact, and quick. */
export async function benchFamilies(): Promise<Figure[]> {
  return [await howLong(), againstBruteForce(), noMoveBetters()]
}
