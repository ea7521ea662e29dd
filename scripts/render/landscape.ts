import type { Camera, Vector } from './camera'
import { mix, noise2, smoothstep } from './noise'
import { samplePicture, type Picture, type Rgb } from './picture'
import { clearSky, type Sky } from './sky'

/** What the land is made of. */
export interface Land {
  /** metres; `grain` is the width of a pixel there, so that detail finer than it can be left out */
  height(x: number, z: number, grain: number): number
  /** light leaving the ground towards the camera, before any air, into `out` */
  shade(place: Vector, normal: Vector, distance: number, out: Rgb): void
  near: number
  far: number
}

/** The air between: distance and low-lying mist. */
export interface Air {
  /** extinction per metre, per channel: blue is lost first */
  density: Rgb
  color: Rgb
  /** added towards the sun */
  glow: Rgb
  /** extinction per metre of mist at its level, metres where it is thickest, and how fast it thins */
  mist: number
  mistLevel: number
  mistHeight: number
}

/** Still or ruffled water at one level. */
export interface Water {
  level: number
  /** slope of the ripples, 0.01 nearly still */
  ruffle: number
  /** colour from under the surface */
  depthColor: Rgb
}

/** Everything a landscape is rendered from. */
export interface Scene {
  camera: Camera
  sky: Sky
  land: Land
  air: Air
  water?: Water
}

/** Puts the air between the camera and a place, in place in `color`. */
export function applyAir(scene: Scene, d: Vector, distance: number, y: number, color: Rgb): void {
  const { air, sky, camera } = scene
  const towards = Math.max(0, d.x * sky.sun.x + d.y * sky.sun.y + d.z * sky.sun.z) ** 5
  const middle = (camera.y + y * 2) / 3
  const thick = Math.exp(-Math.max(0, middle - air.mistLevel) / air.mistHeight)
  const mist = air.mist * thick * distance
  for (let c = 0; c < 3; c++) {
    const through = Math.exp(-air.density[c]! * distance - mist)
    const veil = air.color[c]! + air.glow[c]! * towards
    color[c] = mix(veil, color[c]!, through)
  }
}

/**
 * Renders land and water over a picture that already holds the sky, column by column from near to
 * far. Returns the depth of each pixel in metres (Infinity for sky). Cost: width × ln(far/near).
 */
export function renderLand(scene: Scene, picture: Picture): Float32Array {
  const { camera, land, water } = scene
  const { width, height } = picture
  const behind: Picture = { width, height, data: new Float32Array(picture.data) }
  const depth = new Float32Array(width * height).fill(Infinity)
  const lens = width * camera.focal
  const horizon = height * camera.horizon
  const level = water?.level ?? -Infinity
  const ratio = 1 + 0.8 / lens + 0.0006
  const color: Rgb = [0, 0, 0]
  for (let px = 0; px < width; px++) {
    const slope = ((px + 0.5) / width - 0.5) / camera.focal
    let top = height
    let lastRow = height
    let lastZ = land.near
    for (let z = land.near; z < land.far && top > 0; z *= ratio) {
      const ground = land.height(camera.x + slope * z, camera.z + z, z / lens)
      const row = horizon - ((Math.max(level, ground) - camera.y) * lens) / z
      const first = Math.max(0, Math.ceil(row - 0.5))
      for (let py = top - 1; py >= first; py--) {
        const t =
          lastRow > row ? Math.min(1, Math.max(0, (lastRow - py - 0.5) / (lastRow - row))) : 1
        const hitZ = mix(lastZ, z, t)
        shadePixel(scene, behind, slope, (horizon - py - 0.5) / lens, hitZ, color)
        picture.data.set(color, (py * width + px) * 3)
        depth[py * width + px] = hitZ
      }
      top = Math.min(top, first)
      lastRow = row
      lastZ = z
    }
  }
  return depth
}

function shadePixel(scene: Scene, sky: Picture, u: number, v: number, z: number, out: Rgb): void {
  const { camera, land, water } = scene
  const length = Math.hypot(u, v, 1)
  const d = { x: u / length, y: v / length, z: 1 / length }
  const x = camera.x + u * z
  const worldZ = camera.z + z
  const grain = z / (sky.width * camera.focal)
  const y = land.height(x, worldZ, grain)
  if (water && y < water.level) {
    shadeWater(scene, water, sky, x, worldZ, d, z * length, water.level - y, out)
    applyAir(scene, d, z * length, water.level, out)
    return
  }
  land.shade({ x, y, z: worldZ }, normalAt(land, x, worldZ, y, grain), z * length, out)
  applyAir(scene, d, z * length, y, out)
}

function normalAt(land: Land, x: number, z: number, y: number, grain: number): Vector {
  const e = Math.max(0.02, grain * 1.2)
  const dx = (land.height(x + e, z, grain) - y) / e
  const dz = (land.height(x, z + e, grain) - y) / e
  const n = 1 / Math.hypot(dx, 1, dz)
  return { x: -dx * n, y: n, z: -dz * n }
}

function shadeWater(
  scene: Scene,
  water: Water,
  sky: Picture,
  x: number,
  z: number,
  d: Vector,
  distance: number,
  depth: number,
  out: Rgb,
): void {
  const { camera } = scene
  // Patches of breeze, and ripples that are long across the view; far ones average out.
  const breeze = smoothstep(-0.25, 0.5, noise2(x * 0.011, z * 0.005, 501))
  const fade = 1 / (1 + distance * 0.0022)
  const ruffle = water.ruffle * (0.25 + breeze * 1.3) * fade
  const nx = ruffle * 0.5 * (noise2(x * 0.7, z * 0.9, 502) + noise2(x * 2.1, z * 2.9, 503) * 0.7)
  const nz =
    ruffle *
    (noise2(x * 0.35, z * 1.1, 504) +
      noise2(x * 1.3, z * 3.7, 505) * 0.8 +
      noise2(x * 5, z * 11, 506) * 0.5)
  const along = d.x * nx + d.y + d.z * nz
  const r = {
    x: d.x - 2 * along * nx,
    y: Math.max(0.004, d.y - 2 * along),
    z: d.z - 2 * along * nz,
  }
  const facing = Math.min(1, Math.abs(along))
  const fresnel = 0.02 + 0.98 * (1 - facing) ** 5
  if (!reflectLand(scene, x, water.level, z, r, out)) {
    const px = sky.width / 2 + (r.x / r.z) * sky.width * camera.focal
    const py = sky.height * camera.horizon - (r.y / r.z) * sky.width * camera.focal
    if (py < 0) clearSky(scene.sky, r, out)
    else samplePicture(sky, px, py, out)
  }
  const shallow = Math.exp(-depth * 0.5)
  for (let c = 0; c < 3; c++) {
    const under = water.depthColor[c]! * (1 + shallow * 2.5)
    out[c] = mix(under, out[c]!, fresnel)
  }
}

function reflectLand(
  { land, air }: Scene,
  x: number,
  y: number,
  z: number,
  r: Vector,
  out: Rgb,
): boolean {
  let t = 1.5
  let last = 0
  for (let i = 0; i < 160 && t < 6000; i++) {
    const py = y + r.y * t
    const h = land.height(x + r.x * t, z + r.z * t, 3)
    if (h > py) {
      let low = last
      for (let n = 0; n < 5; n++) {
        const middle = (low + t) / 2
        const under = land.height(x + r.x * middle, z + r.z * middle, 3)
        if (under > y + r.y * middle) t = middle
        else low = middle
      }
      const place = { x: x + r.x * t, y: y + r.y * t, z: z + r.z * t }
      land.shade(place, normalAt(land, place.x, place.z, place.y, 3), t, out)
      for (let c = 0; c < 3; c++) {
        out[c] = mix(air.color[c]!, out[c]!, Math.exp(-air.density[c]! * t))
      }
      return true
    }
    last = t
    t += Math.max(1.2, (py - h) * 0.5, t * 0.018)
  }
  return false
}
