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

/** How a shade lies to the fullest of its hue: L* moved this far to white or black, chroma kept. */
const DEPTHS: [toWhite: number, toBlack: number, chroma: number][] = [
  [0, 0, 0.95], // clear
  [0.55, 0, 0.5], // pale
  [0, 0.5, 0.55], // deep
  [0.1, 0.1, 0.45], // saddened
]

/**
 * A line of `size` shades as a dyer builds one, the same for the same seed: one in eight neutral
 * from bleached to black, the rest round the hue circle clear, pale, deep and saddened, each a
 * little off its mark. No two nearer than a visible step (for 500, half of one).
 */
export function dyedLine(size: number, seed = 7): MatchShade[] {
  const random = seededRandom(seed)
  const labs: Lab[] = []
  const neutrals = Math.round(size / 8)
  const step = size > 100 ? 1 : 2.5
  const spread = size > 100 ? 0.35 : 0.12
  for (let n = 0; n < neutrals; n++) {
    const L = 92 - (78 * n) / Math.max(1, neutrals - 1)
    labs.push([L, random() * 2 - 0.5, 2 + random() * 6 * (L / 92)])
  }
  while (labs.length < size) {
    const made = labs.length - neutrals
    // The golden angle spreads the hues of each depth evenly at any size.
    const hue = (Math.floor(made / 4) * 137.508 + (made % 4) * 34 + random() * 20) % 360
    const [toWhite, toBlack, keep] = DEPTHS[made % 4]!
    const { lightness, chroma } = fullest(hue)
    const off = () => (random() - 0.5) * 2 * spread
    const L =
      lightness + (95 - lightness) * (toWhite + off()) - (lightness - 12) * (toBlack + off())
    const C = Math.max(2, chroma * (keep + off()))
    const turn = (hue * Math.PI) / 180
    const lab: Lab = [Math.min(94, Math.max(13, L)), C * Math.cos(turn), C * Math.sin(turn)]
    if (labs.every((other) => deltaE00(lab, other) >= step)) labs.push(lab)
  }
  return labs
    .sort((a, b) => hueOf(a) - hueOf(b) || b[0] - a[0])
    .map((lab, s) => ({ id: String(s + 1), lab }))
}
