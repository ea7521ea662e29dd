import { deltaE00, deltaE00Row, packLabs } from './ciede2000'
import { cellWeights, type PhotographColors } from './photograph-colors'
import { accentShade, recipeOf, type MatchShade, type ReadingKind, type Recipe } from './readings'
import { solveChoice, type Choice, type ChoiceProblem, type SolveLimit } from './solve'
import { chromaOf, type Lab } from './types'

export { READING_KINDS, type MatchShade, type ReadingKind } from './readings'

/** How many shades make a combination. */
export const PLACES = 5
/** The ΔE00 that keeps the five apart unless another is wished. */
export const DEFAULT_APART = 10

/** What the designer asks of a match. */
export interface MatchWishes {
  /** Ids of shades that must be in it; their nearness to each other does not count. */
  locked?: readonly string[]
  /** Ids of shades that must not be in it. */
  excluded?: readonly string[]
  /** Least ΔE00 between any two of the five; {@link DEFAULT_APART}. */
  apart?: number
}

/** One of the five. */
export interface MatchPlace {
  shadeId: string
  /** Of the photograph's area; the five sum to 1. */
  share: number
  /** ΔE00 within which at least 1 % of the photograph lies. */
  presence: number
  /** Mean ΔE00 to what it stands for, by area; null when it stands for nothing. */
  deltaE: number | null
  inPhotograph: boolean
  locked: boolean
}

/** Five shades for a photograph, and what is proved about them. */
export interface Match {
  kind: ReadingKind
  /** Light first. */
  places: MatchPlace[]
  /** What was minimised, in ΔE00. */
  objective: number
  lowerBound: number
  /** No other five do better under the same wishes: proved. */
  certified: boolean
  /** (objective − lowerBound) / objective; 0 when certified. */
  gap: number
  /** Mean ΔE00 by area; of the quiet reading, to the quieted photograph. */
  meanDeltaE: number
  /** The same with every shade of the line at once: the least there is. */
  leastMeanDeltaE: number
  /** The ΔE00 between any two that was really held, where the wish left no five. */
  apart: number
  /** Per cell of the photograph, the index of its place. */
  assignment: number[]
  /** The shade that the accent reading brought in. */
  accent: string | null
}

/** A reading that this photograph and this line do not give. */
export interface NoMatch {
  kind: ReadingKind
  /** Why, in words for people. */
  unavailable: string
}

/** Tells a match from a reason for none. */
export const isMatch = (result: Match | NoMatch): result is Match => 'places' in result

/** What is left of the wish to stand apart, step by step, where it leaves no five. */
export const RELAX = [1, 0.65, 0.65 ** 2, 0.65 ** 3, 0]
/** Mean presence (ΔE00) beyond which the quiet five are no longer the picture. */
const QUIET_PRESENCE = 9

/** The line against the photograph: everything a match weighs, before wishes. */
interface Sheet {
  recipe: Recipe
  shades: readonly MatchShade[]
  /** shades×cells, ΔE00. */
  distance: Float64Array
  presence: number[]
  weights: number[]
}

function drawSheet(recipe: Recipe, shades: readonly MatchShade[]): Sheet {
  const { cells } = recipe
  const m = cells.length
  const distance = new Float64Array(shades.length * m)
  const packed = packLabs(cells.map(({ lab }) => lab))
  shades.forEach(({ lab }, s) => deltaE00Row(lab, packed, distance, s * m))
  const presence = shades.map((_, s) => {
    const row = distance.subarray(s * m, (s + 1) * m)
    return quantile(row, cells, 0.01)
  })
  return { recipe, shades, distance, presence, weights: cellWeights(cells) }
}

const BUCKETS = 512

/**
 * The least of these values (≥ 0) that at least this share of the area does not exceed. Linear: one
 * histogram, and a sort of the one bucket that matters.
 */
function quantile(
  values: ArrayLike<number>,
  cells: readonly { area: number }[],
  share: number,
): number {
  const bucketOf = (value: number) => Math.min(BUCKETS - 1, Math.floor(value * 4))
  const areas = new Float64Array(BUCKETS)
  for (let i = 0; i < cells.length; i++) areas[bucketOf(values[i]!)]! += cells[i]!.area
  let bucket = 0
  let below = 0
  while (bucket < BUCKETS - 1 && below + areas[bucket]! < share - 1e-12) below += areas[bucket++]!
  const inside = cells
    .map(({ area }, i) => ({ value: values[i]!, area }))
    .filter(({ value }) => bucketOf(value) === bucket)
    .sort((a, b) => a.value - b.value)
  for (const { value, area } of inside) {
    below += area
    if (below >= share - 1e-12) return value
  }
  return inside.at(-1)!.value
}

function problemOf(
  { recipe, shades, distance, presence, weights }: Sheet,
  locked: number[],
  excluded: Set<string>,
  apart: number,
  relax: number,
): ChoiceProblem {
  const { cells, presenceWeight, reward, admits, lightnessGap } = recipe
  const m = cells.length
  const n = shades.length
  const cost = new Float64Array(distance.length)
  for (let at = 0; at < cost.length;)
    for (let i = 0; i < m; i++, at++) cost[at] = distance[at]! * weights[i]!
  const chromas = cells.map(({ lab }) => chromaOf(lab))
  const chromaLimit = quantile(chromas, cells, 0.99) + 3
  const unary = Float64Array.from(
    shades,
    ({ lab }, s) =>
      presenceWeight * presence[s]! + 0.05 * Math.max(0, chromaOf(lab) - chromaLimit) - reward(lab),
  )
  const conflicts = conflictsOf(recipe, shades, apart * relax, lightnessGap * relax)
  const out: number[] = []
  shades.forEach(({ id, lab }, s) => {
    if (excluded.has(id) || (!admits(lab) && !locked.includes(s))) out.push(s)
  })
  return { cells: m, options: n, cost, unary, conflicts, count: PLACES, locked, excluded: out }
}

function conflictsOf(
  { clash }: Recipe,
  shades: readonly MatchShade[],
  apart: number,
  gap: number,
): Uint8Array {
  const n = shades.length
  const conflicts = new Uint8Array(n * n)
  const row = new Float64Array(n)
  for (let a = 0; a < n; a++) {
    const { lab } = shades[a]!
    const unsure: number[] = []
    for (let b = a + 1; b < n; b++) {
      const other = shades[b]!.lab
      const dL = Math.abs(lab[0] - other[0])
      if (dL < gap || clash(lab, other)) conflicts[a * n + b] = conflicts[b * n + a] = 1
      // S_L never exceeds 1.75: a difference in lightness alone can settle that they are apart.
      else if (dL < 1.75 * apart) unsure.push(b)
    }
    deltaE00Row(lab, packLabs(unsure.map((b) => shades[b]!.lab)), row)
    unsure.forEach((b, index) => {
      if (row[index]! < apart) conflicts[a * n + b] = conflicts[b * n + a] = 1
    })
  }
  return conflicts
}

/** The choice under the wish to keep the five apart, given way to where it leaves none. */
function choose(
  sheet: Sheet,
  locked: number[],
  excluded: Set<string>,
  apart: number,
  limit?: SolveLimit,
): { choice: Choice; apart: number } | null {
  for (const relax of RELAX) {
    const choice = solveChoice(problemOf(sheet, locked, excluded, apart, relax), limit)
    if (choice) return { choice, apart: apart * relax }
  }
  return null
}

/**
 * The five shades of a line that are this photograph, in one reading. Exact: see `certified`.
 * `limit` bounds the time of a proof, with the clock handed in. Throws RangeError, in words for
 * people, when the wishes contradict themselves.
 */
export function matchPhotograph(
  colors: Pick<PhotographColors, 'cells'>,
  shades: readonly MatchShade[],
  kind: ReadingKind,
  wishes: MatchWishes = {},
  limit?: SolveLimit,
): Match | NoMatch {
  const { locked, excluded, apart } = checkWishes(shades, wishes)
  const none = (unavailable: string): NoMatch => ({ kind, unavailable })
  if (shades.length - excluded.size < PLACES)
    return none('Fewer than five shades are left to choose from.')
  const recipe = recipeOf(kind, colors.cells)
  if (typeof recipe === 'string') return none(recipe)
  const sheet = drawSheet(recipe, shades)

  let held = locked
  let accent: string | null = null
  if (kind === 'accent') {
    if (locked.length === PLACES)
      return none('All five places are locked, which leaves none for an accent.')
    const first = choose(sheet, locked, excluded, apart, limit)
    if (!first) return none('No five shades of this line go together here.')
    const { chosen } = first.choice
    const left = nearestOf(sheet, chosen).map(({ distance }) => distance)
    const shade = accentShade(
      colors.cells,
      left,
      shades.filter(({ id, lab }, s) => {
        if (excluded.has(id) || chosen.includes(s)) return false
        return !locked.some((lock) => deltaE00(shades[lock]!.lab, lab) < apart)
      }),
    )
    if (!shade) return none('The true reading already holds every striking colour of it.')
    held = [...locked, shades.indexOf(shade)]
    accent = shade.id
  }
  const found = choose(sheet, held, excluded, apart, limit)
  if (!found)
    return none(
      kind === 'family' || kind === 'quiet'
        ? `The line has fewer than five ${kind === 'family' ? 'shades of this family' : 'muted shades'}.`
        : 'No five shades of this line go together here.',
    )
  const match = describe(sheet, kind, found.choice, locked, found.apart, accent)
  const far = match.places.reduce((sum, { presence }) => sum + presence / PLACES, 0)
  if (kind === 'quiet' && far > QUIET_PRESENCE)
    return none('The line’s muted shades are too far from this photograph.')
  return match
}

function checkWishes(shades: readonly MatchShade[], wishes: MatchWishes) {
  const { apart = DEFAULT_APART } = wishes
  if (!(apart >= 0 && apart <= 100)) throw new RangeError('“Apart” is a ΔE00 from 0 to 100.')
  const ids = new Map(shades.map(({ id }, s) => [id, s]))
  if (ids.size < shades.length) throw new RangeError('Two shades have the same id.')
  const excluded = new Set((wishes.excluded ?? []).filter((id) => ids.has(id)))
  const locked = [...new Set(wishes.locked)].map((id) => {
    const shade = ids.get(id)
    if (shade === undefined) throw new RangeError('A locked shade is not in this line.')
    if (excluded.has(id)) throw new RangeError('A shade cannot be both locked and excluded.')
    return shade
  })
  if (locked.length > PLACES) throw new RangeError('At most five shades can be locked.')
  return { locked, excluded, apart }
}

/** Per cell, which of these shades (by position in the list) is nearest, and how near. */
function nearestOf({ recipe, distance }: Sheet, chosen: readonly number[]) {
  const m = recipe.cells.length
  return recipe.cells.map((_, i) => {
    let place = 0
    for (let c = 1; c < chosen.length; c++)
      if (distance[chosen[c]! * m + i]! < distance[chosen[place]! * m + i]!) place = c
    return { place, distance: distance[chosen[place]! * m + i]! }
  })
}

function describe(
  sheet: Sheet,
  kind: ReadingKind,
  { chosen, objective, lowerBound, certified, gap }: Choice,
  locked: readonly number[],
  apart: number,
  accent: string | null,
): Match {
  const { shades, recipe, presence } = sheet
  const order = [...chosen].sort((a, b) => shades[b]!.lab[0] - shades[a]!.lab[0] || a - b)
  const nearest = nearestOf(sheet, order)
  const area = order.map(() => 0)
  const sums = order.map(() => 0)
  nearest.forEach(({ place, distance }, i) => {
    area[place]! += recipe.cells[i]!.area
    sums[place]! += recipe.cells[i]!.area * distance
  })
  const all = nearestOf(
    sheet,
    shades.map((_, s) => s),
  )
  return {
    kind,
    places: order.map((s, place) => ({
      shadeId: shades[s]!.id,
      share: area[place]!,
      presence: presence[s]!,
      deltaE: area[place]! > 0 ? sums[place]! / area[place]! : null,
      inPhotograph: area[place]! > 0,
      locked: locked.includes(s),
    })),
    objective,
    lowerBound,
    certified,
    gap,
    meanDeltaE: sums.reduce((a, b) => a + b, 0),
    leastMeanDeltaE: all.reduce(
      (sum, { distance }, i) => sum + recipe.cells[i]!.area * distance,
      0,
    ),
    apart,
    assignment: nearest.map(({ place }) => place),
    accent,
  }
}

/** The shades nearest to a colour, nearest first. */
export function nearestShades(
  lab: Lab,
  shades: readonly MatchShade[],
  count: number,
): { shadeId: string; deltaE: number }[] {
  return shades
    .map((shade) => ({ shadeId: shade.id, deltaE: deltaE00(lab, shade.lab) }))
    .sort((a, b) => a.deltaE - b.deltaE)
    .slice(0, count)
}
