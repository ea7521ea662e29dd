import chroma from 'chroma-js'
import { differenceCiede2000 } from 'culori'
import fc from 'fast-check'
import { describe, expect, test } from 'vitest'

import { deltaE00, deltaE00Row, packLabs } from '@/lib/color/ciede2000'
import { hueOf, type Lab } from '@/lib/color/types'
import { seededRandom } from '@/scripts/bench/line'
import table from '@/tests/fixtures/color/ciede2000-pairs.json'

const culori = differenceCiede2000()
const viaCulori = ([l1, a1, b1]: Lab, [l2, a2, b2]: Lab): number =>
  culori({ mode: 'lab65', l: l1, a: a1, b: b1 }, { mode: 'lab65', l: l2, a: a2, b: b2 })

const channel = { noNaN: true, noDefaultInfinity: true } as const
const anyLab = fc.tuple(
  fc.double({ min: 0, max: 100, ...channel }),
  fc.double({ min: -128, max: 128, ...channel }),
  fc.double({ min: -128, max: 128, ...channel }),
)

describe(`the pairs of ${table.source}`, () => {
  test('are all there', () => expect(table.pairs).toHaveLength(34))

  test.each(table.pairs)('pair $n ($group) to four decimals, both ways round', (pair) => {
    const [one, other] = [pair.Lab1, pair.Lab2] as unknown as [Lab, Lab]
    expect(deltaE00(one, other).toFixed(4)).toBe(pair.dE00.toFixed(4))
    expect(deltaE00(other, one).toFixed(4)).toBe(pair.dE00.toFixed(4))
  })
})

test('agrees with culori to 1e-8 on 100,000 random pairs', () => {
  const random = seededRandom(1)
  const lab = (): Lab => [random() * 100, random() * 256 - 128, random() * 256 - 128]
  let worst = 0
  for (let pair = 0; pair < 100_000; pair++) {
    const [one, other] = [lab(), lab()]
    worst = Math.max(worst, Math.abs(deltaE00(one, other) - viaCulori(one, other)))
  }
  expect(worst).toBeLessThanOrEqual(1e-8)
})

test('agrees with culori where hues are opposite, equal, or there is none', () => {
  const pairs: [Lab, Lab][] = [
    [
      [50, 30, 0],
      [50, -30, 0],
    ],
    [
      [50, 0, 30],
      [60, 0, -30],
    ],
    [
      [50, 20, 20],
      [50, -20, -20],
    ],
    [
      [50, 20, 20],
      [70, 40, 40],
    ],
    [
      [50, 0, 0],
      [50, 0, -80],
    ],
    [
      [0, 0, 0],
      [100, 0, 0],
    ],
    [
      [40, -1e-9, 3],
      [40, 1e-9, 3],
    ],
  ]
  for (const [one, other] of pairs)
    expect(Math.abs(deltaE00(one, other) - viaCulori(one, other))).toBeLessThanOrEqual(1e-8)
})

test('weighs lightness, chroma and hue as culori does', () => {
  const random = seededRandom(2)
  const byTextiles = differenceCiede2000(2, 1.5, 0.8)
  for (let pair = 0; pair < 2000; pair++) {
    const one: Lab = [random() * 100, random() * 120 - 60, random() * 120 - 60]
    const other: Lab = [random() * 100, random() * 120 - 60, random() * 120 - 60]
    const theirs = byTextiles(
      { mode: 'lab65', l: one[0], a: one[1], b: one[2] },
      { mode: 'lab65', l: other[0], a: other[1], b: other[2] },
    )
    const ours = deltaE00(one, other, { kL: 2, kC: 1.5, kH: 0.8 })
    expect(Math.abs(ours - theirs)).toBeLessThanOrEqual(1e-8)
  }
})

test('agrees with chroma-js from its own Lab values', () => {
  const random = seededRandom(3)
  const hex = () =>
    `#${Math.floor(random() * 0x1000000)
      .toString(16)
      .padStart(6, '0')}`
  for (let pair = 0; pair < 5000; pair++) {
    const [one, other] = [hex(), hex()]
    const ours = deltaE00(
      chroma(one).lab() as unknown as Lab,
      chroma(other).lab() as unknown as Lab,
    )
    // chroma-js ends at 100, and lets the mean of hues either side of 0° run past 360°, which moves
    // its blue term a trace.
    const across = Math.abs(hueOf(chroma(one).lab()) - hueOf(chroma(other).lab())) > 170
    const apart = Math.abs(Math.min(100, ours) - chroma.deltaE(one, other))
    expect(apart).toBeLessThanOrEqual(across ? 1e-3 : 1e-8)
  }
})

test('is symmetric, never negative, and nothing from a colour to itself', () => {
  fc.assert(
    fc.property(anyLab, anyLab, (one, other) => {
      const there = deltaE00(one, other)
      expect(there).toBeGreaterThanOrEqual(0)
      expect(Math.abs(there - deltaE00(other, one))).toBeLessThanOrEqual(1e-9)
      expect(deltaE00(one, one)).toBe(0)
    }),
  )
})

test('is never less than the lightness difference alone would make it', () => {
  // What the match relies on to leave pairs unmeasured: S_L ≤ 1.75.
  fc.assert(
    fc.property(anyLab, anyLab, (one, other) => {
      expect(deltaE00(one, other)).toBeGreaterThanOrEqual(Math.abs(one[0] - other[0]) / 1.75 - 1e-9)
    }),
  )
})

test('a row is the differences one by one, from its offset on', () => {
  fc.assert(
    fc.property(anyLab, fc.array(anyLab, { maxLength: 12 }), fc.nat(4), (from, to, offset) => {
      const out = new Float64Array(to.length + offset).fill(-1)
      deltaE00Row(from, packLabs(to), out, offset)
      expect([...out.subarray(0, offset)]).toEqual(Array(offset).fill(-1))
      expect([...out.subarray(offset)]).toEqual(to.map((lab) => deltaE00(from, lab)))
    }),
  )
})
