import type { Lab } from './types'

// The matrices of CSS Color 4 § 10.x sample code, for the white of D65 at x 0.3127, y 0.3290.
const WHITE_X = 0.3127 / 0.329
const WHITE_Z = (1 - 0.3127 - 0.329) / 0.329
const EPSILON = 6 ** 3 / 29 ** 3
const KAPPA = 29 ** 3 / 3 ** 3

/**
 * The light behind an encoded sRGB or Display P3 channel, both 0–1.
 * @source IEC 61966-2-1:1999 § 5.2 (the threshold 0.04045)
 */
export const decodeChannel = (value: number): number =>
  value <= 0.04045 ? value / 12.92 : ((value + 0.055) / 1.055) ** 2.4

const f = (t: number): number => (t > EPSILON ? Math.cbrt(t) : (KAPPA * t + 16) / 116)

/** XYZ (Y of white 1) to Lab, both relative to D65 at 2°. @source CIE 15:2018 § 8.2.1 */
function xyzToLab(x: number, y: number, z: number): Lab {
  const fy = f(y)
  return [116 * fy - 16, 500 * (f(x / WHITE_X) - fy), 200 * (fy - f(z / WHITE_Z))]
}

/** Light of the sRGB primaries, linear, 0–1 on a screen; beyond where the colour is. */
export type LinearRgb = readonly [number, number, number]

/** Linear sRGB to Lab D65, in and beyond the screen's range. @source CSS Color 4, sample code */
export const linearToLab = ([r, g, b]: LinearRgb): Lab =>
  xyzToLab(
    0.4123907992659593 * r + 0.357584339383878 * g + 0.1804807884018343 * b,
    0.2126390058715102 * r + 0.715168678767756 * g + 0.0721923153607337 * b,
    0.0193308187155918 * r + 0.119194779794626 * g + 0.9505321522496607 * b,
  )

const unf = (t: number): number => (t ** 3 > EPSILON ? t ** 3 : (116 * t - 16) / KAPPA)

/**
 * Lab D65 to linear sRGB, channels under 0 or over 1 where a screen cannot show the colour.
 * @source CIE 15:2018 § 8.2.1 inverted; matrix of CSS Color 4, sample code
 */
export function labToLinear([lightness, a, b]: Lab): LinearRgb {
  const fy = (lightness + 16) / 116
  const x = WHITE_X * unf(fy + a / 500)
  const y = unf(fy)
  const z = WHITE_Z * unf(fy - b / 200)
  return [
    3.2409699419045213 * x - 1.5373831775700935 * y - 0.4986107602930033 * z,
    -0.9692436362808798 * x + 1.8759675015077206 * y + 0.0415550574071756 * z,
    0.0556300796969936 * x - 0.203976958888977 * y + 1.0569715142428786 * z,
  ]
}

/**
 * Encoded sRGB channels (0–1) to Lab D65; equal channels give an exact neutral.
 * @source IEC 61966-2-1:1999; matrix of CSS Color 4, sample code
 */
export function srgbToLab(red: number, green: number, blue: number): Lab {
  const r = decodeChannel(red)
  if (red === green && green === blue) return [116 * f(r) - 16, 0, 0]
  return linearToLab([r, decodeChannel(green), decodeChannel(blue)])
}

/**
 * Encoded Display P3 channels (0–1) to Lab D65, beyond sRGB where the colour is.
 * @source SMPTE EG 432-1 primaries with the sRGB curve; matrix of CSS Color 4, sample code
 */
export function displayP3ToLab(red: number, green: number, blue: number): Lab {
  const r = decodeChannel(red)
  if (red === green && green === blue) return [116 * f(r) - 16, 0, 0]
  const g = decodeChannel(green)
  const b = decodeChannel(blue)
  return xyzToLab(
    0.486570948648216 * r + 0.265667693169093 * g + 0.1982172852343625 * b,
    0.2289745640697487 * r + 0.6917385218365062 * g + 0.079286914093745 * b,
    0.0451133818589026 * g + 1.043944368900976 * b,
  )
}

/**
 * Three or six hexadecimal digits, with or without `#`, as sRGB channels 0–1; null when it is
 * anything else.
 */
export function parseHex(text: string): [number, number, number] | null {
  const digits = /^#?([0-9a-f]{3}|[0-9a-f]{6})$/i.exec(text.trim())?.[1]
  if (!digits) return null
  const long = digits.length === 6 ? digits : digits.replace(/./g, '$&$&')
  const value = Number.parseInt(long, 16)
  return [(value >> 16) / 255, ((value >> 8) & 255) / 255, (value & 255) / 255]
}

/** An sRGB hex colour to Lab D65. Throws RangeError when it is not one. */
export function hexToLab(hex: string): Lab {
  const channels = parseHex(hex)
  if (!channels) throw new RangeError(`“${hex}” is not a colour such as #7a8b4f.`)
  return srgbToLab(...channels)
}
