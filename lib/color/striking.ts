import { MMCQ } from '@vibrant/quantizer-mmcq'
import { deltaE00 } from './ciede2000'
import { accentShares } from './photograph-colors'
import { displayP3ToLab, srgbToLab } from './srgb'
import type { Lab, PixelImage } from './types'

/** A colour of a photograph worth offering for a lock. */
export interface StrikingColor {
  /** D65. */
  lab: Lab
  /** Share of the visible pixels nearest to it. */
  area: number
}

const QUANTIZED = 48
const OFFERED = 8
/** Less of the picture than this is a speck. */
const LEAST_AREA = 0.0015

/** The visible pixels at 8 bits, opaque. */
function visiblePixels({ data }: PixelImage): Uint8ClampedArray {
  const shift = data instanceof Uint16Array ? 8 : 0
  const half = data instanceof Uint16Array ? 32768 : 128
  const out = new Uint8ClampedArray(data.length)
  let end = 0
  for (let at = 0; at < data.length; at += 4) {
    if (data[at + 3]! < half) continue
    for (let channel = 0; channel < 3; channel++) out[end++] = data[at + channel]! >> shift
    out[end++] = 255
  }
  return out.subarray(0, end)
}

/**
 * Up to eight striking colours of a photograph, the most striking first: vivid, apart from the rest
 * of the picture and from each other (ΔE00 10), more than a speck. Empty for a grey photograph, or
 * one without visible pixels.
 * @source modified median cut by @vibrant/quantizer-mmcq, whose means are of 5 bits a channel: each
 * colour's mean is taken again over its pixels here
 */
export function strikingColors(image: PixelImage): StrikingColor[] {
  const pixels = visiblePixels(image)
  if (pixels.length === 0) return []
  const seeds = MMCQ(pixels, { colorCount: QUANTIZED }).map(({ rgb }) => rgb)
  const sums = seeds.map(() => [0, 0, 0, 0])
  const nearest = new Int16Array(1 << 15).fill(-1)
  for (let at = 0; at < pixels.length; at += 4) {
    const r = pixels[at]!
    const g = pixels[at + 1]!
    const b = pixels[at + 2]!
    const bin = ((r >> 3) << 10) | ((g >> 3) << 5) | (b >> 3)
    let seed = nearest[bin]!
    if (seed < 0) {
      let least = Infinity
      seeds.forEach(([sr, sg, sb], index) => {
        const distance = (r - sr) ** 2 + (g - sg) ** 2 + (b - sb) ** 2
        if (distance < least) {
          least = distance
          seed = index
        }
      })
      nearest[bin] = seed
    }
    const sum = sums[seed]!
    sum[0]! += r
    sum[1]! += g
    sum[2]! += b
    sum[3]! += 1
  }
  const toLab = image.space === 'display-p3' ? displayP3ToLab : srgbToLab
  const colors = sums
    .filter(([, , , count]) => count! > 0)
    .map(([r, g, b, count]) => {
      const scale = 1 / (count! * 255)
      return { lab: toLab(r! * scale, g! * scale, b! * scale), area: (count! * 4) / pixels.length }
    })
  const { strength } = accentShares(colors)
  const offered: StrikingColor[] = []
  const order = colors.map((_, index) => index).sort((a, b) => strength[b]! - strength[a]! || a - b)
  for (const index of order) {
    const color = colors[index]!
    if (offered.length === OFFERED || strength[index]! < 0.01) break
    if (color.area < LEAST_AREA) continue
    if (offered.every(({ lab }) => deltaE00(lab, color.lab) >= 10)) offered.push(color)
  }
  return offered
}
