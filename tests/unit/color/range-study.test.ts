import fc from 'fast-check'
import { describe, expect, test } from 'vitest'

import { deltaE00 } from '@/lib/color/ciede2000'
import { lightnessLadder, nearTwins } from '@/lib/color/range-study'
import type { Lab } from '@/lib/color/types'

const anyLab: fc.Arbitrary<Lab> = fc.tuple(
  fc.double({ min: 0, max: 100, noNaN: true }),
  fc.double({ min: -20, max: 20, noNaN: true }),
  fc.double({ min: -20, max: 20, noNaN: true }),
)
const greys = (...lightness: number[]) => lightness.map((L): Lab => [L, 0, 0])

describe('near-twins', () => {
  test('are every pair under the limit and no other, the nearest first', () => {
    fc.assert(
      fc.property(
        fc.array(anyLab, { maxLength: 15 }),
        fc.double({ min: 0, max: 12, noNaN: true }),
        (labs, limit) => {
          const twins = nearTwins(labs, limit)
          const expected = labs.flatMap((one, first) =>
            labs.flatMap((other, second) =>
              second > first && deltaE00(one, other) < limit ? [`${first} ${second}`] : [],
            ),
          )
          expect(twins.map(({ first, second }) => `${first} ${second}`).sort()).toEqual(
            expected.sort(),
          )
          twins.forEach(({ first, second, deltaE }, at) => {
            expect(deltaE).toBe(deltaE00(labs[first]!, labs[second]!))
            if (at > 0) expect(deltaE).toBeGreaterThanOrEqual(twins[at - 1]!.deltaE)
          })
        },
      ),
    )
  })

  test('a pair exactly at the limit is none, and equal shades are', () => {
    const pair = greys(40, 60)
    const apart = deltaE00(pair[0]!, pair[1]!)
    expect(nearTwins(pair, apart)).toEqual([])
    expect(nearTwins(pair, apart + 1e-9)).toHaveLength(1)
    expect(nearTwins(greys(50, 50))).toEqual([{ first: 0, second: 1, deltaE: 0 }])
  })

  test('need a limit that says something', () => {
    expect(() => nearTwins([], Number.NaN)).toThrow(RangeError)
    expect(() => nearTwins([], -1)).toThrow(RangeError)
  })
})

describe('a lightness ladder', () => {
  test('of equal steps is even, whatever the steps', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 3, max: 12 }),
        fc.double({ min: 0.5, max: 8, noNaN: true }),
        (shades, step) => {
          const ladder = lightnessLadder(
            Array.from({ length: shades }, (_, rung): Lab => [rung * step, 0, 0]),
          )
          expect(ladder.evenness).toBeCloseTo(1, 9)
          expect(ladder.order[0]).toBe(shades - 1)
        },
      ),
    )
  })

  test('with all its length in one step is as uneven as can be', () => {
    expect(lightnessLadder(greys(90, 90, 90, 20)).evenness).toBeCloseTo(0, 12)
  })

  // Steps 10, 30 and 20 of 60: a sixth of the ladder would have to move, of two thirds at most.
  test('says what part of it would have to move', () => {
    const ladder = lightnessLadder(greys(40, 80, 90, 20 + 10))
    expect(ladder).toEqual({
      order: [2, 1, 0, 3],
      span: 60,
      widest: { above: 1, step: 40 },
      evenness: 1 - (40 / 60 - 1 / 3) / (2 / 3),
    })
  })

  test('does not depend on the order given, nor on how light it is as a whole', () => {
    fc.assert(
      fc.property(fc.array(anyLab, { minLength: 3, maxLength: 10 }), (labs) => {
        const { evenness, span } = lightnessLadder(labs)
        const reversed = lightnessLadder([...labs].reverse())
        expect(reversed.span).toBeCloseTo(span, 9)
        if (span > 1e-6) {
          expect(reversed.evenness).toBeCloseTo(evenness!, 9)
          const darker = labs.map(([L, a, b]): Lab => [L / 2, a, b])
          expect(lightnessLadder(darker).evenness).toBeCloseTo(evenness!, 9)
        }
      }),
    )
  })

  test('of fewer than three, or of one lightness, has no evenness', () => {
    expect(lightnessLadder([])).toEqual({ order: [], span: 0, widest: null, evenness: null })
    expect(lightnessLadder(greys(40)).evenness).toBeNull()
    expect(lightnessLadder(greys(40, 60)).evenness).toBeNull()
    expect(lightnessLadder(greys(40, 40, 40)).evenness).toBeNull()
  })
})
