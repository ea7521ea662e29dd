import fc from 'fast-check'
import { describe, expect, it, test } from 'vitest'

import type { Lab } from '@/lib/color/types'
import { bookFamily, bookGroups } from '@/lib/shades/sample-book'

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

  it('puts neighbours of one family together and leaves their order', () => {
    fc.assert(
      fc.property(lines, (shades) => {
        const groups = bookGroups(shades)
        expect(groups.flatMap((group) => group.shades)).toEqual(shades)
        for (const { family, shades: together } of groups) {
          expect(together.every((shade) => bookFamily(shade.lab) === family)).toBe(true)
        }
        const families = groups.map(({ family }) => family)
        expect(families.every((family, at) => family !== families[at - 1])).toBe(true)
      }),
    )
  })
})
