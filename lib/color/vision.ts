import { deltaE00Row, packLabs } from './ciede2000'
import { labToLinear, linearToLab, type LinearRgb } from './srgb'
import type { Lab } from './types'

/** The three ways of lacking one kind of cone: L (protan), M (deutan), S (tritan). */
export const VISIONS = ['protan', 'deutan', 'tritan'] as const
export type Vision = (typeof VISIONS)[number]

/** From this ΔE00 on, two shades are clearly apart to normal vision: what a match keeps them at. */
export const CLEARLY_APART = 10
/** Under this ΔE00, two shades fall together. Our own bar, the same as for near-twins. */
export const FALL_TOGETHER = 4

type Matrix = readonly [LinearRgb, LinearRgb, LinearRgb]

const PROTAN: Matrix = [
  [0.152286, 1.052583, -0.204868],
  [0.114503, 0.786281, 0.099216],
  [-0.003882, -0.048116, 1.051998],
]
const DEUTAN: Matrix = [
  [0.367322, 0.860646, -0.227968],
  [0.280085, 0.672501, 0.047413],
  [-0.01182, 0.04294, 0.968881],
]
// The test derives these from the cone fundamentals and the two anchor lights.
const TRITAN_TO_660: Matrix = [
  [1.013545, 0.142738, -0.156283],
  [-0.011806, 0.875586, 0.13622],
  [0.077059, 0.812072, 0.110869],
]
const TRITAN_TO_485: Matrix = [
  [0.933377, 0.200036, -0.133413],
  [0.05807, 0.825644, 0.116286],
  [-0.379035, 1.138056, 0.240979],
]
/** Across the plane of the neutral axis and the S cone's own; its red side goes with 660 nm. */
const TRITAN_SIDE: LinearRgb = [0.039597, -0.028301, -0.011296]

const dot = (row: LinearRgb, rgb: LinearRgb): number =>
  row[0] * rgb[0] + row[1] * rgb[1] + row[2] * rgb[2]

/**
 * Light as somebody without one kind of cone would know it, linear sRGB to linear sRGB, the screen's
 * range not enforced. A model of complete deficiency: milder ones lose less, and no two people see
 * the same. Machado's matrices work on linear light here, as the authors' model has it; their own
 * figures applied them to encoded values.
 * @source protan, deutan: Machado, Oliveira & Fernandes (2009) IEEE TVCG 15(6):1291–1298, severity 1
 * @source tritan: Brettel, Viénot & Mollon (1997) J. Opt. Soc. Am. A 14(10):2647–2655, with the cone
 * fundamentals of Smith & Pokorny (1975) and the white of D65 as the neutral
 */
export function seenLight(rgb: LinearRgb, vision: Vision): LinearRgb {
  const matrix = {
    protan: PROTAN,
    deutan: DEUTAN,
    tritan: dot(TRITAN_SIDE, rgb) >= 0 ? TRITAN_TO_660 : TRITAN_TO_485,
  }[vision]
  return [dot(matrix[0], rgb), dot(matrix[1], rgb), dot(matrix[2], rgb)]
}

/**
 * A Lab D65 colour as it would be seen, Lab D65 again and perhaps beyond the screen: compare it as
 * it is, draw it by `screenColor`. Sources and limits: {@link seenLight}.
 */
export const seenAs = (lab: Lab, vision: Vision): Lab =>
  linearToLab(seenLight(labToLinear(lab), vision))

/** Two shades told apart by most people that fall together for some. */
export interface LostPair {
  /** Indices of the shades given, the lower first. */
  first: number
  second: number
  vision: Vision
  /** ΔE00 to normal vision. */
  deltaE: number
  /** ΔE00 of the two as seen. */
  seenDeltaE: number
}

/** What counts as lost, both in ΔE00. */
export interface LostLimits {
  /** Least difference to normal vision; {@link CLEARLY_APART}. */
  apart?: number
  /** The difference as seen is under this; {@link FALL_TOGETHER}. */
  together?: number
}

/**
 * The pairs clearly apart to normal vision that fall together under each vision: by vision, then the
 * least seen difference first. O(n²) differences, four to a pair. Throws RangeError when a limit is
 * not a number from 0 on.
 * @source visions: {@link seenLight}; both limits are ours
 */
export function pairsLost(
  shades: readonly Lab[],
  { apart = CLEARLY_APART, together = FALL_TOGETHER }: LostLimits = {},
): LostPair[] {
  for (const limit of [apart, together]) {
    if (!(limit >= 0)) throw new RangeError(`A limit of ΔE00 ${limit} says nothing.`)
  }
  const normal = { labs: shades, packed: packLabs(shades), row: new Float64Array(shades.length) }
  const visions = VISIONS.map((vision) => {
    const labs = shades.map((lab) => seenAs(lab, vision))
    const row = new Float64Array(shades.length)
    return { vision, labs, packed: packLabs(labs), row, lost: [] as LostPair[] }
  })
  for (let first = 0; first < shades.length; first++) {
    for (const { labs, packed, row } of [normal, ...visions]) {
      deltaE00Row(labs[first]!, packed.subarray(3 * (first + 1)), row)
    }
    for (let second = first + 1; second < shades.length; second++) {
      const deltaE = normal.row[second - first - 1]!
      if (deltaE < apart) continue
      for (const { vision, row, lost } of visions) {
        const seenDeltaE = row[second - first - 1]!
        if (seenDeltaE < together) lost.push({ first, second, vision, deltaE, seenDeltaE })
      }
    }
  }
  return visions.flatMap(({ lost }) => lost.sort((one, other) => one.seenDeltaE - other.seenDeltaE))
}
