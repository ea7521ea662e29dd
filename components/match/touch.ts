import { srgbToLab } from '@/lib/color/srgb'
import type { Lab } from '@/lib/color/types'

import type { TouchedColor } from './types'

/** A point of a picture, 0 to 1 from left and from top. */
export interface Point {
  x: number
  y: number
}

/** Half the side of the square that is touched, in pixels of the copy that is read. */
export const REACH = 3

/** The mean colour of some pixels. @param data n×4 sRGB 0–255; at least one @returns Lab D65 */
export function meanColor(data: Uint8ClampedArray): Lab {
  const sum = [0, 0, 0]
  const count = data.length / 4
  if (count < 1) throw new RangeError(`${data.length} bytes hold no pixel.`)
  for (let at = 0; at < data.length; at += 4) {
    const lab = srgbToLab(data[at]! / 255, data[at + 1]! / 255, data[at + 2]! / 255)
    for (let axis = 0; axis < 3; axis++) sum[axis]! += lab[axis]! / count
  }
  return [sum[0]!, sum[1]!, sum[2]!]
}

/** The same pixels as a screen colour; no more than a picture of what is touched. */
function meanRgb(data: Uint8ClampedArray): string {
  const sum = [0, 0, 0]
  data.forEach((value, at) => {
    if (at % 4 < 3) sum[at % 4]! += value
  })
  return `rgb(${sum.map((one) => Math.round(one / (data.length / 4))).join(' ')})`
}

const canvases = new WeakMap<HTMLImageElement, { src: string; context: CanvasRenderingContext2D }>()

function contextOf(image: HTMLImageElement): CanvasRenderingContext2D | null {
  const known = canvases.get(image)
  if (known?.src === image.currentSrc) return known.context
  if (!image.complete || image.naturalWidth === 0) return null
  const canvas = document.createElement('canvas')
  canvas.width = image.naturalWidth
  canvas.height = image.naturalHeight
  const context = canvas.getContext('2d', { willReadFrequently: true })
  if (!context) return null
  context.drawImage(image, 0, 0)
  canvases.set(image, { src: image.currentSrc, context })
  return context
}

/** The colour of a picture around a point; null while the picture has not arrived. */
export function touchPicture(image: HTMLImageElement, { x, y }: Point): TouchedColor | null {
  const context = contextOf(image)
  if (!context) return null
  const { width, height } = context.canvas
  const left = Math.max(0, Math.min(width - 1, Math.round(x * (width - 1))) - REACH)
  const top = Math.max(0, Math.min(height - 1, Math.round(y * (height - 1))) - REACH)
  const right = Math.min(width, left + 2 * REACH + 1)
  const bottom = Math.min(height, top + 2 * REACH + 1)
  const { data } = context.getImageData(left, top, right - left, bottom - top)
  return { lab: meanColor(data), css: meanRgb(data) }
}
