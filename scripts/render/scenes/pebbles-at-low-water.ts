import type { Camera } from '../camera'
import type { Development } from '../develop'
import { focus } from '../lens'
import { fbm2, fbm3, mix, noise2, noise3, smoothstep } from '../noise'
import { blend, halve, makePicture, paint, scale, type Picture, type Rgb } from '../picture'
import { castBeach, layBeach, type Beach, type Touch } from '../pebbles'

/** How this picture is developed. */
export const development: Development = {
  exposure: 1.12,
  contrast: 0.35,
  saturation: 0.8,
  vignette: 0.3,
  quality: 84,
}

const camera: Camera = { x: 0, y: 0.62, z: 0, focal: 0.86, horizon: 0.13 }
const SHORE = 4.4
const kinds = [
  '#5d6a74',
  '#8d8f8c',
  '#b29c7a',
  '#8a5a43',
  '#3c4246',
  '#c9c3b4',
  '#6b7266',
  '#a7784f',
  '#74808a',
  '#9c8f80',
].map(paint)
const quartz = paint('#dcd7ca')
const seaDeep = paint('#4f6a68')
const seaLight = paint('#8fa39d')
const overcast = paint('#c9d0d3')
const sun = { x: -0.62, y: 0.68, z: 0.39 }

/** Pebbles on a beach, wet towards the sea, with the sea itself out of focus. */
export function render(width: number, height: number): Picture {
  const beach = layBeach(11, SHORE + 3)
  const big = makePicture(width * 2, height * 2)
  const depth = new Float32Array(width * height)
  const lens = big.width * camera.focal
  const color: Rgb = [0, 0, 0]
  const touch: Touch = {
    t: 0,
    stone: -1,
    x: 0,
    y: 0,
    z: 0,
    nx: 0,
    ny: 0,
    nz: 0,
    u: 0,
    v: 0,
    w: 0,
    open: 1,
    lit: 1,
  }
  for (let py = 0; py < big.height; py++) {
    const v = (big.height * camera.horizon - py - 0.5) / lens
    for (let px = 0; px < big.width; px++) {
      const u = (px + 0.5 - big.width / 2) / lens
      const far = trace(beach, u, v, touch, color)
      const at = (py * big.width + px) * 3
      big.data[at] = color[0]
      big.data[at + 1] = color[1]
      big.data[at + 2] = color[2]
      depth[(py >> 1) * width + (px >> 1)] = far
    }
  }
  const picture = halve(big)
  focus(picture, depth, 1.35, width * 0.009, width * 0.0036)
  return picture
}

function shoreline(x: number): number {
  return SHORE + 0.5 * noise2(x * 0.5, 2.2, 61) + 0.12 * noise2(x * 2.1, 7, 62)
}

function trace(beach: Beach, u: number, v: number, touch: Touch, out: Rgb): number {
  if (v > -0.002) {
    skyTone(u, v, out)
    return 400
  }
  const seaZ = camera.y / -v
  const seaX = u * seaZ
  const past = seaZ - shoreline(seaX)
  if (past > 0.5 || !castBeach(beach, camera, u, v, touch)) {
    seaTone(seaX, seaZ, past, v, out)
    return seaZ
  }
  stoneTone(beach, touch, u, v, out)
  if (past > -0.15) {
    // The last of a wave, running out between the stones.
    const film =
      smoothstep(-0.15, 0.35, past + 0.1 * noise2(seaX * 4, seaZ * 4, 63)) *
      smoothstep(0.02, -0.012, touch.y - 0.015 - 0.2 * past)
    const sea: Rgb = [0, 0, 0]
    seaTone(seaX, seaZ, Math.max(0.02, past), v, sea)
    for (let c = 0; c < 3; c++) out[c] = mix(out[c]!, sea[c]!, film * 0.9)
  }
  return touch.t
}

function stoneTone(beach: Beach, touch: Touch, u: number, v: number, out: Rgb): void {
  const { stone, u: a, v: b, w: c } = touch
  let tone: Rgb
  if (stone < 0) {
    const grit =
      noise2(touch.x * 420, touch.z * 420, 64) + 0.6 * noise2(touch.x * 160, touch.z * 160, 65)
    tone = scale(paint('#6b6152'), 0.8 + 0.4 * grit)
  } else {
    const id = beach.id[stone]!
    const kind = id % kinds.length
    const k = (id >>> 4) % 997
    const size = beach.size[stone]! * 40
    const broad = fbm3(a * 1.4 + k, b * 1.4, c * 1.4, 4, 66)
    const fine = fbm3(a * size * 3 + k, b * size * 3, c * size * 3, 4, 67)
    const speck = noise3(a * size * 16, b * size * 16 + k, c * size * 16, 68)
    tone = blend(kinds[kind]!, kinds[(id >>> 9) % kinds.length]!, 0.2 + 0.3 * broad)
    tone = scale(
      tone,
      0.92 +
        0.35 * fine +
        (kind % 3 === 0 ? 0.3 : 0.12) * speck +
        0.3 * (((id >>> 13) % 100) / 100 - 0.5),
    )
    if ((id >>> 5) % 5 === 0) {
      const band = Math.sin((a * ((id >>> 7) % 3) + b * 6 + c * 2) * 2.2 + broad * 4)
      tone = scale(tone, 1 + 0.22 * band)
    }
    if ((id >>> 6) % 6 === 0) {
      const vein = Math.abs(a * 0.6 + b * 1.3 - c * 0.5 + 0.28 * broad - 0.15)
      tone = blend(tone, quartz, smoothstep(0.075, 0.03, vein + 0.02 * speck) * 0.85)
    }
  }
  const tide = touch.z - shoreline(touch.x)
  const wet = smoothstep(
    -2.1,
    -0.9,
    tide + 0.5 * fbm2(touch.x * 1.3, touch.z * 1.3, 3, 69) - touch.y * 6,
  )
  const bump = wet > 0.5 ? 0.05 : 0.12
  const nx = touch.nx + bump * noise3(a * 5, b * 5, c * 5 + 3, 70)
  const nz = touch.nz + bump * noise3(a * 5, b * 5 + 9, c * 5, 71)
  const ny = touch.ny
  const facing = Math.max(0, nx * sun.x + ny * sun.y + nz * sun.z)
  const length = Math.hypot(u, v, 1)
  const along = (nx * u + ny * v + nz) / length
  const fresnel = 0.03 + 0.97 * (1 - Math.min(1, Math.abs(along))) ** 5
  const rx = u / length - 2 * along * nx
  const ry = v / length - 2 * along * ny
  const rz = 1 / length - 2 * along * nz
  const mirror = Math.min(1, Math.max(0, rx * sun.x + ry * sun.y + rz * sun.z))
  const gloss =
    wet * (fresnel * smoothstep(-0.1, 0.5, ry) * 1.1 * touch.open + mirror ** 60 * 0.7 * touch.lit)
  const darker = mix(1, 0.5, wet)
  const ambient = touch.open * (0.5 + 0.5 * ny)
  out[0] = tone[0] * darker * (1.45 * facing * touch.lit + 0.42 * ambient) + gloss * overcast[0]
  out[1] = tone[1] * darker * (1.36 * facing * touch.lit + 0.45 * ambient) + gloss * overcast[1]
  out[2] = tone[2] * darker * (1.2 * facing * touch.lit + 0.5 * ambient) + gloss * overcast[2]
}

function seaTone(x: number, z: number, past: number, v: number, out: Rgb): void {
  const sharpness = 1 / (1 + z * 0.12)
  const swell =
    noise2(x * 0.25, z * 0.5, 72) +
    0.6 * noise2(x * 0.9, z * 2.2, 73) * sharpness +
    0.35 * noise2(x * 3, z * 8, 74) * sharpness ** 2
  const facing = Math.min(1, Math.max(0.02, -v * 1.4 + 0.16 * swell))
  const mirror = 0.02 + 0.98 * (1 - facing) ** 5
  const shallow = Math.exp(-Math.max(0, past) * 0.5)
  const body = blend(seaDeep, seaLight, shallow * 0.7 + 0.18 * swell)
  for (let c = 0; c < 3; c++) out[c] = mix(body[c]! * 0.8, overcast[c]! * 0.92, mirror * 0.85)
  const lace = fbm2(x * 2.2, z * 3.4, 5, 75)
  const edge =
    smoothstep(0.34, 0.06, Math.abs(past - 0.16 + 0.1 * lace)) *
    smoothstep(-0.25, 0.15, lace + 0.12)
  const wash = smoothstep(2.6, 0.3, past) * smoothstep(0.08, 0.02, Math.abs(lace + 0.06)) * 0.6
  const breaker = 8.2 + 0.7 * noise2(x * 0.35, 3, 76)
  const crest =
    smoothstep(0.55, 0.0, Math.abs(z - breaker - 0.25 * lace)) *
    smoothstep(-0.2, 0.3, noise2(x * 0.22, 1, 77) + lace * 0.5)
  const farCaps =
    smoothstep(0.62, 0.8, noise2(x * 0.16, z * 0.55, 78)) *
    smoothstep(10, 16, z) *
    smoothstep(90, 30, z) *
    0.5
  const foam = Math.min(1, Math.max(edge, wash, crest, farCaps))
  for (let c = 0; c < 3; c++) out[c] = mix(out[c]!, overcast[c]! * (1.05 + 0.2 * lace), foam)
  const haze = 1 - Math.exp(-z / 160)
  for (let c = 0; c < 3; c++) out[c] = mix(out[c]!, overcast[c]! * 0.86, haze * 0.75)
}

function skyTone(u: number, v: number, out: Rgb): void {
  const up = Math.max(0, v)
  const cloud = fbm2(u * 3.2, Math.log(up + 0.04) * 1.6, 5, 79)
  const tone = 0.9 + 0.14 * cloud - up * 0.8
  for (let c = 0; c < 3; c++) out[c] = overcast[c]! * tone * (1 - 0.05 * (2 - c) * (1 - cloud))
}
