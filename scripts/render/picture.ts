/** Linear-light sRGB, usually 0–1 but not bounded above. */
export type Rgb = [number, number, number]

/** A picture in linear light; `data`: width×height×3 row-major. */
export interface Picture {
  width: number
  height: number
  data: Float32Array
}

/** A layer to paint on; `data`: width×height×4 row-major, linear light, premultiplied alpha. */
export interface Layer {
  width: number
  height: number
  data: Float32Array
}

/** An empty (black) picture. */
export function makePicture(width: number, height: number): Picture {
  return { width, height, data: new Float32Array(width * height * 3) }
}

/** An empty (clear) layer. */
export function makeLayer(width: number, height: number): Layer {
  return { width, height, data: new Float32Array(width * height * 4) }
}

/** `#rrggbb` as linear light. @source IEC 61966-2-1 */
export function paint(hex: string): Rgb {
  const value = parseInt(hex.slice(1), 16)
  const decode = (byte: number) => {
    const s = byte / 255
    return s <= 0.04045 ? s / 12.92 : ((s + 0.055) / 1.055) ** 2.4
  }
  return [decode(value >> 16), decode((value >> 8) & 255), decode(value & 255)]
}

/** A colour between two, into a new triple. */
export function blend(a: Rgb, b: Rgb, t: number): Rgb {
  return [a[0] + (b[0] - a[0]) * t, a[1] + (b[1] - a[1]) * t, a[2] + (b[2] - a[2]) * t]
}

/** A colour times a number. */
export function scale(a: Rgb, k: number): Rgb {
  return [a[0] * k, a[1] * k, a[2] * k]
}

/** Half the size, each pixel the mean of four. */
export function halve({ width, height, data }: Picture): Picture {
  const out = makePicture(width >> 1, height >> 1)
  for (let y = 0; y < out.height; y++) {
    for (let x = 0; x < out.width; x++) {
      const from = (y * 2 * width + x * 2) * 3
      const to = (y * out.width + x) * 3
      for (let c = 0; c < 3; c++) {
        const upper = data[from + c]! + data[from + 3 + c]!
        const lower = data[from + width * 3 + c]! + data[from + width * 3 + 3 + c]!
        out.data[to + c] = (upper + lower) / 4
      }
    }
  }
  return out
}

/** A larger copy by bilinear interpolation, for what is soft anyway (clouds, mist). */
export function enlarge(source: Picture, width: number, height: number): Picture {
  const out = makePicture(width, height)
  const pixel: Rgb = [0, 0, 0]
  for (let y = 0; y < height; y++) {
    for (let x = 0; x < width; x++) {
      samplePicture(
        source,
        ((x + 0.5) * source.width) / width,
        ((y + 0.5) * source.height) / height,
        pixel,
      )
      out.data.set(pixel, (y * width + x) * 3)
    }
  }
  return out
}

/** The bilinear colour at pixel coordinates (centres at .5), clamped at the edge, into `out`. */
export function samplePicture({ width, height, data }: Picture, x: number, y: number, out: Rgb) {
  const px = Math.min(width - 1.001, Math.max(0, x - 0.5))
  const py = Math.min(height - 1.001, Math.max(0, y - 0.5))
  const ix = Math.floor(px)
  const iy = Math.floor(py)
  const u = px - ix
  const v = py - iy
  const at = (iy * width + ix) * 3
  const below = at + width * 3
  for (let c = 0; c < 3; c++) {
    const top = data[at + c]! * (1 - u) + data[at + 3 + c]! * u
    const bottom = data[below + c]! * (1 - u) + data[below + 3 + c]! * u
    out[c] = top * (1 - v) + bottom * v
  }
}

/** Blurs in place by three box passes, close to a Gaussian of standard deviation `sigma` pixels. */
export function blur(
  target: { width: number; height: number; data: Float32Array },
  sigma: number,
): void {
  const radius = Math.round(Math.sqrt((12 * sigma * sigma) / 3 + 1) / 2 - 0.5)
  if (radius < 1) return
  const { width, height, data } = target
  const channels = data.length / (width * height)
  const line = new Float32Array(Math.max(width, height))
  for (let pass = 0; pass < 3; pass++) {
    for (let c = 0; c < channels; c++) {
      for (let y = 0; y < height; y++) {
        boxLine(data, y * width * channels + c, channels, width, radius, line)
      }
      for (let x = 0; x < width; x++) {
        boxLine(data, x * channels + c, width * channels, height, radius, line)
      }
    }
  }
}

function boxLine(
  data: Float32Array,
  start: number,
  stride: number,
  count: number,
  radius: number,
  line: Float32Array,
): void {
  for (let i = 0; i < count; i++) line[i] = data[start + i * stride]!
  const last = count - 1
  let sum = line[0]! * (radius + 1)
  for (let i = 1; i <= radius; i++) sum += line[Math.min(last, i)]!
  const share = 1 / (radius * 2 + 1)
  for (let i = 0; i < count; i++) {
    data[start + i * stride] = sum * share
    sum += line[Math.min(last, i + radius + 1)]! - line[Math.max(0, i - radius)]!
  }
}

/** Lays a layer over a picture, in place. */
export function composite(picture: Picture, layer: Layer): void {
  const pixels = picture.width * picture.height
  for (let i = 0; i < pixels; i++) {
    const alpha = layer.data[i * 4 + 3]!
    if (alpha <= 0) continue
    for (let c = 0; c < 3; c++) {
      picture.data[i * 3 + c] = picture.data[i * 3 + c]! * (1 - alpha) + layer.data[i * 4 + c]!
    }
  }
}

function cover(layer: Layer, at: number, color: Rgb, alpha: number): void {
  const keep = 1 - alpha
  const data = layer.data
  data[at] = data[at]! * keep + color[0] * alpha
  data[at + 1] = data[at + 1]! * keep + color[1] * alpha
  data[at + 2] = data[at + 2]! * keep + color[2] * alpha
  data[at + 3] = data[at + 3]! * keep + alpha
}

/** A tapered straight stroke with soft edges; radii in pixels, colours from its start to its end. */
export function stroke(
  layer: Layer,
  x0: number,
  y0: number,
  x1: number,
  y1: number,
  r0: number,
  r1: number,
  from: Rgb,
  to: Rgb = from,
  alpha = 1,
): void {
  const reach = Math.max(r0, r1) + 1
  const left = Math.max(0, Math.floor(Math.min(x0, x1) - reach))
  const right = Math.min(layer.width - 1, Math.ceil(Math.max(x0, x1) + reach))
  const top = Math.max(0, Math.floor(Math.min(y0, y1) - reach))
  const bottom = Math.min(layer.height - 1, Math.ceil(Math.max(y0, y1) + reach))
  const dx = x1 - x0
  const dy = y1 - y0
  const length = dx * dx + dy * dy || 1
  const color: Rgb = [0, 0, 0]
  for (let y = top; y <= bottom; y++) {
    for (let x = left; x <= right; x++) {
      const px = x + 0.5 - x0
      const py = y + 0.5 - y0
      const t = Math.min(1, Math.max(0, (px * dx + py * dy) / length))
      const radius = r0 + (r1 - r0) * t
      const distance = Math.hypot(px - dx * t, py - dy * t)
      // A thread thinner than a pixel covers only a part of it.
      const edge = Math.min(1, radius * 2) * Math.min(1, Math.max(0, radius + 0.5 - distance))
      if (edge <= 0) continue
      for (let c = 0; c < 3; c++) color[c] = from[c]! + (to[c]! - from[c]!) * t
      cover(layer, (y * layer.width + x) * 4, color, edge * alpha)
    }
  }
}

/** A filled ellipse with soft edges; radii in pixels, `angle` in radians, `light` its shading up its short axis. */
export function ellipse(
  layer: Layer,
  cx: number,
  cy: number,
  rx: number,
  ry: number,
  angle: number,
  color: Rgb,
  alpha = 1,
  light = 0,
): void {
  const reach = Math.max(rx, ry) + 1
  const left = Math.max(0, Math.floor(cx - reach))
  const right = Math.min(layer.width - 1, Math.ceil(cx + reach))
  const top = Math.max(0, Math.floor(cy - reach))
  const bottom = Math.min(layer.height - 1, Math.ceil(cy + reach))
  const cos = Math.cos(angle)
  const sin = Math.sin(angle)
  const small = Math.max(0.3, Math.min(rx, ry))
  const lit: Rgb = [0, 0, 0]
  for (let y = top; y <= bottom; y++) {
    for (let x = left; x <= right; x++) {
      const dx = x + 0.5 - cx
      const dy = y + 0.5 - cy
      const u = (dx * cos + dy * sin) / rx
      const v = (dy * cos - dx * sin) / ry
      const edge = Math.min(1, Math.max(0, (1 - Math.hypot(u, v)) * small + 0.5))
      if (edge <= 0) continue
      const shade = 1 - light * v
      lit[0] = color[0] * shade
      lit[1] = color[1] * shade
      lit[2] = color[2] * shade
      cover(layer, (y * layer.width + x) * 4, lit, edge * alpha)
    }
  }
}
