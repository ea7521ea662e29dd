import { project, unit, type Camera } from '../camera'
import type { Development } from '../develop'
import { renderLand, type Scene } from '../landscape'
import { fbm2, makeRandom, mix, noise2, smoothstep, worley2, type Cell } from '../noise'
import {
  blend,
  blur,
  composite,
  halve,
  makeLayer,
  makePicture,
  paint,
  scale,
  type Picture,
  type Rgb,
} from '../picture'
import { blade, flower } from '../plants'
import { renderSky, type Sky } from '../sky'

/** How this picture is developed. */
export const development: Development = {
  exposure: 1.05,
  contrast: 0.35,
  vignette: 0.35,
  quality: 82,
}

const sun = unit({ x: -0.75, y: 0.5, z: -0.42 })
const sky: Sky = {
  sun,
  zenith: paint('#59697b'),
  horizon: paint('#b9c0bd'),
  glow: [0, 0, 0],
  glowPower: 4,
  clouds: [
    {
      base: 420,
      top: 1500,
      lump: 430,
      cover: 0.6,
      density: 0.0042,
      lit: paint('#d3d2cc'),
      dark: paint('#394653'),
      haze: 5200,
      stretch: 1.5,
      seed: 12,
    },
  ],
}
const gold = paint('#d9b021')
const goldDeep = paint('#b98a17')
const grass = paint('#7d8a3a')
const grassDark = paint('#39481f')
const hay = paint('#b3a465')
const poppy = paint('#b8291d')
const wood = paint('#28331f')
const cell: Cell = { nearest: 0, second: 0, id: 0 }

function rise(x: number, z: number): number {
  const down = smoothstep(900, 2600, z) * 190 * (0.55 + fbm2(x * 0.0009, z * 0.0004, 3, 21))
  return (
    3.2 * fbm2(x * 0.012, z * 0.012, 3, 22) * smoothstep(4, 60, z) - 0.012 * Math.min(z, 420) + down
  )
}

function trees(x: number, z: number): number {
  const hedge = Math.exp(-(((z - 330 - 26 * noise2(x * 0.006, 1, 23)) / 7) ** 2))
  const second = Math.exp(-(((z - 620 - 60 * noise2(x * 0.004, 5, 24)) / 12) ** 2))
  const copse = smoothstep(0.2, 0.3, fbm2(x * 0.004, z * 0.003, 3, 25)) * smoothstep(500, 800, z)
  const gap = smoothstep(-0.5, -0.2, noise2(x * 0.02, z * 0.002, 26))
  return Math.max(hedge * gap, second * gap, copse)
}

/** A meadow in flower, the last sun on it, with a storm coming over. */
export function render(width: number, height: number): Picture {
  const camera: Camera = { x: 0, y: rise(0, 2) + 1.25, z: 0, focal: 0.8, horizon: 0.6 }
  const scene: Scene = {
    camera,
    sky,
    land: {
      near: 2,
      far: 4200,
      height(x, z, grain) {
        let h = rise(x, z)
        const t = trees(x, z)
        if (t > 0.05) {
          worley2(x * 0.11, z * 0.11, 27, cell)
          h += t * (4 + ((cell.id >>> 8) & 255) / 30) * Math.max(0.1, 1 - cell.nearest ** 2 * 1.7)
          if (grain < 1) h += t * 0.9 * noise2(x * 0.9, z * 0.9, 28)
        }
        return h
      },
      shade({ x, y, z }, n, distance, out) {
        const t = trees(x, z)
        const drift = fbm2(x * 0.03, z * 0.012, 4, 29)
        const speck = noise2(x * 3, z * 3, 30)
        const field = noise2(Math.floor(x / 210 + z / 900), Math.floor(z / 260) + 0.37, 31)
        let color = blend(
          blend(grass, gold, smoothstep(-0.25, 0.3, drift + speck * 0.3)),
          goldDeep,
          0.2 + 0.2 * speck,
        )
        if (z > 340)
          color = blend(
            blend(grass, hay, smoothstep(-0.3, 0.4, field)),
            grassDark,
            0.15 + 0.2 * drift,
          )
        if (t > 0.12)
          color = scale(
            blend(wood, grass, 0.25 * smoothstep(0.2, 0.9, speck + y * 0.01)),
            1 + 0.3 * speck,
          )
        // The sun still reaches the near field; the cloud's shadow has the hills.
        const patch = fbm2(x * 0.0016, z * 0.0011 + 4, 3, 32)
        const reach = Math.max(smoothstep(420, 120, z), smoothstep(0.05, 0.3, patch)) * 0.95
        const direct = Math.max(0, n.x * sun.x + n.y * sun.y + n.z * sun.z) * mix(0.05, 1, reach)
        out[0] = color[0] * (2.2 * direct + 0.34)
        out[1] = color[1] * (2.0 * direct + 0.38)
        out[2] = color[2] * (1.6 * direct + 0.46)
      },
    },
    air: {
      density: [0.00022, 0.00026, 0.00033],
      color: paint('#7d8b98'),
      glow: [0, 0, 0],
      mist: 0.0011,
      mistLevel: -4,
      mistHeight: 30,
    },
  }
  const big = makePicture(width * 2, height * 2)
  big.data.set(renderSky(sky, camera, big.width, big.height).data)
  // The march through the cloud leaves a weave, which the softness of cloud can spare.
  blur(big, width / 260)
  rain(big, camera)
  renderLand(scene, big)
  const picture = halve(big)
  grow(picture, camera)
  return picture
}

/** A curtain of rain under the darkest of the cloud. */
function rain(picture: Picture, camera: Camera): void {
  const { width, height, data } = picture
  const horizon = height * camera.horizon
  const veil = paint('#75828f')
  for (let py = 0; py < horizon; py++) {
    const down = py / horizon
    for (let px = 0; px < width; px++) {
      const u = px / width + 0.16 * (1 - down)
      const shaft = fbm2(u * 9, down * 0.35, 4, 33)
      const amount =
        smoothstep(-0.1, 0.45, shaft) *
        smoothstep(0.4, 0.92, down) *
        smoothstep(0.35, 0.6, u) *
        0.72
      for (let c = 0; c < 3; c++) {
        const at = (py * width + px) * 3 + c
        data[at] = mix(data[at]!, veil[c]!, amount)
      }
    }
  }
}

function grow(picture: Picture, camera: Camera): void {
  const { width, height } = picture
  const random = makeRandom(606)
  const slices = [42, 17, 9, 5.4, 3.2, 2.1, 1.35, 0.9]
  for (let s = 0; s < slices.length - 1; s++) {
    const far = slices[s]!
    const near = slices[s + 1]!
    const layer = makeLayer(width, height)
    const middle = Math.sqrt(far * near)
    const count = Math.round(
      ((far * far - near * near) / camera.focal) * (s === 0 ? 16 : s < 3 ? 50 : 95),
    )
    const depths = Array.from({ length: count }, () =>
      Math.sqrt(near * near + random() * (far * far - near * near)),
    )
    depths.sort((a, b) => b - a)
    for (const z of depths) {
      const x = (random() - 0.5) * (z / camera.focal) * 1.15
      plant(layer, camera, x, z, random)
    }
    blur(layer, Math.abs(1 / middle - 1 / 5.5) * width * 0.0065)
    composite(picture, layer)
  }
}

function plant(
  layer: ReturnType<typeof makeLayer>,
  camera: Camera,
  x: number,
  z: number,
  random: () => number,
): void {
  const at = project(camera, layer.width, layer.height, { x, y: rise(x, z), z })
  const drift = fbm2(x * 0.3, z * 0.3, 3, 34)
  const wind = 0.12 + 0.12 * noise2(x * 0.4, z * 0.4, 35)
  const bright = 0.7 + 0.6 * random()
  const tall = (0.3 + 0.4 * random()) * (1 + 0.3 * drift)
  const root = scale(grassDark, 0.5 + 0.4 * random())
  const tip = scale(blend(grass, hay, random() * 0.8), 1.15 * bright)
  const pixels = tall * at.scale
  const lean = (wind + (random() - 0.5) * 0.35) * pixels
  blade(layer, at.x, at.y, pixels, lean, Math.max(0.7, 0.007 * at.scale), root, tip)
  const pick = random()
  const flowering = 0.34 + 0.4 * drift
  if (pick > flowering) return
  const top = pixels * 0.8
  const red = random() < 0.032 * (drift > 0.02 ? 2 : 0.7)
  const size = (red ? 0.07 : 0.026 + 0.014 * random()) * at.scale
  const color: Rgb = red
    ? scale(poppy, 0.9 + 0.5 * random())
    : scale(blend(gold, goldDeep, random() * 0.6), 1.2 * bright)
  const heads = red ? 1 : 2 + Math.floor(random() * 4)
  for (let i = 0; i < heads; i++) {
    const dx = lean * 0.9 + (i === 0 ? 0 : (random() - 0.5) * 0.12 * at.scale)
    const dy = top + (i === 0 ? 0 : (random() - 0.4) * 0.1 * at.scale)
    if (i > 0 && at.scale > 90)
      blade(
        layer,
        at.x + lean * 0.5,
        at.y - top * 0.7,
        dy - top * 0.7,
        dx - lean * 0.5,
        0.004 * at.scale,
        tip,
        tip,
      )
    flower(
      layer,
      at.x + dx,
      at.y - dy,
      size,
      red ? 5 : 4,
      random() * 3,
      0.45 + 0.45 * random(),
      color,
      red ? scale(grassDark, 0.4) : goldDeep,
    )
  }
}
