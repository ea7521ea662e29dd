import fc from 'fast-check'
import { describe, expect, test } from 'vitest'

import {
  bookPlace,
  chooseCut,
  cutHues,
  hueDistance,
  isNeutral,
  meanHue,
  neutralChroma,
  sortFamilies,
  type WeightedHue,
} from '@/lib/color/families'
import { labToOklch } from '@/lib/color/oklch'
import type { Lab } from '@/lib/color/types'
import { dyedLine } from '@/scripts/bench/line'

/**
 * The least weighted squared distance of some hues to one centre on the circle, by opening the
 * circle at every hue: whatever the hues, in an arc or not.
 */
function spreadOnCircle(hues: readonly WeightedHue[]): number {
  const sorted = hues.map(({ h, weight }) => ({ h: ((h % 360) + 360) % 360, weight }))
  sorted.sort((a, b) => a.h - b.h)
  const opened = sorted.map((_, cut) => {
    const line = sorted.map(({ h, weight }, at) => ({ h: at < cut ? h + 360 : h, weight }))
    const whole = line.reduce((sum, { weight }) => sum + weight, 0)
    const mean = line.reduce((sum, { h, weight }) => sum + h * weight, 0) / whole
    return line.reduce((sum, { h, weight }) => sum + weight * (h - mean) ** 2, 0)
  })
  return Math.min(...opened)
}

/** The least spread of all ways to put hues into at most so many groups, arcs or not. */
function bruteForce(hues: readonly WeightedHue[], count: number): number {
  let least = Infinity
  const groups: WeightedHue[][] = []
  const place = (at: number): void => {
    if (at === hues.length) {
      const spread = groups.reduce((sum, group) => sum + spreadOnCircle(group), 0)
      least = Math.min(least, spread)
      return
    }
    for (const group of groups) {
      group.push(hues[at]!)
      place(at + 1)
      group.pop()
    }
    if (groups.length === count) return
    groups.push([hues[at]!])
    place(at + 1)
    groups.pop()
  }
  place(0)
  return least
}

/** The least spread of all ways to cut the circle between neighbours. */
function bruteForceCuts(hues: readonly WeightedHue[], count: number): number {
  const sorted = hues.map(({ h, weight }) => ({ h: ((h % 360) + 360) % 360, weight }))
  sorted.sort((a, b) => a.h - b.h)
  const size = sorted.length
  const unrolled = [...sorted, ...sorted.map(({ h, weight }) => ({ h: h + 360, weight }))]
  const spread = (from: number, to: number) => {
    const arc = unrolled.slice(from, to)
    const whole = arc.reduce((sum, { weight }) => sum + weight, 0)
    const mean = arc.reduce((sum, { h, weight }) => sum + h * weight, 0) / whole
    return arc.reduce((sum, { h, weight }) => sum + weight * (h - mean) ** 2, 0)
  }
  const cheapest = (from: number, to: number, arcs: number): number => {
    if (arcs === 1) return spread(from, to)
    let least = Infinity
    for (let cut = from + 1; cut <= to - arcs + 1; cut++) {
      least = Math.min(least, spread(from, cut) + cheapest(cut, to, arcs - 1))
    }
    return least
  }
  return Math.min(...sorted.map((_, start) => cheapest(start, start + size, count)))
}

const hue = (whole: boolean): fc.Arbitrary<WeightedHue> =>
  fc.record({
    // Whole tens of degrees abound in ties, and stand opposite each other.
    h: whole
      ? fc.integer({ min: 0, max: 35 }).map((ten) => ten * 10)
      : fc.integer({ min: 0, max: 359_999 }).map((h) => h / 1000),
    weight: whole
      ? fc.integer({ min: 1, max: 3 })
      : fc.double({ min: 0.01, max: 0.3, noNaN: true }),
  })

const hues = (least: number, most: number) =>
  fc
    .boolean()
    .chain((whole) =>
      fc.uniqueArray(hue(whole), { minLength: least, maxLength: most, selector: ({ h }) => h }),
    )

const close = (one: number, other: number) =>
  expect(Math.abs(one - other)).toBeLessThanOrEqual(1e-6 * Math.max(1, other))

describe('the cut of the hue circle', () => {
  test('spreads as little as any grouping of the hues, arcs or not', () => {
    fc.assert(
      fc.property(hues(1, 8), fc.integer({ min: 1, max: 5 }), (line, count) => {
        fc.pre(count <= line.length)
        close(cutHues(line, count).spread, bruteForce(line, count))
      }),
      { numRuns: 300 },
    )
  })

  test('spreads as little as the best of all cuts between neighbours', () => {
    fc.assert(
      fc.property(hues(2, 13), fc.integer({ min: 1, max: 6 }), (line, count) => {
        fc.pre(count <= line.length)
        close(cutHues(line, count).spread, bruteForceCuts(line, count))
      }),
      { numRuns: 300 },
    )
  })

  test('puts every hue into one arc and says the spread of those arcs', () => {
    fc.assert(
      fc.property(hues(2, 40), fc.integer({ min: 1, max: 8 }), (line, count) => {
        fc.pre(count <= line.length)
        const { arcs, spread } = cutHues(line, count)
        expect(arcs).toHaveLength(count)
        expect(arcs.flat().sort((a, b) => a - b)).toEqual(line.map((_, at) => at))
        const sum = arcs.reduce(
          (total, arc) => total + spreadOnCircle(arc.map((at) => line[at]!)),
          0,
        )
        close(spread, sum)
      }),
    )
  })

  test('does not change when the circle is turned', () => {
    fc.assert(
      fc.property(hues(3, 30), fc.integer({ min: -720, max: 720 }), (line, turn) => {
        const turned = line.map(({ h, weight }) => ({ h: h + turn, weight }))
        const count = Math.min(4, line.length)
        close(cutHues(turned, count).spread, cutHues(line, count).spread)
      }),
    )
  })

  test.each([
    [40, 1],
    [40, 2],
    [500, 1],
    [500, 2],
  ])(
    'no move of a single shade betters it: %i shades, line %i',
    (size, seed) => {
      const line = dyedLine(size, seed)
        .map(({ lab }) => labToOklch(lab))
        .filter((color) => !isNeutral(color))
        .map(({ c, h }) => ({ h, weight: c }))
      for (const count of [5, 7, 10]) {
        const { arcs } = cutHues(line, count)
        const spreads = arcs.map((arc) => spreadOnCircle(arc.map((at) => line[at]!)))
        // Of a large arc every tenth, and always its ends.
        arcs.forEach((arc, from) => {
          const tried = arc.filter(
            (_, at) => arc.length < 12 || at % 10 === 0 || at > arc.length - 3,
          )
          for (const moved of tried) {
            const without = arc.filter((at) => at !== moved).map((at) => line[at]!)
            const left = without.length > 0 ? spreadOnCircle(without) : 0
            arcs.forEach((other, to) => {
              if (to === from) return
              const joined = spreadOnCircle([...other, moved].map((at) => line[at]!))
              expect(left + joined).toBeGreaterThanOrEqual(spreads[from]! + spreads[to]! - 1e-9)
            })
          }
        })
      }
    },
    60_000,
  )

  test('refuses more arcs than hues, none, and hues without weight', () => {
    expect(() => cutHues([{ h: 10, weight: 1 }], 2)).toThrow(RangeError)
    expect(() => cutHues([{ h: 10, weight: 1 }], 0)).toThrow(RangeError)
    expect(() => cutHues([{ h: 10, weight: 0 }], 1)).toThrow(RangeError)
    expect(() => cutHues([{ h: Number.NaN, weight: 1 }], 1)).toThrow(RangeError)
    expect(() =>
      cutHues(
        [
          { h: 10, weight: 1 },
          { h: 370, weight: 1 },
        ],
        2,
      ),
    ).toThrow(RangeError)
  })
})

describe('how many families', () => {
  /** Bunches of hues about some centres, `each` to a bunch, a few degrees wide. */
  const bunches = (centres: number[], each: number) =>
    centres.flatMap((centre) =>
      Array.from({ length: each }, (_, at) => ({ h: centre + at * 0.8, weight: 0.1 })),
    )

  test.each([
    [5, [5, 60, 130, 210, 300]],
    [6, [5, 60, 110, 160, 230, 310]],
    [8, [5, 50, 90, 135, 180, 225, 270, 315]],
    [10, [0, 36, 72, 108, 144, 180, 216, 252, 288, 324]],
  ])('finds %i bunches', (count, centres) => {
    expect(chooseCut(bunches(centres, 6)).arcs).toHaveLength(count)
  })

  test('is five to ten for a line, less for a few shades', () => {
    for (const seed of [1, 2, 3, 4, 5]) {
      for (const size of [40, 120]) {
        const families = sortFamilies(
          dyedLine(size, seed).map(({ lab }) => lab),
          null,
        )
        const dyed = families.filter(({ neutral }) => !neutral).length
        expect(dyed).toBeGreaterThanOrEqual(5)
        expect(dyed).toBeLessThanOrEqual(10)
      }
    }
    expect(chooseCut(bunches([20], 3)).arcs).toHaveLength(1)
    expect(chooseCut(bunches([20, 120], 2)).arcs).toHaveLength(2)
    expect(chooseCut([{ h: 20, weight: 1 }]).arcs).toEqual([[0]])
  })
})

describe('a line in families', () => {
  const line: Lab[] = [
    [89.6, 0.9, 10.4], // undyed
    [41.3, 53.6, 29.7], // red
    [36.2, -1.4, -4.3], // slate
    [46.8, -6.2, -34.4], // blue
    [84.2, -4.8, -8.3], // pale blue
    [30.6, 3.2, -33.1], // deep blue
    [18.7, 2.9, 3.2], // near black
  ]

  test('puts the neutrals apart, then goes round from red to blue, each light to dark', () => {
    expect(sortFamilies(line, 2)).toEqual([
      { neutral: true, members: [0, 2, 6] },
      { neutral: false, members: [1] },
      { neutral: false, members: [4, 3, 5] },
    ])
  })

  test('makes no more families than there are hues, and none of nothing', () => {
    expect(sortFamilies(line, 12)).toHaveLength(5)
    expect(sortFamilies([], null)).toEqual([])
    expect(sortFamilies([[50, 0, 0]], 5)).toEqual([{ neutral: true, members: [0] }])
  })

  test('asks more chroma of a dye that is very dark or very pale', () => {
    expect(neutralChroma(0.1)).toBe(0.04)
    expect(neutralChroma(0.6)).toBe(0.025)
    expect(neutralChroma(1)).toBe(0.033)
    fc.assert(
      fc.property(fc.double({ min: 0, max: 1, noNaN: true }), (l) => {
        expect(neutralChroma(l)).toBeGreaterThanOrEqual(0.025)
        expect(neutralChroma(l)).toBeLessThanOrEqual(0.04)
      }),
    )
  })

  test('has a mean hue across red, and none without colour', () => {
    const mean = meanHue([
      { l: 0.5, c: 0.1, h: 350 },
      { l: 0.5, c: 0.1, h: 20 },
    ])!
    expect(hueDistance(mean, 5)).toBeLessThan(1e-9)
    expect(meanHue([{ l: 0.5, c: 0, h: 0 }])).toBeNull()
    expect(bookPlace(345)).toBe(5)
    expect(bookPlace(335)).toBe(355)
  })
})
