import { unit, type Camera, type Vector } from '../camera'
import type { Development } from '../develop'
import { renderLand, type Scene } from '../landscape'
import { fbm2, noise2, ridged2, smoothstep, worley2, type Cell } from '../noise'
import { blend, halve, makePicture, paint, scale, type Picture, type Rgb } from '../picture'
import { renderSky, type Sky } from '../sky'
import { erode, makeField, sampleField, sunlight } from '../terrain'

/** How this picture is developed. */
export const development: Development = { exposure: 1.05, contrast: 0.3, vignette: 0.3, bloom: 0.1 }

const sun = unit({ x: 0.5, y: 0.1, z: 0.86 })
const sky: Sky = {
  sun,
  zenith: paint('#5c6684'),
  horizon: paint('#d9a98a'),
  glow: [0.75, 0.42, 0.2],
  glowPower: 14,
  clouds: [
    {
      base: 1500,
      top: 2100,
      lump: 1300,
      cover: 0.46,
      density: 0.005,
      lit: [1.0, 0.66, 0.46],
      dark: paint('#6f6a7c'),
      haze: 22000,
      stretch: 3.2,
      seed: 12,
    },
  ],
}
const bloom = paint('#67466b')
const bloomLight = paint('#86617f')
const stem = paint('#4a3a3f')
const moorgrass = paint('#857a50')
const peat = paint('#332a27')
const cell: Cell = { nearest: 0, second: 0, id: 0 }

function relief(x: number, z: number): number {
  const wx = x + 220 * fbm2(x * 0.0008, z * 0.0008, 4, 5)
  const swell = fbm2(wx * 0.0009, z * 0.0011, 4, 3) * 120
  const ridges = ridged2(wx * 0.00042, z * 0.00062, 5, 7) * 260 * smoothstep(500, 2600, z)
  const near = 14 * fbm2(x * 0.008, z * 0.008, 4, 9)
  return (
    40 +
    swell * smoothstep(60, 700, z) +
    ridges +
    near * smoothstep(8, 60, z) -
    smoothstep(0, 240, z) * 22
  )
}

/** Heather to the skyline, ridge behind ridge in mist, the sun almost down. */
export function render(width: number, height: number): Picture {
  const field = makeField(1024, -3600, -300, 7200, relief)
  erode(field, 120000, 6)
  const lit = sunlight(field, sun)
  const camera: Camera = { x: 0, y: sampleField(field, 0, 0) + 9, z: 0, focal: 0.9, horizon: 0.42 }
  const scene: Scene = {
    camera,
    sky,
    land: {
      near: 4,
      far: 6600,
      height: (x, z, grain) => cover(x, z, grain, sampleField(field, x, z)),
      shade: (place, normal, _distance, out) => {
        const { x, z } = place
        shade(place, normal, sampleField(field, x, z, lit), sampleField(field, x, z), out)
      },
    },
    air: {
      density: [0.00016, 0.0002, 0.00026],
      color: paint('#a99aa6'),
      glow: [0.62, 0.34, 0.16],
      mist: 0.0016,
      mistLevel: 30,
      mistHeight: 34,
    },
  }
  const big = makePicture(width * 2, height * 2)
  big.data.set(renderSky(sky, camera, big.width, big.height).data)
  renderLand(scene, big)
  return halve(big)
}

function cover(x: number, z: number, grain: number, base: number): number {
  let h = base
  if (grain < 3) h += 1.1 * fbm2(x * 0.07, z * 0.07, 4, 45) * smoothstep(3, 0.8, grain)
  if (grain < 1) {
    worley2(x * 0.7, z * 0.7, 44, cell)
    h += 0.62 * (1 - cell.nearest) * smoothstep(1, 0.3, grain)
  }
  if (grain < 0.14) h += 0.2 * noise2(x * 3.4, z * 3.4, 46) + 0.12 * noise2(x * 9, z * 9, 47)
  return h
}

function shade({ x, y, z }: Vector, n: Vector, sunlit: number, base: number, out: Rgb): void {
  const broad = fbm2(x * 0.004, z * 0.004, 4, 51)
  const fine = fbm2(x * 0.13, z * 0.13, 4, 52)
  const speck = noise2(x * 2.3, z * 2.3, 53)
  const grit = noise2(x * 11, z * 11, 54)
  let color = blend(
    stem,
    blend(bloom, bloomLight, 0.5 + grit * 0.6),
    smoothstep(-0.55, 0.5, fine + speck * 0.6 + (y - base) * 0.5),
  )
  color = blend(color, moorgrass, smoothstep(-0.02, 0.34, broad + fine * 0.3))
  color = blend(
    color,
    peat,
    smoothstep(0.2, 0.42, fbm2(x * 0.011, z * 0.005, 4, 55) + fine * 0.2) * 0.8,
  )
  color = scale(color, 1 + 0.3 * speck + 0.25 * fine)
  const facing = Math.max(0, n.x * sun.x + n.y * sun.y + n.z * sun.z)
  // Low sun from ahead shines through the flowers.
  const through = 0.5 * smoothstep(-0.2, 1, y - base) * smoothstep(0.3, 1, sunlit)
  const direct = (facing * 1.1 + through) * sunlit
  const up = 0.5 + 0.5 * n.y
  out[0] = color[0] * (1.75 * direct + 0.4 * up)
  out[1] = color[1] * (1.32 * direct + 0.42 * up)
  out[2] = color[2] * (0.92 * direct + 0.5 * up)
}
