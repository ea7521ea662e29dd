import { deltaE00 } from '@/lib/color/ciede2000'
import type { MatchShade } from '@/lib/color/match'
import { hueOf, type Lab } from '@/lib/color/types'

/** A seeded source of numbers 0 ≤ x < 1. @source mulberry32, common practice */
export function seededRandom(seed: number): () => number {
  let state = seed | 0
  return () => {
    state = (state + 0x6d2b79f5) | 0
    let t = Math.imul(state ^ (state >>> 15), 1 | state)
    t = (t + Math.imul(t ^ (t >>> 7), 61 | t)) ^ t
    return ((t ^ (t >>> 14)) >>> 0) / 4294967296
  }
}

/** Roughly how far acid dyes on wool reach: hue, the L* of the fullest shade, its chroma. */
const FULLEST: [hue: number, lightness: number, chroma: number][] = [
  [0, 45, 56],
  [30, 42, 62],
  [60, 60, 68],
  [90, 78, 76],
  [120, 68, 56],
  [150, 50, 46],
  [190, 46, 38],
  [230, 46, 40],
  [270, 36, 44],
  [300, 32, 44],
  [330, 42, 54],
  [360, 45, 56],
]

function fullest(hue: number): { lightness: number; chroma: number } {
  const after = Math.max(
    1,
    FULLEST.findIndex(([at]) => at >= hue),
  )
  const [h0, l0, c0] = FULLEST[after - 1]!
  const [h1, l1, c1] = FULLEST[after]!
  const t = (hue - h0) / (h1 - h0)
  return { lightness: l0 + t * (l1 - l0), chroma: c0 + t * (c1 - c0) }
}

/**
 * A line of `size` shades as a dyer builds one, the same for the same seed: one in eight neutral
 * from bleached to black, the rest round the hue circle in pale, mid and deep, clear and saddened.
 * No two nearer than a just visible step (for 500, half of one).
 */
export function dyedLine(size: number, seed = 7): MatchShade[] {
  const random = seededRandom(seed)
  const labs: Lab[] = []
  const neutrals = Math.round(size / 8)
  const step = size > 100 ? 1.2 : 2.5
  for (let n = 0; n < neutrals; n++) {
    const L = 92 - (78 * n) / Math.max(1, neutrals - 1)
    labs.push([L, random() * 2 - 0.5, 2 + random() * 6 * (L / 92)])
  }
  for (let tries = 0; labs.length < size; tries++) {
    // The golden angle spreads the hues evenly at any size.
    const hue = (labs.length * 137.508 + random() * 24) % 360
    const { lightness, chroma } = fullest(hue)
    const L = 20 + 68 * random()
    const reach = L > lightness ? (96 - L) / (96 - lightness) : (L - 4) / (lightness - 4)
    const C = chroma * Math.min(1, Math.max(0.12, reach)) * (0.3 + 0.7 * Math.sqrt(random()))
    const lab: Lab = [
      L,
      C * Math.cos((hue * Math.PI) / 180),
      C * Math.sin((hue * Math.PI) / 180),
    ]
    if (tries > size * 200 || labs.every((other) => deltaE00(lab, other) >= step)) labs.push(lab)
  }
  return labs
    .sort((a, b) => hueOf(a) - hueOf(b) || b[0] - a[0])
    .map((lab, s) => ({ id: String(s + 1), lab }))
}
