import fc from 'fast-check'
import { describe, expect, test } from 'vitest'

import { SHADE_LIMITS } from '@/lib/shades/constants'
import { nextNumbers } from '@/lib/shades/next-number'

describe('the next numbers of a line', () => {
  test.each([
    [
      ['1', '2', '3'],
      ['4', '5'],
    ],
    [
      ['001', '040', 'Old'],
      ['041', '042'],
    ],
    [
      ['TT-07', 'TT-12', '3'],
      ['TT-13', 'TT-14'],
    ],
    [['A9'], ['A10', 'A11']],
    [[], ['T1', 'T2']],
    [
      ['Moss', 'Fern'],
      ['T1', 'T2'],
    ],
    [
      ['t1', '0'],
      ['t2', 't3'],
    ],
    [
      ['7', 'b9', 'B10'],
      ['B11', 'B12'],
    ],
  ])('after %j are %j', (taken, expected) => {
    expect(nextNumbers(taken, 2)).toEqual(expected)
  })

  test('are never taken, nor too long, and differ', () => {
    const number = fc.stringMatching(/^[A-Za-z0-9-]{1,16}$/)
    fc.assert(
      fc.property(
        fc.array(number, { maxLength: 30 }),
        fc.integer({ min: 0, max: 6 }),
        (taken, count) => {
          const fresh = nextNumbers(taken, count)
          expect(fresh).toHaveLength(count)
          expect(new Set(fresh.map((one) => one.toLowerCase())).size).toBe(count)
          const held = new Set(taken.map((one) => one.toLowerCase()))
          for (const one of fresh) {
            expect(held.has(one.toLowerCase())).toBe(false)
            expect(one.length).toBeLessThanOrEqual(SHADE_LIMITS.number)
          }
        },
      ),
    )
  })
})
