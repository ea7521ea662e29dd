import fc from 'fast-check'
import { describe, expect, it, test } from 'vitest'

import type { Lab } from '@/lib/color/types'
import { BOOK_FAMILIES, bookFamily, bookGroups, bookOrder } from '@/lib/shades/sample-book'

const lab = fc.tuple(
  fc.double({ min: 0, max: 100, noNaN: true }),
  fc.double({ min: -128, max: 128, noNaN: true }),
  fc.double({ min: -128, max: 128, noNaN: true }),
)
const lines = fc.array(lab.map((one: Lab) => ({ lab: one })))

/** A colour at a hue angle, in degrees, and vivid enough to have one. */
const atHue = (degrees: number): Lab => [
  55,
  40 * Math.cos((degrees * Math.PI) / 180),
  40 * Math.sin((degrees * Math.PI) / 180),
]

describe('the sample book', () => {
  // The unique hues in CIELAB, as commonly given.
  test.each([
    [24, 'Reds'],
    [90, 'Yellows'],
    [162, 'Greens'],
    [246, 'Blues'],
    [355, 'Reds'],
  ])('puts the hue of %d° among the %s', (degrees, family) => {
    expect(bookFamily(atHue(degrees))).toBe(family)
  })

  it('puts what has little chroma among the neutrals, whatever its hue', () => {
    expect(bookFamily([70, -3, 4])).toBe('Neutrals')
    expect(bookFamily([70, 0, 0])).toBe('Neutrals')
  })

  it('holds every shade once, each family once and light to dark', () => {
    fc.assert(
      fc.property(lines, (shades) => {
        const ordered = bookOrder(shades)
        const groups = bookGroups(ordered)
        expect(new Set(ordered)).toEqual(new Set(shades))
        expect(groups.flatMap((group) => group.shades)).toEqual(ordered)
        const families = groups.map(({ family }) => BOOK_FAMILIES.indexOf(family))
        expect(families).toEqual([...new Set(families)].sort((a, b) => a - b))
        for (const group of groups) {
          const lightness = group.shades.map((shade) => shade.lab[0])
          expect(lightness).toEqual([...lightness].sort((a, b) => b - a))
        }
      }),
    )
  })
})
