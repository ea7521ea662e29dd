import type { Lab } from './types'

/** Parametric factors of CIEDE2000; 1 each under reference conditions. */
export interface Ciede2000Factors {
  /** 2 in textile practice: lightness counts half, hue and chroma lead. */
  kL?: number
  kC?: number
  kH?: number
}

const DEGREE = Math.PI / 180
const POW_25_7 = 25 ** 7
const COS_30 = Math.cos(30 * DEGREE)
const SIN_30 = Math.sin(30 * DEGREE)
const COS_6 = Math.cos(6 * DEGREE)
const SIN_6 = Math.sin(6 * DEGREE)
const COS_63 = Math.cos(63 * DEGREE)
const SIN_63 = Math.sin(63 * DEGREE)
const COS_275 = Math.cos(275 * DEGREE)
const SIN_275 = Math.sin(275 * DEGREE)
const COS_125 = Math.cos(125 * DEGREE)

const pow7OverSum = (chroma: number): number => {
  const c2 = chroma * chroma
  const c7 = c2 * c2 * c2 * chroma
  return Math.sqrt(c7 / (c7 + POW_25_7))
}

const hueOf = (x: number, y: number): number => {
  const angle = Math.atan2(y, x)
  return angle < 0 ? angle + 2 * Math.PI : angle
}

/** Colours side by side, n×3 row-major L*, a*, b*, as {@link deltaE00Row} takes them. */
export function packLabs(labs: readonly Lab[]): Float64Array {
  const packed = new Float64Array(labs.length * 3)
  labs.forEach((lab, index) => packed.set(lab, index * 3))
  return packed
}

/**
 * CIEDE2000 colour differences from one colour to each of n, all relative to the same white, into
 * `out` from `offset` on. Symmetric, ≥ 0. A row at a time because calls with numbers are what costs:
 * one match takes some hundred thousand differences.
 * @source CIE 142-2001; Sharma, Wu & Dalal (2005) Color Res. Appl. 30(1):21–30, eqs 2–22
 */
export function deltaE00Row(
  from: Lab,
  to: Float64Array,
  out: Float64Array,
  offset = 0,
  { kL = 1, kC = 1, kH = 1 }: Ciede2000Factors = {},
): void {
  const [L1, a1, b1] = from
  const chroma1 = Math.sqrt(a1 * a1 + b1 * b1)
  for (let next = 0, at = offset; next < to.length; next += 3, at++) {
    const L2 = to[next]!
    const a2 = to[next + 1]!
    const b2 = to[next + 2]!
    const G = pow7OverSum((chroma1 + Math.sqrt(a2 * a2 + b2 * b2)) / 2)
    const stretch = 1 + 0.5 * (1 - G)
    const x1 = a1 * stretch
    const x2 = a2 * stretch
    const C1 = Math.sqrt(x1 * x1 + b1 * b1)
    const C2 = Math.sqrt(x2 * x2 + b2 * b2)
    const meanC = (C1 + C2) / 2
    const meanL50 = (L1 + L2) / 2 - 50
    const meanL50Squared = meanL50 * meanL50
    const dL = (L2 - L1) / (kL * (1 + (0.015 * meanL50Squared) / Math.sqrt(20 + meanL50Squared)))
    const dC = (C2 - C1) / (kC * (1 + 0.045 * meanC))
    // With a neutral on either side there is no hue difference, whatever the other's hue.
    if (C1 * C2 === 0) {
      out[at] = Math.sqrt(dL * dL + dC * dC)
      continue
    }

    // Hue as unit vectors: their sum points along the mean hue of the shorter way round and their
    // difference is 2 sin(Δh/2), so that most pairs need no trigonometry at all.
    const per1 = 1 / C1
    const per2 = 1 / C2
    const ux1 = x1 * per1
    const uy1 = b1 * per1
    const ux2 = x2 * per2
    const uy2 = b2 * per2
    let c = ux1 + ux2
    let s = uy1 + uy2
    const length = Math.sqrt(c * c + s * s)
    if (length > 1e-7) {
      const per = 1 / length
      c *= per
      s *= per
    } else {
      // Opposite hues have no shorter way: the standard takes the half of h₁ + h₂, each 0–360°.
      const mean = (hueOf(x1, b1) + hueOf(x2, b2)) / 2
      c = Math.cos(mean)
      s = Math.sin(mean)
    }
    const vx = ux2 - ux1
    const vy = uy2 - uy1

    // The cosines of the multiples of the mean hue, from one cosine and one sine.
    const c2 = c * c - s * s
    const s2 = 2 * s * c
    const c3 = c2 * c - s2 * s
    const s3 = s2 * c + c2 * s
    const c4 = c2 * c2 - s2 * s2
    const s4 = 2 * s2 * c2
    const T =
      1 -
      0.17 * (c * COS_30 + s * SIN_30) +
      0.24 * c2 +
      0.32 * (c3 * COS_6 - s3 * SIN_6) -
      0.2 * (c4 * COS_63 + s4 * SIN_63)
    const SH = kH * (1 + 0.015 * meanC * T)
    const dH2 = (C1 * C2 * (vx * vx + vy * vy)) / (SH * SH)
    // Only blues turn the ellipse: 125° and more away from hue 275° the term is below 1e-10.
    let turned = 0
    if (c * COS_275 + s * SIN_275 > COS_125) {
      const blue = (hueOf(c, s) / DEGREE - 275) / 25
      const RT = -2 * pow7OverSum(meanC) * Math.sin(60 * DEGREE * Math.exp(-blue * blue))
      turned = RT * dC * (ux1 * uy2 - uy1 * ux2 < 0 ? -Math.sqrt(dH2) : Math.sqrt(dH2))
    }
    out[at] = Math.sqrt(Math.max(0, dL * dL + dC * dC + dH2 + turned))
  }
}

const oneLab = new Float64Array(3)
const oneOut = new Float64Array(1)

/**
 * CIEDE2000 colour difference of two Lab colours of the same white. Symmetric, ≥ 0.
 * @source CIE 142-2001; Sharma, Wu & Dalal (2005) Color Res. Appl. 30(1):21–30
 */
export function deltaE00(from: Lab, to: Lab, factors?: Ciede2000Factors): number {
  oneLab.set(to)
  deltaE00Row(from, oneLab, oneOut, 0, factors)
  return oneOut[0]!
}
