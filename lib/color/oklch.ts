import {
  converter,
  modeLab65,
  modeLrgb,
  modeOklab,
  modeOklch,
  modeRgb,
  modeXyz65,
  useMode as registerMode,
} from 'culori/fn'
import type { Lab } from './types'

// culori/fn rather than culori, so that only these spaces reach the browser.
for (const mode of [modeRgb, modeLrgb, modeXyz65, modeLab65, modeOklab, modeOklch]) {
  registerMode(mode as Parameters<typeof registerMode>[0])
}
const convert = converter('oklch')

/** A colour in OKLCH: l 0–1, c from 0 to about 0.37, h in degrees 0–360 (0 for a neutral). */
export interface Oklch {
  l: number
  c: number
  h: number
}

/**
 * Lab D65 as OKLCH. A 10° reading goes through as it is, relative to its own white: for sorting and
 * naming, never for measuring.
 * @source B. Ottosson, “A perceptual color space for image processing” (2020), by culori
 */
export function labToOklch([l, a, b]: Lab): Oklch {
  const color = convert({ mode: 'lab65', l, a, b } as const)
  return { l: color.l, c: color.c, h: color.h ?? 0 }
}

/** How far it is from one hue to another the shorter way, in degrees: −180 ≤ turn < 180. */
export const hueTurn = (from: number, to: number): number =>
  ((((to - from + 180) % 360) + 360) % 360) - 180
