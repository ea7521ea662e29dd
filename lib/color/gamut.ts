import {
  converter,
  formatHex,
  modeLab65,
  modeLrgb,
  modeOklab,
  modeOklch,
  modeRgb,
  modeXyz65,
  toGamut,
  useMode as registerMode,
} from 'culori/fn'
import type { Lab } from './types'

// culori/fn rather than culori, so that only these spaces reach the browser.
for (const mode of [modeRgb, modeLrgb, modeXyz65, modeLab65, modeOklab, modeOklch]) {
  registerMode(mode as Parameters<typeof registerMode>[0])
}
const toRgb = converter('rgb')
const mapToRgb = toGamut('rgb', 'oklch')
/** Half an 8-bit step: what rounds into the screen's range is not called outside it. */
const HALF_STEP = 0.5 / 255

/** What a screen can show of a colour. */
export interface ScreenColor {
  /** `#rrggbb`, sRGB. */
  hex: string
  /** False when the screen shows a less vivid stand-in. */
  inGamut: boolean
}

/**
 * The sRGB colour that stands for a Lab D65 colour on a screen. Outside sRGB its chroma is reduced
 * at constant OKLCH hue and lightness. For display only: never measure or compare the result.
 * @source CSS Color 4 § 13.2, gamut mapping by chroma reduction (culori's `toGamut`)
 */
export function screenColor([l, a, b]: Lab): ScreenColor {
  const color = { mode: 'lab65', l, a, b } as const
  const { r, g, b: blue } = toRgb(color)
  const inGamut = [r, g, blue].every((v) => v >= -HALF_STEP && v <= 1 + HALF_STEP)
  return { hex: formatHex(inGamut ? color : mapToRgb(color)), inGamut }
}
