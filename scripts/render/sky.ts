import type { Camera, Vector } from './camera'
import { fbm2, fbm3, mix, smoothstep } from './noise'
import { enlarge, makePicture, type Picture, type Rgb } from './picture'

/** A slab of cloud between two heights. */
export interface Clouds {
  /** metres above the camera */
  base: number
  top: number
  /** metres to one lump */
  lump: number
  /** share of the sky covered, 0–1 */
  cover: number
  /** extinction per metre at full density */
  density: number
  /** light of the sunlit side, and of the shaded side */
  lit: Rgb
  dark: Rgb
  /** distance over which clouds sink into the haze */
  haze: number
  /** stretches the lumps across the view; 1 is round */
  stretch?: number
  seed: number
}

/** The light of the sky. */
export interface Sky {
  /** towards the sun */
  sun: Vector
  zenith: Rgb
  horizon: Rgb
  /** added around the sun */
  glow: Rgb
  /** how tight the glow is; larger is tighter */
  glowPower: number
  clouds: Clouds[]
}

/** The clear sky in a direction (length 1), into `out`. */
export function clearSky(sky: Sky, d: Vector, out: Rgb): Rgb {
  const up = Math.max(0, d.y)
  const t = 1 - Math.exp(-up * 4.2)
  const towards = Math.max(0, d.x * sky.sun.x + d.y * sky.sun.y + d.z * sky.sun.z)
  const glow = towards ** sky.glowPower
  for (let c = 0; c < 3; c++) {
    out[c] = mix(sky.horizon[c]!, sky.zenith[c]!, t) + sky.glow[c]! * glow
  }
  return out
}

function cloudDensity(clouds: Clouds, x: number, y: number, z: number): number {
  const rise = (y - clouds.base) / (clouds.top - clouds.base)
  if (rise < 0 || rise > 1) return 0
  const k = 1 / clouds.lump
  const stretch = clouds.stretch ?? 1
  const broad = fbm2((x * k * 0.31) / stretch, z * k * 0.31, 3, clouds.seed)
  const lumps = fbm3((x * k) / stretch, y * k, z * k, 6, clouds.seed)
  // Flat below, heaped above.
  const profile = smoothstep(0, 0.12, rise) * smoothstep(1, 0.35, rise)
  const threshold = 0.55 - clouds.cover * 1.1
  return smoothstep(threshold, threshold + 0.42, broad * 0.55 + lumps * 0.9 + profile * 0.35 - 0.3)
}

function addClouds(sky: Sky, clouds: Clouds, d: Vector, jitter: number, out: Rgb): void {
  if (d.y < 0.012) return
  const start = clouds.base / d.y
  const end = Math.min(clouds.top / d.y, start + (clouds.top - clouds.base) * 6)
  const steps = 22
  const step = (end - start) / steps
  const reach = (clouds.top - clouds.base) * 0.16
  const towards = Math.max(0, d.x * sky.sun.x + d.y * sky.sun.y + d.z * sky.sun.z)
  const silver = 0.75 + 0.9 * towards ** 6
  let through = 1
  let bright = 0
  for (let i = 0; i < steps && through > 0.02; i++) {
    const t = start + (i + jitter) * step
    const x = d.x * t
    const y = d.y * t
    const z = d.z * t
    const density = cloudDensity(clouds, x, y, z)
    if (density < 0.004) continue
    let shade = 0
    for (let s = 1; s <= 4; s++) {
      const far = reach * s * s * 0.4
      shade +=
        cloudDensity(clouds, x + sky.sun.x * far, y + sky.sun.y * far, z + sky.sun.z * far) *
        reach *
        s *
        0.5
    }
    const opaque = 1 - Math.exp(-density * clouds.density * step)
    const direct = Math.exp(-shade * clouds.density) * silver
    bright += through * opaque * direct
    through *= 1 - opaque
  }
  const alpha = (1 - through) * Math.exp(-start / clouds.haze) * smoothstep(0.012, 0.05, d.y)
  if (alpha <= 0) return
  const light = bright / Math.max(1e-4, 1 - through)
  for (let c = 0; c < 3; c++) {
    out[c] = mix(out[c]!, mix(clouds.dark[c]!, clouds.lit[c]!, Math.min(1.4, light)), alpha)
  }
}

/** The sky behind everything, as the camera sees it; clouds are marched at a third of the size. */
export function renderSky(sky: Sky, camera: Camera, width: number, height: number): Picture {
  const small = makePicture(Math.ceil(width / 3), Math.ceil(height / 3))
  const color: Rgb = [0, 0, 0]
  for (let py = 0; py < small.height; py++) {
    const v = (camera.horizon - (py + 0.5) / small.height) * (height / width / camera.focal)
    // Below the horizon the sky is mirrored, which is what water wants to see there.
    const rise = Math.abs(v)
    for (let px = 0; px < small.width; px++) {
      const u = ((px + 0.5) / small.width - 0.5) / camera.focal
      const length = Math.hypot(u, rise, 1)
      const d = { x: u / length, y: rise / length, z: 1 / length }
      clearSky(sky, d, color)
      const jitter = ((px * 0.7548776662 + py * 0.56984029) % 1) * 0.9
      for (const clouds of sky.clouds) addClouds(sky, clouds, d, jitter, color)
      small.data.set(color, (py * small.width + px) * 3)
    }
  }
  return enlarge(small, width, height)
}
