import type { Vector } from './camera'
import { makeRandom } from './noise'

/** Heights on a square grid: `heights` size×size row-major, metres; row 0 is the nearest. */
export interface Field {
  size: number
  left: number
  near: number
  /** metres to one cell */
  cell: number
  heights: Float32Array
}

/** A field of `size`² heights over `extent` metres, from a function of the plane. */
export function makeField(
  size: number,
  left: number,
  near: number,
  extent: number,
  height: (x: number, z: number) => number,
): Field {
  const cell = extent / (size - 1)
  const heights = new Float32Array(size * size)
  for (let j = 0; j < size; j++) {
    for (let i = 0; i < size; i++) heights[j * size + i] = height(left + i * cell, near + j * cell)
  }
  return { size, left, near, cell, heights }
}

/** The smooth (cubic B-spline) value of any grid laid out like the field, at a place in metres. */
export function sampleField(field: Field, x: number, z: number, grid = field.heights): number {
  const { size } = field
  const px = Math.min(size - 3, Math.max(1, (x - field.left) / field.cell))
  const pz = Math.min(size - 3, Math.max(1, (z - field.near) / field.cell))
  const ix = Math.floor(px)
  const iz = Math.floor(pz)
  const u = px - ix
  const v = pz - iz
  const at = (iz - 1) * size + ix - 1
  const w0 = ((1 - u) * (1 - u) * (1 - u)) / 6
  const w1 = (3 * u * u * u - 6 * u * u + 4) / 6
  const w3 = (u * u * u) / 6
  const w2 = 1 - w0 - w1 - w3
  const v0 = ((1 - v) * (1 - v) * (1 - v)) / 6
  const v1 = (3 * v * v * v - 6 * v * v + 4) / 6
  const v3 = (v * v * v) / 6
  const v2 = 1 - v0 - v1 - v3
  let sum = 0
  // No inner function here: the runner names every closure it makes, which costs more than the sum.
  for (let j = 0; j < 4; j++) {
    const o = at + j * size
    const row = grid[o]! * w0 + grid[o + 1]! * w1 + grid[o + 2]! * w2 + grid[o + 3]! * w3
    sum += row * (j === 0 ? v0 : j === 1 ? v1 : j === 2 ? v2 : v3)
  }
  return sum
}

function bilinear(field: Field, px: number, pz: number): number {
  const { size, heights } = field
  const ix = Math.floor(px)
  const iz = Math.floor(pz)
  const u = px - ix
  const v = pz - iz
  const at = iz * size + ix
  const near = heights[at]! * (1 - u) + heights[at + 1]! * u
  const far = heights[at + size]! * (1 - u) + heights[at + size + 1]! * u
  return near * (1 - v) + far * v
}

/** Cuts gullies and lays down fans, in place, by rolling drops downhill. @source common practice */
export function erode(field: Field, drops: number, seed: number): void {
  const random = makeRandom(seed)
  const { size, heights } = field
  for (let n = 0; n < drops; n++) {
    let x = 2 + random() * (size - 5)
    let z = 2 + random() * (size - 5)
    let dx = 0
    let dz = 0
    let speed = 1
    let water = 1
    let load = 0
    for (let life = 0; life < 48; life++) {
      const at = Math.floor(z) * size + Math.floor(x)
      const u = x - Math.floor(x)
      const v = z - Math.floor(z)
      const a = heights[at]!
      const b = heights[at + 1]!
      const c = heights[at + size]!
      const d = heights[at + size + 1]!
      const slopeX = (b - a) * (1 - v) + (d - c) * v
      const slopeZ = (c - a) * (1 - u) + (d - b) * u
      dx = dx * 0.15 - slopeX * 0.85
      dz = dz * 0.15 - slopeZ * 0.85
      const length = Math.hypot(dx, dz)
      if (length < 1e-6) break
      dx /= length
      dz /= length
      const before = bilinear(field, x, z)
      x += dx
      z += dz
      if (x < 2 || z < 2 || x > size - 4 || z > size - 4) break
      const drop = before - bilinear(field, x, z)
      const capacity = Math.max(drop / field.cell, 0.01) * speed * water * field.cell * 1.6
      let change: number
      if (drop < 0) change = Math.min(load, -drop)
      else if (load > capacity) change = (load - capacity) * 0.3
      else change = -Math.min((capacity - load) * 0.22, drop * 0.7)
      load -= change
      heights[at] = heights[at]! + change * (1 - u) * (1 - v)
      heights[at + 1] = heights[at + 1]! + change * u * (1 - v)
      heights[at + size] = heights[at + size]! + change * (1 - u) * v
      heights[at + size + 1] = heights[at + size + 1]! + change * u * v
      speed = Math.sqrt(Math.max(0.05, speed * speed + drop * 0.6))
      water *= 0.975
    }
  }
}

/** How much of the sun each grid point sees, 0–1, with a soft edge. Cost: grid × march. */
export function sunlight(field: Field, sun: Vector): Float32Array {
  const { size, heights, cell } = field
  const lit = new Float32Array(size * size)
  const flat = Math.hypot(sun.x, sun.z)
  const stepX = sun.x / flat
  const stepZ = sun.z / flat
  const climb = (sun.y / flat) * cell
  let highest = -Infinity
  for (const h of heights) highest = Math.max(highest, h)
  for (let j = 0; j < size; j++) {
    for (let i = 0; i < size; i++) {
      const start = heights[j * size + i]! + 0.15 * cell
      let clear = 1
      for (let n = 1; n < size; n += 1 + n * 0.02) {
        const x = i + stepX * n
        const z = j + stepZ * n
        const level = start + climb * n
        if (x < 0 || z < 0 || x > size - 2 || z > size - 2 || level > highest) break
        const room = (level - bilinear(field, x, z)) / (n * cell * 0.03)
        clear = Math.min(clear, 0.5 + room * 0.5)
        if (clear <= 0) break
      }
      lit[j * size + i] = Math.max(0, clear)
    }
  }
  return lit
}
