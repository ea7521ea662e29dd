import { BASIC_TERMS, type BasicTerm, type BasicTermName } from './basic-terms'
import { meanHue } from './families'
import { hueTurn, labToOklch, type Oklch } from './oklch'
import type { Lab } from './types'

const TERMS = Object.entries(BASIC_TERMS) as [BasicTermName, BasicTerm][]

/** How far a value lies from the middle of a range, 1 at either end of it. */
const offMiddle = (value: number, [low, middle, high]: BasicTerm['hue']): number =>
  value < middle ? (middle - value) / (middle - low) : (value - middle) / (high - middle)

/**
 * What people would call a colour that is not neutral: the term whose hue, lightness and chroma it
 * lies nearest to, each measured by how far the term reaches on that side. Brown stands apart from
 * orange and yellow, and pink from red and purple, by lightness and chroma as well as by hue.
 */
export function termOf({ l, c, h }: Oklch): BasicTermName {
  let nearest: { name: BasicTermName; distance: number } | null = null
  for (const [name, { hue, lightness, chroma }] of TERMS) {
    const distance = Math.hypot(
      offMiddle(hue[1] + hueTurn(hue[1], h), hue),
      offMiddle(l, lightness),
      offMiddle(c, chroma),
    )
    if (!nearest || distance < nearest.distance) nearest = { name, distance }
  }
  return nearest!.name
}

/** A family to be named. */
export interface NamedColors {
  neutral: boolean
  /** At least one. */
  labs: readonly Lab[]
}

/** A second term is named too from this share of the family's chroma on. */
const SECOND_SHARE = 1 / 3

/**
 * What a family is called: "Blues", or "Oranges and browns". As in the cut of the hues, a vivid
 * shade counts for more than a pale one.
 */
function plainName(colors: readonly Oklch[]): string {
  const shares = new Map<BasicTermName, number>()
  for (const color of colors) {
    const term = termOf(color)
    shares.set(term, (shares.get(term) ?? 0) + color.c)
  }
  // Of equal shares the term that stands first in the table, so that a name is the same every time.
  const order = TERMS.map(([name]) => name).filter((name) => shares.has(name))
  const [first, second] = order.sort((a, b) => shares.get(b)! - shares.get(a)!)
  const whole = colors.reduce((sum, { c }) => sum + c, 0)
  const named = second && shares.get(second)! > whole * SECOND_SHARE
  return named ? `${capital(first!)}s and ${second}s` : `${capital(first!)}s`
}

const capital = (word: string) => word.charAt(0).toUpperCase() + word.slice(1)
const small = (word: string) => word.charAt(0).toLowerCase() + word.slice(1)

/** Steps of lightness, chroma and hue (degrees) that tell families apart about equally well. */
const STEPS = { lightness: 0.08, chroma: 0.04, hue: 15 } as const

/** A way to say how a family differs from others of the same plain name. */
interface Difference {
  word: string
  /** How far it goes, in STEPS. */
  by: number
}

/** The hue terms round the circle, for what a family leans to. */
const LEANS: readonly (readonly [hue: number, word: string])[] = [
  [21.3, 'red'],
  [53, 'orange'],
  [99.4, 'yellow'],
  [145.7, 'green'],
  [250.1, 'blue'],
  [318.8, 'purple'],
]

/** The hue term next to a hue on one side that is another than the family's own. */
function leanOf(hue: number, side: number, own: string): string | null {
  const ahead = LEANS.filter(([, word]) => !own.includes(word))
    .map(([at, word]) => ({ word, turn: (((side * (at - hue)) % 360) + 360) % 360 }))
    .sort((a, b) => a.turn - b.turn)[0]
  return ahead && ahead.turn < 120 ? capital(ahead.word) : null
}

interface Middle {
  lightness: number
  chroma: number
  hue: number | null
}

const mean = (values: readonly number[]) => values.reduce((a, b) => a + b, 0) / values.length

const middleOf = (colors: readonly Oklch[]): Middle => ({
  lightness: mean(colors.map(({ l }) => l)),
  chroma: mean(colors.map(({ c }) => c)),
  hue: meanHue(colors),
})

/** How one family differs from the middle of all that share its plain name, clearest first. */
function differences(own: Middle, all: Middle, plain: string, neutral: boolean): Difference[] {
  const lightness = (own.lightness - all.lightness) / STEPS.lightness
  const chroma = (own.chroma - all.chroma) / STEPS.chroma
  const said = [
    { word: `${lightness > 0 ? 'Pale' : 'Deep'} ${small(plain)}`, by: Math.abs(lightness) },
    { word: `${chroma > 0 ? 'Bright' : 'Soft'} ${small(plain)}`, by: Math.abs(chroma) },
  ]
  if (own.hue !== null && all.hue !== null && !neutral) {
    const turn = hueTurn(all.hue, own.hue) / STEPS.hue
    const lean = leanOf(own.hue, Math.sign(turn), plain.toLowerCase())
    if (lean) said.push({ word: `${lean}-${small(plain)}`, by: Math.abs(turn) })
  }
  return said.sort((a, b) => b.by - a.by)
}

/**
 * Names for the families of a line from their colours, no two alike: what most of their colour is
 * called, and where two would be called the same, what sets them apart most ("Deep blues",
 * "Yellow-greens").
 * @param taken names that other families of the line have, in any case
 * @throws RangeError for a family without colours
 */
export function nameFamilies(
  families: readonly NamedColors[],
  taken: readonly string[] = [],
): string[] {
  const used = new Set(taken.map((name) => name.toLowerCase()))
  const free = (name: string) => !used.has(name.toLowerCase())
  const names = new Map<number, string>()
  const give = (at: number, name: string) => {
    names.set(at, name)
    used.add(name.toLowerCase())
  }
  const colors = families.map(({ labs }) => labs.map(labToOklch))
  const empty = colors.findIndex((list) => list.length === 0)
  if (empty >= 0) throw new RangeError(`Family ${empty} has no colours to be named by.`)
  const plain = families.map(({ neutral }, at) => (neutral ? 'Neutrals' : plainName(colors[at]!)))

  for (const name of new Set(plain)) {
    const alike = plain.flatMap((other, at) => (other === name ? [at] : []))
    if (alike.length === 1 && free(name)) {
      give(alike[0]!, name)
      continue
    }
    const all = middleOf(alike.flatMap((at) => colors[at]!))
    const offers = alike
      .flatMap((at) =>
        differences(middleOf(colors[at]!), all, name, families[at]!.neutral).map((said) => ({
          at,
          ...said,
        })),
      )
      .sort((a, b) => b.by - a.by || a.at - b.at)
    for (const { at, word, by } of offers) {
      // What hardly differs is no help to tell them apart.
      if (by >= 0.5 && !names.has(at) && free(word)) give(at, word)
    }
    for (const at of alike) {
      if (names.has(at)) continue
      let number = 1
      const next = () => (number === 1 ? name : `${name} ${number}`)
      while (!free(next())) number++
      give(at, next())
    }
  }
  return families.map((_, at) => names.get(at)!)
}
