import { deltaE00 } from './ciede2000'
import { isNeutral } from './families'
import { DEFAULT_APART, PLACES, RELAX } from './match'
import { hueTurn, labToOklch, type Oklch } from './oklch'
import type { MatchShade } from './readings'

/** The ways five shades can belong together without a photograph. */
export const RELATION_KINDS = ['near', 'opposite', 'family', 'three-way'] as const
/** One of {@link RELATION_KINDS}. */
export type RelationKind = (typeof RELATION_KINDS)[number]

/** Base hues are tried in steps of so many degrees of the OKLCH hue circle. */
export const HUE_STEP = 5
/** The least L* by which each of the five is darker than the one before, where one was chosen. */
export const LIGHTNESS_STEP = 5
/** From so many degrees on, a shade is off the hue it stands for. */
export const STRAINED = 30

/** One of the five as the relation sees it. */
export interface RelatedPlace {
  shadeId: string
  /** Which of the relation's hues it stands for, from 0. */
  side: number
  /** Degrees between its OKLCH hue and the one asked of it, 0–180; null for a neutral. */
  hueOff: number | null
}

/** Five shades in a relation. */
export interface Related {
  kind: RelationKind
  /** By place, top to bottom; those that were filled are as they were. */
  places: RelatedPlace[]
  /** The OKLCH hues, 0 ≤ h < 360, one a side: the first is the base. */
  hues: number[]
  /** What was minimised: squared distances to the ideal colours, in OKLab. */
  cost: number
  /** The ΔE00 that was really held between any two, of which one was chosen. */
  apart: number
  /** A shade stands {@link STRAINED}° or more off its hue: the line, or what is filled, has no better. */
  strained: boolean
}

/** The hues of five ideal colours, light to dark: turns from the base hue, and whose side each is. */
interface Pattern {
  turns: readonly number[]
  sides: readonly number[]
}

interface Recipe {
  /** The turn of each side from the base hue. */
  sides: readonly number[]
  /** What a step of lightness counts against one of hue and chroma. */
  lightness: number
  patterns: readonly Pattern[]
}

/** Every way to give the five ranks sides, so many to each. */
function arrangements(counts: readonly number[]): number[][] {
  if (counts.every((count) => count === 0)) return [[]]
  return counts.flatMap((count, side) => {
    if (count === 0) return []
    const left = counts.map((value, at) => (at === side ? value - 1 : value))
    return arrangements(left).map((rest) => [side, ...rest])
  })
}

const sided = (turns: readonly number[], ...counts: number[][]): Pattern[] =>
  counts.flatMap(arrangements).map((sides) => ({ sides, turns: sides.map((side) => turns[side]!) }))

const ONE_SIDE = [0, 0, 0, 0, 0]
const ARC = [-30, -15, 0, 15, 30]

const RECIPES: Record<RelationKind, Recipe> = {
  near: {
    sides: [0],
    lightness: 0.7,
    // The hue turns as the shades darken, one way round or the other.
    patterns: [
      { sides: ONE_SIDE, turns: ARC },
      { sides: ONE_SIDE, turns: ARC.toReversed() },
    ],
  },
  opposite: { sides: [0, 180], lightness: 0.5, patterns: sided([0, 180], [3, 2], [4, 1]) },
  family: { sides: [0], lightness: 1, patterns: [{ sides: ONE_SIDE, turns: ONE_SIDE }] },
  'three-way': {
    sides: [0, 120, 240],
    lightness: 0.5,
    patterns: sided([0, 120, 240], [2, 2, 1], [3, 1, 1]),
  },
}

/** A difference in a or b counts twice one in L. */
const CHROMATIC = 2
/** What is left of the chroma on each rung: tints and deep shades hold less of it. */
const FULLNESS = [0.6, 0.9, 1, 0.9, 0.7]

const STEPS = 360 / HUE_STEP
const RANKS = Array.from({ length: PLACES }, (_, rank) => rank)

/** The value below which this part of the values lies, by the nearest rank. */
function quantile(values: readonly number[], part: number): number {
  const sorted = values.toSorted((a, b) => a - b)
  return sorted[Math.round(part * (sorted.length - 1))]!
}

/** A shade that may stand among the five. */
interface Candidate {
  shade: MatchShade
  /** Already in a place, and so in every five. */
  filled: boolean
  color: Oklch
}

const mean = (values: readonly number[]) => values.reduce((sum, v) => sum + v, 0) / values.length

/** rank × step × candidate: what a candidate costs as the ideal of this rank at this hue. */
function costsOf(pool: readonly Candidate[], { lightness }: Recipe): Float64Array {
  const filled = pool.filter((one) => one.filled)
  const colored = pool.filter(({ color }) => !isNeutral(color))
  const held = colored.filter((one) => one.filled).map(({ color }) => color.c)
  // What is in place says how vivid the rest should be.
  const chroma =
    held.length > 0
      ? mean(held)
      : colored.length > 0
        ? quantile(
            colored.map(({ color }) => color.c),
            0.5,
          )
        : 0
  const lights = pool.map(({ color }) => color.l)
  const heldLights = filled.map(({ color }) => color.l)
  const light = Math.max(quantile(lights, 0.9), ...heldLights)
  const dark = Math.min(quantile(lights, 0.1), ...heldLights)
  const costs = new Float64Array(PLACES * STEPS * pool.length)
  const planar = pool.map(({ color }) => polar(color.c, color.h))
  let at = 0
  for (const rank of RANKS) {
    const rung = light + ((dark - light) * rank) / (PLACES - 1)
    for (let step = 0; step < STEPS; step++) {
      const [a, b] = polar(chroma * FULLNESS[rank]!, step * HUE_STEP)
      pool.forEach(({ color }, s) => {
        const [da, db] = [planar[s]![0] - a, planar[s]![1] - b]
        costs[at++] = (lightness * (color.l - rung)) ** 2 + CHROMATIC ** 2 * (da * da + db * db)
      })
    }
  }
  return costs
}

function polar(chroma: number, hue: number): [number, number] {
  const angle = (hue * Math.PI) / 180
  return [chroma * Math.cos(angle), chroma * Math.sin(angle)]
}

/** One base hue with one pattern. */
interface Job {
  step: number
  pattern: Pattern
  /** Per rank, where its costs begin. */
  rows: readonly number[]
  /** What it costs at least. */
  bound: number
}

/** What is best so far: candidates by rank. */
interface Best {
  cost: number
  chosen: number[]
  job: Job
}

/**
 * The cheapest way down the ladder through every filled candidate, over all base hues and patterns.
 * Exact: what the rest of a ladder costs at least, with steps of lightness but without the ΔE00 that
 * keeps two apart, comes from one pass from its foot; a depth-first search under that bound does the
 * rest, and hardly turns back.
 */
class Ladder {
  private best: Best | null = null
  private readonly n: number
  /** Per candidate, the first that is a step darker, and the last that no filled one is passed for. */
  private readonly darker: Int32Array
  private readonly reach: Int32Array
  private readonly lastStart: number

  constructor(
    /** Light first. */
    private readonly pool: readonly Candidate[],
    private readonly costs: Float64Array,
    private readonly conflicts: Uint8Array,
    step: number,
  ) {
    const n = (this.n = pool.length)
    this.darker = new Int32Array(n)
    this.reach = new Int32Array(n)
    for (let s = n - 1, next = n - 1; s >= 0; s--) {
      this.reach[s] = next
      if (pool[s]!.filled) next = s
      let to = s + 1
      while (to < n && pool[s]!.shade.lab[0] - pool[to]!.shade.lab[0] < step) to++
      this.darker[s] = to
    }
    const first = pool.findIndex(({ filled }) => filled)
    this.lastStart = first < 0 ? n - 1 : first
  }

  run(patterns: readonly Pattern[]): Best | null {
    const { n } = this
    const rest = new Float64Array(PLACES * n)
    const jobs: Job[] = []
    for (const pattern of patterns)
      for (let step = 0; step < STEPS; step++) {
        const rows = pattern.turns.map(
          (turn, rank) => (rank * STEPS + ((step + turn / HUE_STEP + STEPS) % STEPS)) * n,
        )
        jobs.push({ step, pattern, rows, bound: this.bound(rows, rest) })
      }
    jobs.sort((a, b) => a.bound - b.bound)
    for (const job of jobs) {
      if (job.bound >= (this.best?.cost ?? Infinity)) break
      this.bound(job.rows, rest)
      const orders = RANKS.map((rank) =>
        Int32Array.from({ length: n }, (_, s) => s).sort(
          (a, b) => rest[rank * n + a]! - rest[rank * n + b]! || a - b,
        ),
      )
      this.climb(job, rest, orders, [], 0)
    }
    return this.best
  }

  /** Fills `rest`, per rank and candidate, with what the ladder from there down costs at least. */
  private bound(rows: readonly number[], rest: Float64Array): number {
    const { n, pool, costs, darker, reach } = this
    // The least from a candidate on, as far as no filled one is passed.
    const least = new Float64Array(n)
    for (let rank = PLACES - 1; rank >= 0; rank--) {
      const at = rank * n
      for (let s = n - 1; s >= 0; s--) {
        const next = reach[s]!
        let below = Infinity
        if (rank === PLACES - 1)
          below = next < n - 1 || (next > s && pool[next]!.filled) ? Infinity : 0
        else {
          if (darker[s]! <= next) below = least[darker[s]!]!
          if (next > s && pool[s]!.filled && pool[next]!.filled)
            below = Math.min(below, rest[at + n + next]!)
        }
        rest[at + s] = costs[rows[rank]! + s]! + below
      }
      for (let s = n - 1; s >= 0; s--)
        least[s] = Math.min(rest[at + s]!, s < n - 1 && !pool[s]!.filled ? least[s + 1]! : Infinity)
    }
    return least[0]!
  }

  private climb(
    job: Job,
    rest: Float64Array,
    orders: readonly Int32Array[],
    chosen: number[],
    spent: number,
  ): void {
    const rank = chosen.length
    if (rank === PLACES) {
      if (spent < (this.best?.cost ?? Infinity))
        this.best = { cost: spent, chosen: [...chosen], job }
      return
    }
    for (const s of orders[rank]!) {
      const bound = spent + rest[rank * this.n + s]!
      if (bound === Infinity || bound >= (this.best?.cost ?? Infinity)) return
      if (!this.follows(s, chosen)) continue
      chosen.push(s)
      this.climb(job, rest, orders, chosen, spent + this.costs[job.rows[rank]! + s]!)
      chosen.pop()
    }
  }

  /** May stand under what is chosen: a step darker, no filled one passed, apart from every one. */
  private follows(s: number, chosen: readonly number[]): boolean {
    const above = chosen.at(-1)
    if (above === undefined) return s <= this.lastStart
    const { pool, n } = this
    const bothFilled = pool[above]!.filled && pool[s]!.filled
    if (s > this.reach[above]! || (bothFilled ? s <= above : s < this.darker[above]!)) return false
    return chosen.every((one) => !this.conflicts[one * n + s])
  }
}

/** Pairs nearer than `apart`; two that are filled stand as they are. */
function conflictsOf(pool: readonly Candidate[], distances: Float64Array, apart: number) {
  const n = pool.length
  return Uint8Array.from(distances, (distance, at) => {
    const both = pool[Math.floor(at / n)]!.filled && pool[at % n]!.filled
    return !both && distance < apart ? 1 : 0
  })
}

/**
 * Fills the empty of five places by a relation of hues inside the line. Each relation describes five
 * ideal colours in OKLCH, a ladder from light to dark in even steps over the line's own range, their
 * hues turned from a base hue. The shades chosen are those that, with the ones filled already, stand
 * nearest to the ideals, rank by rank of lightness: the sum of squared distances in OKLab, a and b
 * counted twice, is the least there is over every base hue in steps of {@link HUE_STEP}° and every
 * order of the sides. No shade stands twice; each is {@link LIGHTNESS_STEP} L* darker than the one
 * before and `wish` in ΔE00 from every other, filled pairs aside, given way to as in a match where
 * that leaves no five. What is chosen goes into the empty places light first. Deterministic and
 * exact; null when the line has too few shades. Exponential at worst, milliseconds for 40 shades.
 * @throws RangeError unless there are five places
 * @source hue relations: common practice of colour teaching; a and b counted twice: color.js,
 * deltaEOK2
 */
export function completeByRelation(
  kind: RelationKind,
  /** By place; null where it is empty. They need not be of the line any more. */
  filled: readonly (MatchShade | null)[],
  shades: readonly MatchShade[],
  wish: number = DEFAULT_APART,
): Related | null {
  if (filled.length !== PLACES) throw new RangeError(`${filled.length} places are not five.`)
  const held = filled.filter((shade) => shade !== null)
  const taken = new Set(held.map(({ id }) => id))
  const free = shades.filter(({ id }) => !taken.has(id))
  if (held.length + free.length < PLACES) return null
  const candidate = (filled: boolean) => (shade: MatchShade) => ({
    shade,
    filled,
    color: labToOklch(shade.lab),
  })
  const pool = [...held.map(candidate(true)), ...free.map(candidate(false))].sort(
    (a, b) => b.shade.lab[0] - a.shade.lab[0],
  )
  const recipe = RECIPES[kind]
  const costs = costsOf(pool, recipe)
  const distances = distancesOf(pool)
  for (const relax of RELAX) {
    const conflicts = conflictsOf(pool, distances, wish * relax)
    const best = new Ladder(pool, costs, conflicts, LIGHTNESS_STEP * relax).run(recipe.patterns)
    if (best) return describe(kind, filled, pool, best, wish * relax)
  }
  return null
}

function distancesOf(pool: readonly Candidate[]): Float64Array {
  const n = pool.length
  const distances = new Float64Array(n * n)
  for (let a = 0; a < n; a++)
    for (let b = a + 1; b < n; b++)
      distances[a * n + b] = distances[b * n + a] = deltaE00(pool[a]!.shade.lab, pool[b]!.shade.lab)
  return distances
}

function describe(
  kind: RelationKind,
  filled: readonly (MatchShade | null)[],
  pool: readonly Candidate[],
  { chosen, cost, job }: Best,
  apart: number,
): Related {
  const base = job.step * HUE_STEP
  const rows = chosen.map((s, rank) => {
    const { shade, color, filled: held } = pool[s]!
    const turn = hueTurn(base + job.pattern.turns[rank]!, color.h)
    const place: RelatedPlace = {
      shadeId: shade.id,
      side: job.pattern.sides[rank]!,
      hueOff: isNeutral(color) ? null : Math.abs(turn),
    }
    return { held, place }
  })
  const added = rows.filter(({ held }) => !held).map(({ place }) => place)
  const places = filled.map((shade) =>
    shade ? rows.find(({ place }) => place.shadeId === shade.id)!.place : added.shift()!,
  )
  return {
    kind,
    places,
    hues: RECIPES[kind].sides.map((turn) => (base + turn) % 360),
    cost,
    apart,
    strained: places.some(({ hueOff }) => hueOff !== null && hueOff >= STRAINED),
  }
}
