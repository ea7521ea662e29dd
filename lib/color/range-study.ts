import { deltaE00Row, packLabs } from './ciede2000'
import type { Lab } from './types'

/** Under this ΔE00 two shades are near-twins: side by side in one line they compete. Our own bar. */
export const NEAR_TWIN_LIMIT = 4

/** Two shades of a line that are hard to tell apart. */
export interface NearTwins {
  /** Indices of the shades given, the lower first. */
  first: number
  second: number
  /** ΔE00. */
  deltaE: number
}

/**
 * Every pair under a limit of ΔE00, the nearest pair first. O(n²) differences. Throws RangeError when
 * the limit is not a number from 0 on.
 * @source CIEDE2000 (CIE 142-2001); the default limit is ours
 */
export function nearTwins(shades: readonly Lab[], limit = NEAR_TWIN_LIMIT): NearTwins[] {
  if (!(limit >= 0)) throw new RangeError(`A limit of ΔE00 ${limit} says nothing.`)
  const packed = packLabs(shades)
  const row = new Float64Array(shades.length)
  const twins: NearTwins[] = []
  for (let first = 0; first < shades.length; first++) {
    deltaE00Row(shades[first]!, packed.subarray(3 * (first + 1)), row)
    for (let second = first + 1; second < shades.length; second++) {
      const deltaE = row[second - first - 1]!
      if (deltaE < limit) twins.push({ first, second, deltaE })
    }
  }
  return twins.sort((one, other) => one.deltaE - other.deltaE)
}

/** How the L* of some shades step down from light to dark. */
export interface LightnessLadder {
  /** Indices of the shades given, light first; equal ones as they were given. */
  order: number[]
  /** L* of the lightest less that of the darkest; 0 for fewer than two. */
  span: number
  /** From rung `above` of `order` to the next, the widest step in L*; null for fewer than two. */
  widest: { above: number; step: number } | null
  /**
   * 1 when all steps are equal, 0 when one step is the whole ladder; null for fewer than three
   * shades, or when all are equally light.
   */
  evenness: number | null
}

/**
 * The lightness ladder of a family. With m steps of shares pᵢ of the span, its evenness is
 * 1 − ½ Σ |pᵢ − 1/m| / (1 − 1/m): what of the span would have to move from step to step for all to
 * be equal, over the most there could be, taken from 1.
 * @source the index of concentration of Hoover (1936) Rev. Econ. Stat. 18(4):162–171, scaled to
 * 0–1; its use for steps of L* is ours
 */
export function lightnessLadder(shades: readonly Lab[]): LightnessLadder {
  const order = shades.map((_, index) => index)
  order.sort((one, other) => shades[other]![0] - shades[one]![0])
  const steps = order.slice(1).map((at, rung) => shades[order[rung]!]![0] - shades[at]![0])
  const span = steps.reduce((sum, step) => sum + step, 0)
  const even = 1 / steps.length
  const moved = steps.reduce((sum, step) => sum + Math.abs(step / span - even), 0) / 2
  const above = steps.indexOf(Math.max(...steps))
  return {
    order,
    span,
    widest: steps.length > 0 ? { above, step: steps[above]! } : null,
    evenness: steps.length > 1 && span > 0 ? Math.max(0, 1 - moved / (1 - even)) : null,
  }
}
