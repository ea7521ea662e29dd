import { munkres } from 'munkres'

import type { Lab } from '../color/types'
import { isCalled, suggestedApart, SUGGESTS_ANOTHER } from './check-color'
import { colorWordsIn, type ColorWord } from './color-words'
import { heardApart } from './pronounce'
import { NEAR } from './sound-distance'
import { headWords, stemOf, wordsOf } from './words'

/** An idea that lies in the heap. */
export interface LooseIdea {
  id: string
  name: string
}

/** A shade that waits for a name. */
export interface NamelessShade {
  id: string
  lab: Lab
  /** the names that stand next to it in its family */
  neighbours: readonly string[]
  /** which shades without a name stand next to it in its family */
  beside?: readonly string[]
  /** 0–1: how much of its family waits for names; a family without any goes first */
  need?: number
}

/** One idea dealt out to one shade. */
export interface Dealt {
  ideaId: string
  shadeId: string
  /** 0–1 */
  fit: number
  why: string
}

/** What came of dealing the heap. */
export interface Deal {
  dealt: Dealt[]
  /** ideas that stay in the heap, and why */
  left: { ideaId: string; why: 'no colour' | 'no shade near' | 'another suits better' }[]
  total: number
}

/** Below this an idea would speak of another colour, and stays in the heap. */
const LEAST_FIT = 0.15
/** What a family's need is worth beside a fit. */
const NEED = 0.06
/** What an idea loses that is too like the name next to it. */
const LIKE_NEIGHBOUR = 0.5

/** Whether two names would be mixed up side by side: a word shared, or nearly one sound. */
function areAlike(one: string, other: string): boolean {
  const heads = headWords(wordsOf(one)).map(stemOf)
  const shared = headWords(wordsOf(other)).some((word) => heads.includes(stemOf(word)))
  return shared || heardApart(one, other, NEAR) <= NEAR
}

/** How well a name suits a shade: by its colour words, less when a neighbour is called alike; 0–1. */
export const fitToShade = (
  name: string,
  shade: Pick<NamelessShade, 'lab' | 'neighbours'>,
): number => fitOf(name, colorWordsIn(wordsOf(name)), shade)

function fitOf(
  name: string,
  suggested: readonly ColorWord[],
  { lab, neighbours }: Pick<NamelessShade, 'lab' | 'neighbours'>,
): number {
  if (suggested.length === 0) return 0
  const best = Math.max(
    ...suggested.map(({ words, labs, weak }) => {
      const apart = suggestedApart(labs, lab)
      const fit = Math.max(0, 1 - apart / (1.5 * SUGGESTS_ANOTHER))
      // A plain colour term holds anywhere in its region, and best in its middle.
      const called = isCalled(words, lab)
      return (
        (weak ? 0.8 : 1) * (called === true ? Math.max(fit, 0.5) : called === false ? fit / 3 : fit)
      )
    }),
  )
  const alike = neighbours.some((other) => areAlike(name, other))
  return alike ? best * LIKE_NEIGHBOUR : best
}

/**
 * The fits of n ideas (rows) to m shades (columns), row-major, 0 where an idea would not go.
 * Costs n·m.
 */
export const fitMatrix = (
  ideas: readonly LooseIdea[],
  shades: readonly NamelessShade[],
): number[][] =>
  ideas.map(({ name }) => {
    const suggested = colorWordsIn(wordsOf(name))
    return shades.map((shade) => {
      const fit = fitOf(name, suggested, shade)
      return fit >= LEAST_FIT ? fit * (1 - NEED + NEED * (shade.need ?? 0)) : 0
    })
  })

/**
 * Which row goes to which column so that the sum of fits (0–1) is the largest; pairs of no fit are
 * left out. The Hungarian method; n²·m at most.
 * @source Munkres (1957), through the package munkres
 */
export function assign(fits: readonly (readonly number[])[]): [row: number, column: number][] {
  if (fits.length === 0 || fits[0]!.length === 0) return []
  const costs = fits.map((row) => row.map((fit) => 1 - fit))
  return munkres(costs)
    .filter(([row, column]) => fits[row]![column]! > 0)
    .sort(([one], [other]) => one - other)
}

type Pair = [row: number, column: number]

/** Of each two alike that stand side by side the one that fits less, as long as the other stays. */
function weakerOfAlike(
  pairs: readonly Pair[],
  fits: readonly (readonly number[])[],
  ideas: readonly LooseIdea[],
  shades: readonly NamelessShade[],
): Pair[] {
  const fitsBest = [...pairs].sort(([r, c], [row, column]) => fits[row]![column]! - fits[r]![c]!)
  const staying = new Map<string, string>()
  return fitsBest.filter(([row, column]) => {
    const { id, beside = [] } = shades[column]!
    const { name } = ideas[row]!
    const alike = beside.some((other) => {
      const standing = staying.get(other)
      return standing !== undefined && areAlike(name, standing)
    })
    if (!alike) staying.set(id, name)
    return alike
  })
}

/**
 * Deals loose ideas out to shades without a name so that all together they fit best. Ideas that call
 * no colour to mind stay in the heap, as do those that suit no shade or that others suit better.
 */
export function dealHeap(ideas: readonly LooseIdea[], shades: readonly NamelessShade[]): Deal {
  const fits = fitMatrix(ideas, shades)
  let pairs = assign(fits)
  // Two alike that would come to stand side by side: the one that fits less may not, and all is
  // dealt anew. Each turn takes pairs out for good, so that it ends.
  for (
    let worse;
    (worse = weakerOfAlike(pairs, fits, ideas, shades)).length > 0;
    pairs = assign(fits)
  )
    for (const [row, column] of worse) fits[row]![column] = 0
  const placed = new Map(pairs)
  const dealt = pairs.map(([row, column]): Dealt => {
    const { id: ideaId, name } = ideas[row]!
    const { id: shadeId, lab } = shades[column]!
    const nearest = colorWordsIn(wordsOf(name))
      .map(({ words, labs }) => ({ words, apart: suggestedApart(labs, lab) }))
      .reduce((a, b) => (a.apart <= b.apart ? a : b))
    const fit = fits[row]![column]!
    const why = `“${nearest.words}” calls to mind a colour ΔE00 ${nearest.apart.toFixed(0)} from the shade.`
    return { ideaId, shadeId, fit, why }
  })
  const left = ideas.flatMap(({ id: ideaId, name }, row): Deal['left'] => {
    if (placed.has(row)) return []
    if (colorWordsIn(wordsOf(name)).length === 0) return [{ ideaId, why: 'no colour' }]
    const suits = fits[row]!.some((fit) => fit > 0)
    return [{ ideaId, why: suits ? 'another suits better' : 'no shade near' }]
  })
  return { dealt, left, total: dealt.reduce((sum, { fit }) => sum + fit, 0) }
}
