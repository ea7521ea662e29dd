import { accentShares, type PhotographCell } from './photograph-colors'
import { deltaE00 } from './ciede2000'
import { chromaOf, hueOf, type Lab } from './types'

/** The ways one photograph is read. */
export const READING_KINDS = ['true', 'accent', 'contrast', 'family', 'quiet'] as const
/** One way of reading a photograph. */
export type ReadingKind = (typeof READING_KINDS)[number]

/** A shade as the match sees it. */
export interface MatchShade {
  id: string
  /** D65, 2° or 10° as it was measured. */
  lab: Lab
}

/** How one reading bends the match. */
export interface Recipe {
  /** What the five are to stand for: the photograph, or a quieter one. */
  cells: readonly PhotographCell[]
  presenceWeight: number
  /** Least |ΔL*| between any two, beside the ΔE00 that keeps them apart. */
  lightnessGap: number
  /** What choosing this shade is worth, in ΔE00. */
  reward: (lab: Lab) => number
  admits: (lab: Lab) => boolean
  /** Further pairs that do not go together. */
  clash: (a: Lab, b: Lab) => boolean
}

const plain = (cells: readonly PhotographCell[]): Recipe => ({
  cells,
  presenceWeight: 0.15,
  lightnessGap: 0,
  reward: () => 0,
  admits: () => true,
  clash: () => false,
})

const FAMILY_REACH = 28
/** Below this a hue is a matter of a unit of a* or b*, and no family shows. */
const HUE_SHOWS = 6

const isPaleNeutral = (lab: Lab): boolean => lab[0] >= 70 && chromaOf(lab) < 8

const hueApart = (a: number, b: number): number => {
  const apart = Math.abs(a - b) % 360
  return apart > 180 ? 360 - apart : apart
}

/**
 * The hue (degrees) most of a photograph's chroma lies about, by a Gaussian of 15°; null when it is
 * all but grey.
 */
export function huePeak(cells: readonly PhotographCell[]): number | null {
  const colored = cells.filter(({ lab }) => chromaOf(lab) >= HUE_SHOWS)
  if (colored.reduce((sum, { area }) => sum + area, 0) < 0.02) return null
  let peak = 0
  let most = -1
  for (let hue = 0; hue < 360; hue += 2) {
    let sum = 0
    for (const { lab, area } of colored)
      sum += area * chromaOf(lab) * Math.exp(-0.5 * (hueApart(hueOf(lab), hue) / 15) ** 2)
    if (sum > most) {
      most = sum
      peak = hue
    }
  }
  return peak
}

const MUTED = 30

/** The photograph as if through mist: chroma × 0.6, lightness × 0.7 about its mean. */
function quieted(cells: readonly PhotographCell[]): PhotographCell[] {
  const mean = cells.reduce((sum, { lab, area }) => sum + area * lab[0], 0)
  return cells.map(({ lab: [L, a, b], area }) => ({
    lab: [mean + 0.7 * (L - mean), 0.6 * a, 0.6 * b],
    area,
  }))
}

/**
 * The recipe of a reading of these cells, or why there is none. The accent's is the true one: what
 * it locks comes from {@link accentShade}.
 */
export function recipeOf(kind: ReadingKind, cells: readonly PhotographCell[]): Recipe | string {
  switch (kind) {
    case 'true':
    case 'accent':
      return plain(cells)
    case 'contrast':
      return {
        ...plain(cells),
        presenceWeight: 0.2,
        lightnessGap: 13,
        reward: (lab) => 0.02 * Math.abs(lab[0] - 55),
      }
    case 'family': {
      const peak = huePeak(cells)
      if (peak === null) return 'The photograph is all but grey, so it has no colour family.'
      return {
        ...plain(cells),
        lightnessGap: 8,
        admits: (lab) =>
          isPaleNeutral(lab) ||
          (chromaOf(lab) >= HUE_SHOWS && hueApart(hueOf(lab), peak) <= FAMILY_REACH),
        clash: (a, b) => isPaleNeutral(a) && isPaleNeutral(b),
      }
    }
    case 'quiet':
      return { ...plain(quieted(cells)), admits: (lab) => chromaOf(lab) <= MUTED }
  }
}

/** Least area of an accent: 0.15 %. */
const ACCENT_AREA = 0.0015
/** Below this a colour is neither vivid nor apart enough to be one. */
const ACCENT_SHOWS = 0.1
/** ΔE00 at kL = 2 beyond which a shade is another colour than the accent. */
const ACCENT_NEAR = 12

/** The area of a colour with its own lights and shadows: within about 8 ΔE00 at kL = 3. */
function extentOf({ lab: own }: PhotographCell, cells: readonly PhotographCell[]): number {
  let extent = 0
  for (const { lab, area } of cells)
    extent += area * Math.exp(-((deltaE00(own, lab, { kL: 3 }) / 8) ** 2))
  return extent
}

/**
 * The shade to lock for the accent: the nearest, hue and chroma leading (kL = 2), to the most
 * striking cell that the true five leave out. Null when they leave none, or the line has no shade
 * that comes clearly nearer.
 */
export function accentShade(
  cells: readonly PhotographCell[],
  /** Per cell, ΔE00 to the nearest of the true five. */
  left: readonly number[],
  candidates: readonly MatchShade[],
): MatchShade | null {
  const { strength, neighborhood } = accentShares(cells)
  const scores = cells.map((cell, i) => {
    const score = strength[i]! * Math.min(1, Math.max(0, left[i]! - 10) / 20)
    if (score < ACCENT_SHOWS || extentOf(cell, cells) < ACCENT_AREA) return 0
    // Of the lights and shadows of one colour, the one that most of it has.
    return score * Math.sqrt(Math.min(1, neighborhood[i]! / 0.005))
  })
  const order = cells.map((_, i) => i).filter((i) => scores[i]! > 0)
  order.sort((a, b) => scores[b]! - scores[a]! || a - b)
  for (const cell of order) {
    const { lab } = cells[cell]!
    let nearest: MatchShade | null = null
    let least = Infinity
    for (const shade of candidates) {
      const distance = deltaE00(lab, shade.lab, { kL: 2 })
      if (distance < least) {
        least = distance
        nearest = shade
      }
    }
    if (!nearest) return null
    if (least > ACCENT_NEAR) continue
    if (deltaE00(lab, nearest.lab) <= left[cell]! - 3) return nearest
  }
  return null
}
