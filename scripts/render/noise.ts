/** A seeded generator of numbers in [0, 1): mulberry32. @source common practice */
export function makeRandom(seed: number): () => number {
  let state = seed >>> 0
  return () => {
    state = (state + 0x6d2b79f5) >>> 0
    let t = Math.imul(state ^ (state >>> 15), state | 1)
    t ^= t + Math.imul(t ^ (t >>> 7), t | 61)
    return ((t ^ (t >>> 14)) >>> 0) / 4294967296
  }
}

function hashInt(x: number, y: number, z: number): number {
  let h = Math.imul(x, 0x27d4eb2d) ^ Math.imul(y, 0x165667b1) ^ Math.imul(z, 0x9e3779b1)
  h = Math.imul(h ^ (h >>> 15), 0x85ebca6b)
  h = Math.imul(h ^ (h >>> 13), 0xc2b2ae35)
  return (h ^ (h >>> 16)) >>> 0
}

/** A fixed number in [0, 1) for three integers. */
export function hash(x: number, y: number, z = 0): number {
  return hashInt(x, y, z) / 4294967296
}

const GRADIENTS = 256
const gradientX = new Float64Array(GRADIENTS)
const gradientY = new Float64Array(GRADIENTS)
for (let i = 0; i < GRADIENTS; i++) {
  gradientX[i] = Math.cos((i / GRADIENTS) * Math.PI * 2)
  gradientY[i] = Math.sin((i / GRADIENTS) * Math.PI * 2)
}

/** Gradient noise of the plane, about −1 to 1. @source Perlin (2002), quintic fade */
export function noise2(x: number, y: number, seed = 0): number {
  const ix = Math.floor(x)
  const iy = Math.floor(y)
  const fx = x - ix
  const fy = y - iy
  const u = fx * fx * fx * (fx * (fx * 6 - 15) + 10)
  const v = fy * fy * fy * (fy * (fy * 6 - 15) + 10)
  const g00 = hashInt(ix, iy, seed) & 255
  const g10 = hashInt(ix + 1, iy, seed) & 255
  const g01 = hashInt(ix, iy + 1, seed) & 255
  const g11 = hashInt(ix + 1, iy + 1, seed) & 255
  const a = gradientX[g00]! * fx + gradientY[g00]! * fy
  const b = gradientX[g10]! * (fx - 1) + gradientY[g10]! * fy
  const c = gradientX[g01]! * fx + gradientY[g01]! * (fy - 1)
  const d = gradientX[g11]! * (fx - 1) + gradientY[g11]! * (fy - 1)
  const top = a + (b - a) * u
  return 1.5 * (top + (c + (d - c) * u - top) * v)
}

/** Value noise of space, −1 to 1: cheap, for clouds and mist. */
export function noise3(x: number, y: number, z: number, seed = 0): number {
  const ix = Math.floor(x)
  const iy = Math.floor(y)
  const iz = Math.floor(z)
  const fx = x - ix
  const fy = y - iy
  const fz = z - iz
  const u = fx * fx * (3 - 2 * fx)
  const v = fy * fy * (3 - 2 * fy)
  const w = fz * fz * (3 - 2 * fz)
  const lower = lattice(ix, iy, iz + seed * 131, u, v)
  const upper = lattice(ix, iy, iz + 1 + seed * 131, u, v)
  return 2 * (lower + (upper - lower) * w) - 1
}

function lattice(ix: number, iy: number, iz: number, u: number, v: number): number {
  const a = hash(ix, iy, iz)
  const b = hash(ix + 1, iy, iz)
  const c = hash(ix, iy + 1, iz)
  const d = hash(ix + 1, iy + 1, iz)
  const top = a + (b - a) * u
  return top + (c + (d - c) * u - top) * v
}

/** Fractal sum of noise2, about −1 to 1; each octave is turned so that no grid shows. */
export function fbm2(x: number, y: number, octaves: number, seed = 0, gain = 0.5): number {
  let sum = 0
  let amplitude = 1
  let total = 0
  for (let i = 0; i < octaves; i++) {
    sum += amplitude * noise2(x, y, seed + i)
    total += amplitude
    amplitude *= gain
    const turned = 1.62 * x - 1.21 * y + 17.3
    y = 1.21 * x + 1.62 * y - 5.1
    x = turned
  }
  return sum / total
}

/** Fractal sum of noise3, about −1 to 1. */
export function fbm3(x: number, y: number, z: number, octaves: number, seed = 0): number {
  let sum = 0
  let amplitude = 0.5
  for (let i = 0; i < octaves; i++) {
    sum += amplitude * noise3(x, y, z, seed + i)
    amplitude *= 0.5
    x = x * 2.03 + 11.7
    y = y * 2.03 - 3.1
    z = z * 2.03 + 7.9
  }
  return sum
}

/** Ridged fractal noise, 0 to about 1: sharp crests, as of hills and cracked rock. */
export function ridged2(x: number, y: number, octaves: number, seed = 0): number {
  let sum = 0
  let amplitude = 0.5
  let weight = 1
  for (let i = 0; i < octaves; i++) {
    let n = 1 - Math.abs(noise2(x, y, seed + i))
    n *= n * weight
    weight = Math.min(1, Math.max(0, n * 1.8))
    sum += n * amplitude
    amplitude *= 0.5
    const turned = 1.6 * x - 1.2 * y + 9.2
    y = 1.2 * x + 1.6 * y - 3.7
    x = turned
  }
  return sum
}

/** The nearest and second nearest feature point of a jittered grid, and the nearest one's number. */
export interface Cell {
  nearest: number
  second: number
  id: number
}

/** Cellular noise of the plane into `out`; distances in cells. @source Worley (1996) */
export function worley2(x: number, y: number, seed: number, out: Cell): Cell {
  const ix = Math.floor(x)
  const iy = Math.floor(y)
  let nearest = 9
  let second = 9
  let id = 0
  for (let j = -1; j <= 1; j++) {
    for (let i = -1; i <= 1; i++) {
      const h = hashInt(ix + i, iy + j, seed)
      const dx = ix + i + (h & 0xffff) / 65536 - x
      const dy = iy + j + (h >>> 16) / 65536 - y
      const d = dx * dx + dy * dy
      if (d < nearest) {
        second = nearest
        nearest = d
        id = h
      } else if (d < second) {
        second = d
      }
    }
  }
  out.nearest = Math.sqrt(nearest)
  out.second = Math.sqrt(second)
  out.id = id
  return out
}

/** 0 below `from`, 1 above `to`, an S between; `from` may be the larger. */
export function smoothstep(from: number, to: number, x: number): number {
  const t = Math.min(1, Math.max(0, (x - from) / (to - from)))
  return t * t * (3 - 2 * t)
}

/** Linear interpolation. */
export function mix(a: number, b: number, t: number): number {
  return a + (b - a) * t
}
