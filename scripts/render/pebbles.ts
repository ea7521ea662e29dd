import type { Camera } from './camera'
import { makeRandom } from './noise'

/** Ellipsoid stones lying on y = 0, in a grid by which a ray finds them. */
export interface Beach {
  /** centres, 3 a stone, metres */
  center: Float64Array
  /** world → unit sphere, 9 a stone, row-major */
  turn: Float64Array
  size: Float64Array
  id: Uint32Array
  cell: number
  columns: number
  rows: number
  left: number
  /** stones overlapping each grid cell, and the top of the highest */
  lists: Int32Array[]
  tops: Float32Array
}

/** Where a ray met the beach; `stone` is −1 on the grit between. `u`, `v`, `w`: on the stone's own sphere. */
export interface Touch {
  t: number
  stone: number
  x: number
  y: number
  z: number
  nx: number
  ny: number
  nz: number
  u: number
  v: number
  w: number
  /** share of the sky seen, 0–1 */
  open: number
  /** 1 in the sun, 0 in the shade */
  lit: number
}

const SUN_X = -0.62
const SUN_Y = 0.68
const SUN_Z = 0.39
const NEAR = 0.5

/** Lays stones out to `far` metres, each coming to rest on those before it. Deterministic. */
export function layBeach(seed: number, far: number): Beach {
  const random = makeRandom(seed)
  const cell = 0.05
  const left = -far * 0.62
  const columns = Math.ceil((-left * 2) / cell)
  const rows = Math.ceil(far / cell)
  const count = 46000
  const center = new Float64Array(count * 3)
  const turn = new Float64Array(count * 9)
  const size = new Float64Array(count)
  const id = new Uint32Array(count)
  const step = 0.01
  const across = Math.ceil((-left * 2) / step)
  const ground = new Float32Array(across * Math.ceil(far / step))
  const lists: number[][] = Array.from({ length: columns * rows }, () => [])
  const tops = new Float32Array(columns * rows)
  for (let n = 0; n < count; n++) {
    const z = NEAR + random() ** 0.75 * (far - NEAR - 0.1)
    const x = (random() * 2 - 1) * Math.min(-left - 0.12, z * 0.62 + 0.1)
    const large = 0.009 + 0.05 * random() ** 4 + (random() < 0.012 ? 0.045 * random() : 0)
    const rx = large * (0.85 + random() * 0.35)
    const rz = large * (0.6 + random() * 0.3)
    const ry = large * (0.34 + random() * 0.3)
    const yaw = random() * Math.PI
    const tiltA = (random() - 0.5) * 0.5
    const tiltB = (random() - 0.5) * 0.5
    const gx = Math.floor((x - left) / step)
    const gz = Math.floor(z / step)
    const reach = Math.ceil((large * 0.7) / step)
    let rest = 0
    let points = 0
    let highest = 0
    for (let j = -reach; j <= reach; j++) {
      for (let i = -reach; i <= reach; i++) {
        const h = ground[(gz + j) * across + gx + i] ?? 0
        rest += h
        highest = Math.max(highest, h)
        points++
      }
    }
    rest /= points
    // A high heap rolls off; the stone is laid elsewhere.
    const y = rest * 0.65 + highest * 0.2 + ry * 0.62
    if (y + ry > 0.12) continue
    center.set([x, y, z], n * 3)
    turn.set(rotation(yaw, tiltA, tiltB, rx, ry, rz), n * 9)
    size[n] = large
    id[n] = Math.floor(random() * 4294967295)
    for (let j = -reach; j <= reach; j++) {
      for (let i = -reach; i <= reach; i++) {
        const d = (i * i + j * j) / (reach * reach + 0.5)
        const at = (gz + j) * across + gx + i
        if (d < 1 && at >= 0 && at < ground.length) {
          ground[at] = Math.max(ground[at]!, y + ry * Math.sqrt(1 - d))
        }
      }
    }
    const spread = Math.max(rx, rz) * 1.05
    for (let j = Math.floor((z - spread) / cell); j <= Math.floor((z + spread) / cell); j++) {
      for (
        let i = Math.floor((x - spread - left) / cell);
        i <= Math.floor((x + spread - left) / cell);
        i++
      ) {
        if (i < 0 || j < 0 || i >= columns || j >= rows) continue
        lists[j * columns + i]!.push(n)
        tops[j * columns + i] = Math.max(tops[j * columns + i]!, y + Math.max(ry, large * 0.6))
      }
    }
  }
  return {
    center,
    turn,
    size,
    id,
    cell,
    columns,
    rows,
    left,
    lists: lists.map((l) => Int32Array.from(l)),
    tops,
  }
}

function rotation(yaw: number, a: number, b: number, rx: number, ry: number, rz: number): number[] {
  const [cy, sy, ca, sa, cb, sb] = [yaw, a, b].flatMap((t) => [Math.cos(t), Math.sin(t)]) as [
    number,
    number,
    number,
    number,
    number,
    number,
  ]
  const rows = [
    [cy * cb, sb, sy * cb],
    [-cy * sb * ca - sy * sa, cb * ca, -sy * sb * ca + cy * sa],
    [cy * sb * sa - sy * ca, -cb * sa, sy * sb * sa + cy * ca],
  ]
  const radii = [rx, ry, rz]
  return rows.flatMap((row, i) => row.map((value) => value / radii[i]!))
}

function hitStone(
  beach: Beach,
  n: number,
  ox: number,
  oy: number,
  oz: number,
  dx: number,
  dy: number,
  dz: number,
): number {
  const { center: c, turn: m } = beach
  const px = ox - c[n * 3]!
  const py = oy - c[n * 3 + 1]!
  const pz = oz - c[n * 3 + 2]!
  const k = n * 9
  const ax = m[k]! * px + m[k + 1]! * py + m[k + 2]! * pz
  const ay = m[k + 3]! * px + m[k + 4]! * py + m[k + 5]! * pz
  const az = m[k + 6]! * px + m[k + 7]! * py + m[k + 8]! * pz
  const bx = m[k]! * dx + m[k + 1]! * dy + m[k + 2]! * dz
  const by = m[k + 3]! * dx + m[k + 4]! * dy + m[k + 5]! * dz
  const bz = m[k + 6]! * dx + m[k + 7]! * dy + m[k + 8]! * dz
  const qa = bx * bx + by * by + bz * bz
  const qb = ax * bx + ay * by + az * bz
  const qc = ax * ax + ay * ay + az * az - 1
  const root = qb * qb - qa * qc
  return root < 0 ? -1 : (-qb - Math.sqrt(root)) / qa
}

/** Follows the ray with slopes (u, v, 1) into the beach; false when it leaves it unmet. */
export function castBeach(
  beach: Beach,
  camera: Camera,
  u: number,
  v: number,
  touch: Touch,
): boolean {
  const ceiling = 0.15
  const start = Math.max(NEAR * 0.8, (camera.y - ceiling) / -v)
  const end = camera.y / -v
  if (start > beach.rows * beach.cell) return false
  const stride = beach.cell * 0.5
  let best = Infinity
  let stone = -1
  let lastCell = -1
  for (let z = start; z < end + stride && z < best + stride; z += stride) {
    const i = Math.floor((u * z - beach.left) / beach.cell)
    const j = Math.floor(z / beach.cell)
    if (i < 0 || j < 0 || i >= beach.columns || j >= beach.rows) continue
    const at = j * beach.columns + i
    if (at === lastCell || camera.y + v * (z + stride) > beach.tops[at]! + 0.05) continue
    lastCell = at
    for (const n of beach.lists[at]!) {
      const t = hitStone(beach, n, camera.x, camera.y, camera.z, u, v, 1)
      if (t > 0 && t < best && camera.y + v * t > -0.001) {
        best = t
        stone = n
      }
    }
  }
  touch.t = stone < 0 ? end : best
  touch.stone = stone
  touch.x = u * touch.t
  touch.y = camera.y + v * touch.t
  touch.z = touch.t
  if (stone < 0) {
    touch.nx = 0
    touch.ny = 1
    touch.nz = 0
  } else setNormal(beach, touch)
  setLight(beach, touch)
  return true
}

function setNormal({ center: c, turn: m }: Beach, touch: Touch): void {
  const n = touch.stone
  const k = n * 9
  const px = touch.x - c[n * 3]!
  const py = touch.y - c[n * 3 + 1]!
  const pz = touch.z - c[n * 3 + 2]!
  const a = m[k]! * px + m[k + 1]! * py + m[k + 2]! * pz
  const b = m[k + 3]! * px + m[k + 4]! * py + m[k + 5]! * pz
  const w = m[k + 6]! * px + m[k + 7]! * py + m[k + 8]! * pz
  touch.u = a
  touch.v = b
  touch.w = w
  const nx = m[k]! * a + m[k + 3]! * b + m[k + 6]! * w
  const ny = m[k + 1]! * a + m[k + 4]! * b + m[k + 7]! * w
  const nz = m[k + 2]! * a + m[k + 5]! * b + m[k + 8]! * w
  const s = 1 / Math.hypot(nx, ny, nz)
  touch.nx = nx * s
  touch.ny = ny * s
  touch.nz = nz * s
}

function setLight(beach: Beach, touch: Touch): void {
  const { center: c, size } = beach
  const ox = touch.x + touch.nx * 0.0006
  const oy = touch.y + touch.ny * 0.0006
  const oz = touch.z + touch.nz * 0.0006
  let open = 1
  let lit = 1
  let lastCell = -1
  for (let s = 0; s < 0.16 && oy + SUN_Y * s < 0.15; s += beach.cell * 0.5) {
    const i = Math.floor((ox + SUN_X * s - beach.left) / beach.cell)
    const j = Math.floor((oz + SUN_Z * s) / beach.cell)
    if (i < 0 || j < 0 || i >= beach.columns || j >= beach.rows) break
    const at = j * beach.columns + i
    if (at === lastCell) continue
    lastCell = at
    for (const n of beach.lists[at]!) {
      if (n === touch.stone) continue
      if (lit > 0 && hitStone(beach, n, ox, oy, oz, SUN_X, SUN_Y, SUN_Z) > 0) lit = 0
      if (s > 0) continue
      const vx = c[n * 3]! - ox
      const vy = c[n * 3 + 1]! - oy
      const vz = c[n * 3 + 2]! - oz
      const d = Math.hypot(vx, vy, vz) || 1e-6
      const towards = (vx * touch.nx + vy * touch.ny + vz * touch.nz) / d
      const radius = size[n]! * 0.75
      if (towards > -0.2)
        open *=
          1 -
          Math.min(0.75, ((towards + 0.2) / 1.2) * Math.min(1, (radius * radius) / (d * d)) * 0.8)
    }
  }
  touch.open = open * (0.25 + 0.75 * Math.min(1, Math.max(0, touch.y) / 0.035))
  touch.lit = lit
}
