/**
 * CIELAB as [L*, a*, b*] relative to the white of D65: L* 0–100, a* and b* unbounded, about ±128.
 * Everything in this folder is D65; a reading under another illuminant does not get in.
 */
export type Lab = readonly [number, number, number]

/** C*ab, the distance from grey. */
export const chromaOf = (lab: Lab): number => Math.hypot(lab[1], lab[2])

/** h*ab in degrees, 0 ≤ h < 360; 0 for a neutral. */
export const hueOf = (lab: Lab): number =>
  // Over again, since 360 less next to nothing is 360.
  ((Math.atan2(lab[2], lab[1]) * 180) / Math.PI + 360) % 360

/** The CIE standard observer a reading was made for: 2° (1931) or 10° (1964). */
export type Observer = 2 | 10

/**
 * An instrument's reading with its terms. 10° numbers are relative to their own white and are
 * compared as they are: taking them through hex or 2° XYZ would move the colour.
 */
export interface MeasuredLab {
  lab: Lab
  illuminant: 'D65'
  observer: Observer
}

/** A picture small enough to read. */
export interface PixelImage {
  width: number
  height: number
  /** n×4 row-major RGBA: 0–255, or 0–65535 in a Uint16Array. */
  data: Uint8Array | Uint8ClampedArray | Uint16Array
  /** The encoding of the red, green and blue; both share the sRGB transfer curve and D65. */
  space: 'srgb' | 'display-p3'
}
