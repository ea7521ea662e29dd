import type { Development } from '../develop'
import { fbm2, hash, noise2, ridged2, smoothstep, worley2, type Cell } from '../noise'
import { blend, makePicture, paint, scale, type Picture, type Rgb } from '../picture'
import { lightRelief } from '../relief'

/** How this picture is developed. */
export const development: Development = {
  exposure: 1.15,
  contrast: 0.35,
  vignette: 0.3,
  bloom: 0.05,
}

const ACROSS = 5
const tones = [
  '#6d7578',
  '#8d8574',
  '#a39c8c',
  '#7c4f3c',
  '#50606c',
  '#b7ae9c',
  '#5f5a55',
  '#94765c',
  '#3f4a52',
  '#c9c3b4',
].map(paint)
const sand = paint('#57503f')
const foam = paint('#a9b0ad')
const sea = paint('#3f5552')
const cell: Cell = { nearest: 0, second: 0, id: 0 }

/** Pebbles of three sizes, the larger lying on the smaller; [height, id, how deep inside]. */
function pebble(x: number, y: number): [number, number, number] {
  let best: [number, number, number] = [-0.1, 0, -1]
  for (const [size, seed, share] of [
    [0.16, 1, 1],
    [0.34, 2, 0.8],
    [0.7, 3, 0.42],
  ] as const) {
    const bend = 0.18 * size
    const wx = x + bend * fbm2(x / size, y / size, 2, seed + 10)
    const wy = y * 1.25 + bend * fbm2(x / size, y / size, 2, seed + 20)
    worley2(wx / size, wy / size, seed * 17, cell)
    if (hash(cell.id & 0xffff, seed, 5) > share) continue
    const gap = cell.second - cell.nearest
    const inside = Math.min(1, gap * 1.7, (0.66 - cell.nearest) * 2.2)
    if (gap < 0.04 || inside <= 0) continue
    const round = Math.sqrt(1 - (1 - inside) ** 2)
    const lift = size * (0.34 * round + 0.12) + size * 0.3
    if (lift > best[0]) best = [lift, (cell.id % 100_003) + seed * 7, inside]
  }
  return best
}

/** Wet pebbles from above, with the last of a wave running over the far corner. */
export function render(width: number, height: number): Picture {
  const unitPixels = width / ACROSS
  const relief = { width, height, data: new Float32Array(width * height) }
  const wet = new Float32Array(width * height)
  const color = makePicture(width, height)
  for (let py = 0; py < height; py++) {
    for (let px = 0; px < width; px++) {
      const at = py * width + px
      const x = px / unitPixels
      const y = py / unitPixels
      const [lift, id, inside] = pebble(x, y)
      const own = (n: number) => hash(id, n, 3)
      const grit = noise2(x * 110, y * 110, 11)
      const mottle = fbm2(x * 9 + id, y * 9, 4, 12)
      let tone: Rgb = sand
      if (inside > 0) {
        tone = blend(
          tones[Math.floor(own(1) * 10)]!,
          tones[Math.floor(own(2) * 10)]!,
          0.28 + mottle * 0.5,
        )
        const vein = ridged2((x + own(3) * 9) * 3, (y * 0.6 + own(4) * 9) * 3, 3, 14)
        if (own(5) > 0.72) tone = blend(tone, paint('#d6d1c4'), smoothstep(0.8, 0.95, vein))
        tone = scale(tone, 0.5 + 0.2 * mottle + 0.1 * grit + 0.5 * own(6) * 0.5)
      }
      // The wave comes from the upper right.
      const shore = x * 0.55 - y * 1.15 - 1.35 + 0.3 * fbm2(x * 0.9, y * 0.9, 4, 31)
      const water = smoothstep(0, 0.9, shore)
      const lace =
        smoothstep(0.25, 0.75, ridged2(x * 2.3 + shore, y * 3, 5, 33)) *
        smoothstep(0.75, 0.05, Math.abs(shore - 0.12) * 1.6)
      tone = blend(tone, sea, water * 0.82)
      tone = blend(tone, foam, Math.min(1, lace * 1.15) * smoothstep(-0.12, 0.06, shore))
      const damp = smoothstep(-1.9, -0.2, shore)
      relief.data[at] =
        lift * (1 - water * 0.93) +
        grit * 0.001 +
        mottle * 0.012 +
        water * (0.5 + 0.05 * fbm2(x * 3, y * 5, 4, 35)) +
        lace * 0.03
      wet[at] = Math.min(1, damp * 0.8 + water * 0.5) * (1 - lace)
      color.data.set(scale(tone, 1 - 0.25 * damp * (1 - water)), at * 3)
    }
  }
  return lightRelief(relief, color, unitPixels, { x: -0.56, y: -0.45, z: 0.7 }, wet)
}
