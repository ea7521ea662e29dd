import fc from 'fast-check'
import { describe, expect, it } from 'vitest'

import { veilOutside } from '@/components/match/region'
import { meanColor } from '@/components/match/touch'
import { wishesQuery } from '@/components/match/use-wishes'
import { NO_CELL } from '@/lib/color/photograph-colors'
import { READING_KINDS } from '@/lib/color/readings'
import { srgbToLab } from '@/lib/color/srgb'
import { MOST_APART, readWishes } from '@/lib/photographs/wishes'

describe('the region of one of the five', () => {
  it('is left clear; every other pixel and every invisible one is veiled', () => {
    fc.assert(
      fc.property(
        fc.array(fc.oneof(fc.nat(9), fc.constant(NO_CELL)), { minLength: 6, maxLength: 6 }),
        fc.array(fc.nat(4), { minLength: 10, maxLength: 10 }),
        fc.nat(4),
        (pixels, assignment, place) => {
          const map = { width: 3, height: 2, cells: Uint8Array.from(pixels) }
          const veil = veilOutside(map, assignment, place)
          pixels.forEach((cell, at) => {
            const clear = cell !== NO_CELL && assignment[cell] === place
            expect(veil[at * 4 + 3] === 0).toBe(clear)
          })
        },
      ),
    )
  })
})

describe('the dropper', () => {
  it('of one colour reads that colour', () => {
    const pixels = Uint8ClampedArray.from([120, 90, 60, 255, 120, 90, 60, 255])
    const expected = srgbToLab(120 / 255, 90 / 255, 60 / 255)
    meanColor(pixels).forEach((value, axis) => expect(value).toBeCloseTo(expected[axis]!, 9))
  })

  it('of nothing is an error', () => {
    expect(() => meanColor(new Uint8ClampedArray())).toThrow(RangeError)
  })
})

describe('the wishes in an address', () => {
  it('come back as they were', () => {
    const wishes = fc.record({
      reading: fc.constantFrom(...READING_KINDS),
      lock: fc.uniqueArray(fc.uuid(), { maxLength: 5 }),
      exclude: fc.uniqueArray(fc.uuid(), { maxLength: 20 }),
      apart: fc.oneof(
        fc.constant(undefined),
        fc.integer({ min: 0, max: MOST_APART }).filter((apart) => apart !== 10),
      ),
    })
    fc.assert(
      fc.property(wishes, (asked) => {
        const query = Object.fromEntries(new URLSearchParams(wishesQuery(asked)))
        const { apart, ...rest } = readWishes(query)!
        expect({ ...rest, apart }).toEqual(asked)
      }),
    )
  })

  it('say nothing when nothing is asked', () => {
    expect(wishesQuery({ reading: 'true', lock: [], exclude: [], apart: 10 })).toBe('')
  })
})
