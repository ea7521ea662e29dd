import type { Development } from '../develop'
import { fbm2, hash, makeRandom, noise2, ridged2, smoothstep, worley2, type Cell } from '../noise'
import { blend, makePicture, paint, scale, type Picture, type Rgb } from '../picture'
import { lightRelief } from '../relief'

/** How this picture is developed. */
export const development: Development = {
  exposure: 1.12,
  contrast: 0.35,
  vignette: 0.3,
  bloom: 0.03,
}

/** Lengths are in the height of a middling stone; the picture is seven of them across. */
const ACROSS = 5.6
const stones = ['#77756e', '#8b8578', '#6a6f70', '#87796a', '#62625c', '#938f86', '#756a60'].map(
  paint,
)
const moss = paint('#4e5a26')
const mossLight = paint('#80813c')
const soil = paint('#2a241d')
const lichens = [
  '#b0893a',
  '#a9ae96',
  '#b9b08a',
  '#a3ab96',
  '#c9c8bb',
  '#8f9a86',
  '#cbc9be',
  '#a8793a',
].map(paint)

interface Stone {
  left: number
  right: number
  top: number
  bottom: number
  id: number
}

interface Patch {
  x: number
  y: number
  radius: number
  kind: number
  seed: number
}

function layStones(): Stone[] {
  const random = makeRandom(90210)
  const laid: Stone[] = []
  for (let top = -0.5; top < 4.6;) {
    const tall = 0.34 + random() * random() * 0.62
    for (let left = -0.6 - random(); left < ACROSS + 0.6;) {
      const wide = tall * (0.9 + random() * 1.9)
      const whole = { left, right: left + wide, top, bottom: top + tall, id: laid.length }
      if (tall > 0.5 && random() < 0.34) {
        const split = top + tall * (0.3 + random() * 0.4)
        laid.push({ ...whole, bottom: split }, { ...whole, top: split, id: laid.length + 1 })
      } else {
        laid.push(whole)
      }
      left += wide
    }
    top += tall
  }
  return laid
}

function growLichen(): Patch[] {
  const random = makeRandom(1881)
  return Array.from({ length: 210 }, () => ({
    x: random() * ACROSS,
    y: random() * 3.8,
    radius: 0.03 + random() ** 2.6 * 0.3,
    kind: Math.floor(random() ** 1.1 * lichens.length),
    seed: Math.floor(random() * 1000),
  }))
}

function depthInto(stone: Stone, x: number, y: number): number {
  const inset = 0.012 + hash(stone.id, 3) * 0.022
  const radius = 0.03 + hash(stone.id, 4) * 0.09
  const skew = (hash(stone.id, 5) - 0.5) * 0.3
  const cx = (stone.left + stone.right) / 2
  const cy = (stone.top + stone.bottom) / 2
  const px = Math.abs(x - cx - skew * (y - cy)) - (stone.right - stone.left) / 2 + inset + radius
  const py =
    Math.abs(y - cy - skew * 0.4 * (x - cx)) - (stone.bottom - stone.top) / 2 + inset + radius
  const outside = Math.hypot(Math.max(px, 0), Math.max(py, 0))
  return radius - outside - Math.min(Math.max(px, py), 0)
}

/** A dry stone wall face on, lit along its face. */
export function render(width: number, height: number): Picture {
  const unitPixels = width / ACROSS
  const laid = layStones()
  const patches = growLichen()
  const relief = { width, height, data: new Float32Array(width * height) }
  const color = makePicture(width, height)
  const cell: Cell = { nearest: 0, second: 0, id: 0 }
  for (let py = 0; py < height; py++) {
    const nearRow = laid.filter((s) => Math.abs((s.top + s.bottom) / 2 - py / unitPixels) < 0.9)
    for (let px = 0; px < width; px++) {
      const at = py * width + px
      const [lift, tone] = surface(nearRow, patches, px / unitPixels, py / unitPixels, cell)
      relief.data[at] = lift
      color.data.set(tone, at * 3)
    }
  }
  return lightRelief(relief, color, unitPixels, { x: -0.72, y: -0.5, z: 0.48 })
}

function surface(laid: Stone[], patches: Patch[], x: number, y: number, cell: Cell): [number, Rgb] {
  const wx = x + 0.15 * fbm2(x * 1.5, y * 1.5, 4, 1) + 0.03 * fbm2(x * 7, y * 7, 4, 2)
  const wy = y + 0.15 * fbm2(x * 1.5, y * 1.5, 4, 3) + 0.03 * fbm2(x * 7, y * 7, 4, 4)
  let inside = -1
  let id = 0
  let across = 0
  for (const stone of laid) {
    if (wx < stone.left - 0.1 || wx > stone.right + 0.1) continue
    const d = depthInto(stone, wx, wy)
    if (d > inside) {
      inside = d
      id = stone.id
      across = wx - (stone.left + stone.right) / 2
    }
  }
  const own = (n: number) => hash(id, n, 7)
  const grit = noise2(x * 95, y * 95, 11)
  const fine = fbm2(x * 14 + id, y * 14, 5, 12, 0.6)
  const coarse = fbm2(x * 3.1 + id * 3.7, y * 3.1, 4, 13)
  const bedding = ridged2(x * (1.2 + own(1) * 2) + id, y * (5 + own(2) * 5), 4, 14)
  const bulge = 1 - Math.exp(-Math.max(0, inside) / 0.07)
  let lift = 0.3 * bulge * (0.75 + own(3) * 0.6)
  lift +=
    bulge * ((own(4) - 0.5) * 0.4 * across + coarse * 0.09 + fine * 0.035 + bedding * 0.05 * own(5))
  lift += bulge * (own(6) - 0.5) * 0.16 + grit * 0.0022
  if (inside < 0) lift = -0.12 + 0.05 * fine
  let tone = blend(
    stones[Math.floor(own(8) * 7)]!,
    stones[Math.floor(own(9) * 7)]!,
    0.5 + coarse * 0.6,
  )
  tone = scale(tone, 0.9 + 0.3 * fine + 0.13 * grit + 0.25 * (own(10) - 0.5))
  tone = blend(
    tone,
    paint('#8a6742'),
    smoothstep(0.1, 0.6, fbm2(x * 2.3, y * 3.1, 4, 15) + bedding * 0.3) * 0.45,
  )
  tone = blend(soil, tone, smoothstep(-0.01, 0.03, inside))
  if (inside > 0.006) {
    for (const patch of patches) {
      const far = Math.hypot(x - patch.x, y - patch.y)
      if (far > patch.radius * 1.6) continue
      const edge = patch.radius * (1 + 0.55 * fbm2(x * 7, y * 7, 4, patch.seed)) - far
      const crust = fbm2(x * 42, y * 42, 4, patch.seed + 5, 0.65)
      const hollow =
        patch.radius > 0.13 ? smoothstep(0.35, 0.75, far / patch.radius + crust * 0.35) : 1
      const cover = smoothstep(-0.004, 0.016, edge + crust * 0.028) * (0.3 + 0.7 * hollow)
      if (cover <= 0.01) continue
      worley2(x * 70, y * 70, patch.seed, cell)
      const rim = smoothstep(0.05, 0.005, edge)
      const body = scale(
        lichens[patch.kind]!,
        0.86 + 0.34 * crust + 0.22 * rim - 0.2 * cell.nearest,
      )
      tone = blend(tone, body, cover * 0.93)
      lift += cover * (0.008 + 0.009 * crust - 0.008 * cell.nearest)
    }
  }
  const damp = fbm2(x * 1.1 + 4, y * 1.3, 4, 21)
  const joint = smoothstep(0.1, -0.03, inside - 0.05 * fine - 0.05 * Math.max(0, damp))
  const green = joint * smoothstep(-0.12, 0.22, damp + fine * 0.3)
  if (green > 0.02) {
    worley2(x * 46, y * 46, 22, cell)
    const tuft = 1 - cell.nearest
    tone = blend(
      tone,
      blend(moss, mossLight, smoothstep(0.3, 0.95, tuft + grit * 0.25)),
      Math.min(1, green * 1.3),
    )
    lift += green * (0.1 + 0.05 * tuft + 0.03 * fbm2(x * 25, y * 25, 3, 23))
  }
  return [lift, tone]
}
