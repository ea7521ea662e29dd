import sharp from 'sharp'
import { hash, mix } from './noise'
import { blur, makePicture, type Picture } from './picture'

/** How a linear-light picture is developed into a photograph. */
export interface Development {
  /** multiplies the light */
  exposure?: number
  /** 1 leaves the colours as they are */
  saturation?: number
  /** 0 none; about 0.3 a gentle S */
  contrast?: number
  /** standard deviation of the grain, in 8-bit steps */
  grain?: number
  /** darkening of the corners, 0–1 */
  vignette?: number
  /** share of light scattered in the lens, 0–1 */
  bloom?: number
  /** JPEG quality */
  quality?: number
}

/**
 * The picture as an sRGB JPEG without metadata: lens scatter, exposure, soft shoulder, S-curve,
 * vignette and grain, in that order. Deterministic. @source common practice; sRGB by IEC 61966-2-1
 */
export async function develop(picture: Picture, settings: Development): Promise<Buffer> {
  const { exposure = 1, saturation = 1, contrast = 0.25, grain = 2.2 } = settings
  const { vignette = 0.25, bloom = 0.06, quality = 86 } = settings
  const { width, height, data } = picture
  const glow = makePicture(width, height)
  glow.data.set(data)
  blur(glow, width / 60)
  const film = grainField(width, height)
  const bytes = Buffer.alloc(width * height * 3)
  for (let y = 0; y < height; y++) {
    for (let x = 0; x < width; x++) {
      const i = y * width + x
      const dx = (x / width - 0.5) * 2
      const dy = (y / height - 0.5) * 2
      const corner = 1 - vignette * ((dx * dx + dy * dy) / 2) ** 1.5
      const gain = exposure * corner
      const r = mix(data[i * 3]!, glow.data[i * 3]!, bloom) * gain
      const g = mix(data[i * 3 + 1]!, glow.data[i * 3 + 1]!, bloom) * gain
      const b = mix(data[i * 3 + 2]!, glow.data[i * 3 + 2]!, bloom) * gain
      const luma = 0.2126 * r + 0.7152 * g + 0.0722 * b
      const speck = film[i]! * grain
      bytes[i * 3] = print(luma + (r - luma) * saturation, contrast, speck)
      bytes[i * 3 + 1] = print(luma + (g - luma) * saturation, contrast, speck)
      bytes[i * 3 + 2] = print(luma + (b - luma) * saturation, contrast, speck)
    }
  }
  return sharp(bytes, { raw: { width, height, channels: 3 } })
    .jpeg({ quality, mozjpeg: true, chromaSubsampling: '4:2:0' })
    .toBuffer()
}

function print(light: number, contrast: number, speck: number): number {
  const x = Math.max(0, light)
  // Straight up to 0.6, then a shoulder that nears 1, so that bright sky keeps its modelling.
  const held = x < 0.6 ? x : 0.6 + 0.4 * (1 - Math.exp(-(x - 0.6) / 0.4))
  const s = held <= 0.0031308 ? held * 12.92 : 1.055 * held ** (1 / 2.4) - 0.055
  const curved = mix(s, s * s * (3 - 2 * s), contrast)
  // Film grain shows in the middle tones and dies away at both ends.
  const visible = 0.35 + 2.6 * curved * (1 - curved)
  return Math.round(Math.min(255, Math.max(0, curved * 255 + speck * visible)))
}

function grainField(width: number, height: number): Float32Array {
  const field = new Float32Array(width * height)
  for (let i = 0; i < field.length; i++) {
    const x = i % width
    const y = (i - x) / width
    field[i] = (hash(x, y, 71) + hash(x, y, 72) + hash(x, y, 73) - 1.5) * 2
  }
  const soft = { width, height, data: new Float32Array(field) }
  blur(soft, 1)
  for (let i = 0; i < field.length; i++) field[i] = field[i]! * 0.35 + soft.data[i]! * 2.4
  return field
}
