import { unit, type Camera, type Vector } from '../camera'
import type { Development } from '../develop'
import { renderLand, type Scene } from '../landscape'
import { fbm2, mix, noise2, ridged2, smoothstep, worley2, type Cell } from '../noise'
import { blend, halve, makePicture, paint, scale, type Picture, type Rgb } from '../picture'
import { renderSky, type Sky } from '../sky'
import { erode, makeField, sampleField, sunlight, type Field } from '../terrain'

/** How this picture is developed. */
export const development: Development = { exposure: 1.05, contrast: 0.3, vignette: 0.25 }

const sun = unit({ x: -0.72, y: 0.42, z: 0.12 })
const sky: Sky = {
  sun,
  zenith: paint('#5f87b4'),
  horizon: paint('#cfd9de'),
  glow: [0.35, 0.28, 0.18],
  glowPower: 9,
  clouds: [
    {
      base: 900,
      top: 1700,
      lump: 900,
      cover: 0.5,
      density: 0.006,
      lit: [1.05, 1.0, 0.94],
      dark: paint('#8b99a8'),
      haze: 16000,
      stretch: 1.5,
      seed: 31,
    },
  ],
}

const bracken = paint('#9a5a2b')
const brackenDark = paint('#5e3319')
const straw = paint('#b39a5c')
const turf = paint('#6f7340')
const wood = paint('#2f3a22')
const rock = paint('#77736c')
const scree = paint('#958e84')
const heath = paint('#4d3a33')
const cell: Cell = { nearest: 0, second: 0, id: 0 }

function relief(x: number, z: number): number {
  const wx = x + 160 * fbm2(x * 0.0011, z * 0.0011, 4, 5)
  const wz = z + 160 * fbm2(x * 0.0011, z * 0.0011, 4, 9)
  const axis = 60 + 240 * Math.sin(z * 0.0011 + 0.4)
  const side = smoothstep(180, 1300, Math.abs(wx - axis)) * 430
  const head = smoothstep(900, 3000, wz) * 330
  const crags = ridged2(wx * 0.0007, wz * 0.0007, 5, 3)
  const rough = fbm2(x * 0.004, z * 0.004, 5, 8) * 28
  const high = (side + head) * (0.42 + crags * 0.95)
  const basin = 46 * Math.exp(-(((x - 30) / 250) ** 2) - ((z - 420) / 270) ** 2)
  const knoll = 20 * Math.exp(-((x / 160) ** 2) - ((z + 20) / 90) ** 2)
  const soft = high < 260 ? high : 260 + (high - 260) * 0.55
  return (
    20 +
    soft +
    rough * smoothstep(0, 160, high) +
    knoll -
    basin +
    4 * fbm2(x * 0.01, z * 0.01, 4, 77)
  )
}

/** Fells in autumn round a tarn, in afternoon light. */
export function render(width: number, height: number): Picture {
  const field = makeField(1024, -2600, -400, 5600, relief)
  erode(field, 260000, 4)
  const woods = makeField(512, field.left, field.near, 5600, (x, z) =>
    woodland(x, z, sampleField(field, x, z)),
  )
  const lit = sunlight(field, sun)
  const camera: Camera = {
    x: 0,
    y: sampleField(field, 0, 0) + 14,
    z: 0,
    focal: 0.82,
    horizon: 0.46,
  }
  const scene: Scene = {
    camera,
    sky,
    land: {
      near: 6,
      far: 5200,
      height: (x, z, grain) => cover(x, z, grain, sampleField(field, x, z), woods),
      shade: (place, normal, distance, out) => {
        shade(
          place,
          normal,
          sampleField(field, place.x, place.z, lit),
          sampleField(field, place.x, place.z),
          out,
        )
      },
    },
    air: {
      density: [0.000085, 0.000125, 0.0002],
      color: paint('#b4c4d3'),
      glow: [0.22, 0.16, 0.08],
      mist: 0,
      mistLevel: 0,
      mistHeight: 40,
    },
    water: { level: 12, ruffle: 0.03, depthColor: paint('#1b2a2c') },
  }
  const big = makePicture(width * 2, height * 2)
  big.data.set(renderSky(sky, camera, big.width, big.height).data)
  renderLand(scene, big)
  return halve(big)
}

function woodland(x: number, z: number, base: number): number {
  const patch = fbm2(x * 0.0042, z * 0.0042, 3, 41)
  return smoothstep(0.1, 0.24, patch) * smoothstep(170, 60, base) * smoothstep(230, 330, z)
}

function cover(x: number, z: number, grain: number, base: number, woods: Field): number {
  let h = base
  const trees = grain < 6 ? sampleField(woods, x, z) : 0
  if (trees > 0.02) {
    worley2(x * 0.16, z * 0.16, 43, cell)
    const size = 5 + ((cell.id >>> 8) & 255) / 40
    h += trees * size * Math.max(0, 1 - cell.nearest * cell.nearest * 2.1)
  }
  if (grain < 0.9) {
    worley2(x * 0.55, z * 0.55, 44, cell)
    h += 0.75 * (1 - cell.nearest) * smoothstep(0.9, 0.3, grain)
  }
  if (grain < 3) h += 2.2 * fbm2(x * 0.06, z * 0.06, 4, 45) * smoothstep(3, 1, grain)
  if (grain < 0.12) h += 0.22 * noise2(x * 3.2, z * 3.2, 46) + 0.1 * noise2(x * 9, z * 9, 47)
  return h
}

function shade(place: Vector, n: Vector, sunlit: number, base: number, out: Rgb): void {
  const { x, y, z } = place
  const steep = 1 - n.y
  const broad = fbm2(x * 0.006, z * 0.006, 4, 51)
  const fine = fbm2(x * 0.11, z * 0.11, 4, 52)
  const speck = noise2(x * 1.7, z * 1.7, 53)
  let color: Rgb = blend(bracken, brackenDark, smoothstep(-0.3, 0.6, fine + speck * 0.4))
  color = blend(color, straw, smoothstep(-0.1, 0.35, broad + fine * 0.35) * 0.75)
  color = blend(
    color,
    turf,
    smoothstep(0.05, 0.4, fbm2(x * 0.009, z * 0.009, 4, 54) + fine * 0.2) *
      smoothstep(260, 60, base),
  )
  color = blend(color, heath, smoothstep(200, 420, base + broad * 160) * 0.75)
  color = blend(
    color,
    blend(rock, scree, 0.5 + speck * 0.5),
    smoothstep(0.2, 0.42, steep + fine * 0.1) * smoothstep(60, 220, base),
  )
  const trees = woodland(x, z, base)
  if (trees > 0.1) {
    const canopy: Rgb = blend(
      wood,
      paint('#8a6a2c'),
      smoothstep(0.1, 0.55, noise2(x * 0.09, z * 0.09, 55) + speck * 0.4),
    )
    color = blend(color, canopy, Math.min(1, trees * 1.6))
  }
  color = scale(color, 1 + 0.28 * speck + 0.22 * fine)
  const facing = Math.max(0, n.x * sun.x + n.y * sun.y + n.z * sun.z)
  // Cloud shadows drift over the fells.
  const cloud = smoothstep(-0.22, 0.12, fbm2(x * 0.0012 + 3, z * 0.0012, 3, 56) + 0.08)
  const direct = facing * sunlit * mix(0.18, 1, cloud)
  const cavity = mix(0.55, 1, smoothstep(-0.8, 1.6, y - base))
  const up = 0.5 + 0.5 * n.y
  out[0] = color[0] * (2.35 * direct + 0.34 * up * cavity)
  out[1] = color[1] * (2.12 * direct + 0.4 * up * cavity)
  out[2] = color[2] * (1.72 * direct + 0.52 * up * cavity)
}
