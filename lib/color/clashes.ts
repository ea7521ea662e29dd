import { deltaE00 } from './ciede2000'
import { nearestShades } from './match'
import { NEAR_TWIN_LIMIT } from './range-study'
import type { MatchShade } from './readings'
import type { Lab } from './types'
import { pairsLost, type Vision } from './vision'

/** How two yarns stand to each other in lightness. */
export type ValueContrast = 'clear' | 'soft' | 'muddy'

/** The least |ΔL*| of a clear contrast of value, and of a soft one; under that it is muddy. */
export const VALUE_LIMITS = { clear: 20, soft: 10 } as const

/**
 * The contrast of value of two colours.
 * @source common practice of colourwork; no study stands behind the limits, and vivid colours look
 * lighter than their L*, so that a swatch decides
 */
export function valueContrast(one: Lab, other: Lab): ValueContrast {
  const deltaL = Math.abs(one[0] - other[0])
  return deltaL >= VALUE_LIMITS.clear ? 'clear' : deltaL >= VALUE_LIMITS.soft ? 'soft' : 'muddy'
}

/** Two places of a combination, as they stand to each other. */
export interface PairReading {
  /** Places counted from 0, the upper first. */
  first: number
  second: number
  deltaE: number
  /** |ΔL*|. */
  deltaL: number
  value: ValueContrast
  /** Nearer than near-twins may be. */
  twins: boolean
  /** The visions to which the two fall together. */
  lost: Vision[]
}

/** What may trouble a pair. */
export type ClashKind = 'twins' | 'muddy' | Vision

/** One trouble of one pair of places. */
export interface Clash {
  kind: ClashKind
  first: number
  second: number
}

/**
 * Every pair of the filled places, from the top. Throws RangeError when the limit (ΔE00) is not a
 * number from 0 on.
 */
export function readPairs(
  /** By place; null where it is empty. */
  five: readonly (Lab | null)[],
  twinsUnder: number = NEAR_TWIN_LIMIT,
): PairReading[] {
  if (!(twinsUnder >= 0)) throw new RangeError(`A limit of ΔE00 ${twinsUnder} says nothing.`)
  const filled = five.flatMap((lab, place) => (lab ? [{ lab, place }] : []))
  const lost = pairsLost(filled.map(({ lab }) => lab))
  return filled.flatMap((one, first) =>
    filled.slice(first + 1).map((other, at): PairReading => {
      const second = first + 1 + at
      const deltaE = deltaE00(one.lab, other.lab)
      return {
        first: one.place,
        second: other.place,
        deltaE,
        deltaL: Math.abs(one.lab[0] - other.lab[0]),
        value: valueContrast(one.lab, other.lab),
        twins: deltaE < twinsUnder,
        lost: lost
          .filter((pair) => pair.first === first && pair.second === second)
          .map(({ vision }) => vision),
      }
    }),
  )
}

/** What troubles these pairs. Twins are muddy besides, which goes without saying. */
export function clashesOf(pairs: readonly PairReading[]): Clash[] {
  return pairs.flatMap(({ first, second, twins, value, lost }) => {
    const kinds: ClashKind[] = twins ? ['twins'] : value === 'muddy' ? ['muddy', ...lost] : lost
    return kinds.map((kind) => ({ kind, first, second }))
  })
}

/** Another shade for a place, and what it would change among the five. */
export interface Neighbour {
  shadeId: string
  /** ΔE00 to the shade that stands there. */
  deltaE: number
  /** Clashes that it brings. */
  gained: Clash[]
  /** Clashes that it ends. */
  ended: Clash[]
}

const same = (one: Clash, other: Clash) =>
  one.kind === other.kind && one.first === other.first && one.second === other.second

/**
 * The shades nearest by ΔE00 to the one in a place that are not among the five, nearest first; none
 * for an empty place.
 */
export function neighboursOf(
  place: number,
  /** By place; null where it is empty. */
  five: readonly (MatchShade | null)[],
  shades: readonly MatchShade[],
  count: number,
): Neighbour[] {
  const here = five[place]
  if (!here) return []
  const others = shades.filter(({ id }) => !five.some((shade) => shade?.id === id))
  const byId = new Map(others.map((shade) => [shade.id, shade]))
  const clashesWith = (shade: MatchShade) =>
    clashesOf(readPairs(five.map((one, at) => (at === place ? shade.lab : (one?.lab ?? null)))))
  const now = clashesWith(here)
  return nearestShades(here.lab, others, count).map(({ shadeId, deltaE }) => {
    const then = clashesWith(byId.get(shadeId)!)
    return {
      shadeId,
      deltaE,
      gained: then.filter((clash) => !now.some((one) => same(one, clash))),
      ended: now.filter((clash) => !then.some((one) => same(one, clash))),
    }
  })
}
