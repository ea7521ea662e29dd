import { project, unit, type Camera, type Vector } from '../camera'
import type { Development } from '../develop'
import { renderLand, type Scene } from '../landscape'
import { focus } from '../lens'
import { fbm2, makeRandom, noise2, smoothstep, worley2, type Cell } from '../noise'
import {
  blend,
  composite,
  ellipse,
  halve,
  makeLayer,
  makePicture,
  paint,
  scale,
  stroke,
  type Picture,
  type Rgb,
} from '../picture'
import { renderSky, type Sky } from '../sky'
import { makeField, sampleField, sunlight } from '../terrain'

/** How this picture is developed. */
export const development: Development = { exposure: 1.1, contrast: 0.3, vignette: 0.25 }

const sun = unit({ x: -0.6, y: 0.5, z: -0.4 })
const sky: Sky = {
  sun,
  zenith: paint('#4e5e70'),
  horizon: paint('#9aa6ad'),
  glow: [0.1, 0.1, 0.08],
  glowPower: 4,
  clouds: [
    {
      base: 700,
      top: 1900,
      lump: 1100,
      cover: 0.82,
      density: 0.009,
      lit: [0.5, 0.52, 0.56],
      dark: paint('#414b5a'),
      haze: 14000,
      stretch: 1.8,
      seed: 77,
    },
  ],
}
const grass = paint('#6d8038')
const grassLight = paint('#a7ab55')
const grassDark = paint('#3f5226')
const butter = paint('#dcb22c')
const butterLight = paint('#f0d25a')
const poppy = paint('#b3261e')
const hedge = paint('#2c3a22')
const hill = paint('#5b6b45')
const cell: Cell = { nearest: 0, second: 0, id: 0 }

function relief(x: number, z: number): number {
  const roll = 7 * fbm2(x * 0.004, z * 0.004, 3, 5) * smoothstep(20, 200, z)
  const hills = 150 * smoothstep(900, 2600, z) * (0.5 + fbm2(x * 0.0007, z * 0.0009, 4, 8))
  return 10 + roll + hills
}
const inHedge = (x: number, z: number) =>
  smoothstep(9, 4, Math.abs(z - 210 - 14 * Math.sin(x * 0.012))) +
  smoothstep(7, 3, Math.abs(z - 480 - x * 0.3))

/** A sunlit meadow under a storm cloud. */
export function render(width: number, height: number): Picture {
  const field = makeField(700, -1800, -100, 3600, relief)
  const lit = sunlight(field, sun)
  const camera: Camera = {
    x: 0,
    y: sampleField(field, 0, 0) + 1.15,
    z: 0,
    focal: 0.95,
    horizon: 0.5,
  }
  const scene: Scene = {
    camera,
    sky,
    land: {
      near: 1.2,
      far: 3300,
      height: (x, z, grain) => cover(x, z, grain, sampleField(field, x, z)),
      shade: (place, normal, _distance, out) =>
        shade(place, normal, sampleField(field, place.x, place.z, lit), out),
    },
    air: {
      density: [0.00022, 0.00026, 0.00033],
      color: paint('#8995a0'),
      glow: [0, 0, 0],
      mist: 0,
      mistLevel: 0,
      mistHeight: 20,
    },
  }
  const big = makePicture(width * 2, height * 2)
  big.data.set(renderSky(sky, camera, big.width, big.height).data)
  const depth = renderLand(scene, big)
  plant(big, depth, camera, (x, z) => sampleField(field, x, z))
  focus(big, depth, 6, 26, 12)
  return halve(big)
}

function cover(x: number, z: number, grain: number, base: number): number {
  let h = base
  const hedges = inHedge(x, z)
  if (hedges > 0.02) {
    worley2(x * 0.22, z * 0.22, 43, cell)
    h += hedges * (3.2 + 4 * Math.max(0, 1 - cell.nearest * 1.6))
  }
  if (z > 620) {
    worley2(x * 0.03, z * 0.03, 47, cell)
    if ((cell.id & 7) === 0) h += 10 * Math.max(0, 1 - cell.nearest * 2.6)
  }
  if (grain < 0.3) h += 0.14 * noise2(x * 4, z * 4, 46)
  return h
}

function shade({ x, y, z }: Vector, n: Vector, sunlit: number, out: Rgb): void {
  const fine = fbm2(x * 0.6, z * 0.6, 4, 52)
  const speck = noise2(x * 5, z * 5, 53)
  let color = blend(grassDark, grass, 0.55 + fine * 0.7)
  color = blend(color, grassLight, smoothstep(0, 0.5, speck * 0.5 + fine * 0.5))
  color = blend(
    color,
    butter,
    smoothstep(-0.05, 0.4, fbm2(x * 0.045, z * 0.03, 4, 55) + speck * 0.35) *
      smoothstep(260, 30, z) *
      0.85,
  )
  if (z > 225)
    color = blend(
      hill,
      blend(paint('#8e8a4a'), paint('#4e6136'), fine + 0.5),
      0.5 + 0.5 * Math.sign(fbm2(x * 0.004, z * 0.004, 2, 58)),
    )
  if (inHedge(x, z) > 0.1 || (z > 620 && y - relief(x, z) > 1))
    color = blend(hedge, paint('#4f6136'), 0.3 + speck * 0.4)
  color = scale(color, 1 + 0.25 * speck)
  const facing = Math.max(0, n.x * sun.x + n.y * sun.y + n.z * sun.z)
  const gap = smoothstep(900, 250, z) * 0.75 + 0.25
  const direct = facing * sunlit * gap
  out[0] = color[0] * (2.5 * direct + 0.3)
  out[1] = color[1] * (2.3 * direct + 0.34)
  out[2] = color[2] * (1.8 * direct + 0.42)
}

/** Blades and flowers of the near meadow, far before near. */
function plant(
  picture: Picture,
  depth: Float32Array,
  camera: Camera,
  ground: (x: number, z: number) => number,
): void {
  const random = makeRandom(4242)
  const { width, height } = picture
  const layer = makeLayer(width, height)
  const plants = Array.from({ length: 15000 }, () => {
    const z = 1.3 + 38 * random() ** 2.1
    return {
      z,
      x: (random() - 0.5) * (z * 1.25 + 1),
      grow: random(),
      kind: random(),
      lean: random() - 0.5,
    }
  }).sort((a, b) => b.z - a.z)
  for (const { x, z, grow, kind, lean } of plants) {
    const patch = fbm2(x * 0.35, z * 0.22, 3, 61)
    const tall = (0.28 + grow * 0.5) * (0.8 + 0.5 * patch)
    const foot = project(camera, width, height, { x, y: ground(x, z), z })
    const head = project(camera, width, height, {
      x: x + lean * tall * 0.5,
      y: ground(x, z) + tall,
      z,
    })
    const near = smoothstep(20, 2, z)
    const light = 1.5 + 0.7 * grow
    const blade = scale(blend(grassDark, blend(grass, grassLight, grow), 0.45 + 0.55 * grow), light)
    stroke(
      layer,
      foot.x,
      foot.y,
      head.x,
      head.y,
      foot.scale * 0.0045,
      foot.scale * 0.0012,
      scale(grassDark, 0.6),
      blade,
    )
    const size = foot.scale * (0.013 + 0.009 * grow)
    if (kind < 0.34 + patch * 0.5) {
      ellipse(
        layer,
        head.x,
        head.y,
        size,
        size * 0.72,
        lean,
        scale(blend(butter, butterLight, grow), 2.1),
        1,
        0.35,
      )
      if (near > 0.3)
        ellipse(
          layer,
          head.x,
          head.y + size * 0.15,
          size * 0.34,
          size * 0.24,
          0,
          scale(butter, 1.1),
        )
    } else if (kind > 0.988) {
      ellipse(layer, head.x, head.y, size * 2.6, size * 1.9, lean, scale(poppy, 2.3), 1, 0.4)
      ellipse(
        layer,
        head.x - size * 0.6,
        head.y - size * 0.3,
        size * 1.5,
        size * 1.3,
        lean + 0.5,
        scale(poppy, 2.8),
        0.9,
        0.4,
      )
      ellipse(layer, head.x, head.y + size * 0.3, size * 0.5, size * 0.4, 0, paint('#241a1c'))
    }
    const row = Math.round(Math.min(height - 1, Math.max(0, head.y)))
    const column = Math.round(Math.min(width - 1, Math.max(0, head.x)))
    depth[row * width + column] = Math.min(depth[row * width + column]!, z)
  }
  composite(picture, layer)
}
