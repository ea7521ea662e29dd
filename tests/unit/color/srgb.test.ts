import { converter } from 'culori'
import fc from 'fast-check'
import { describe, expect, test } from 'vitest'

import { screenColor } from '@/lib/color/gamut'
import { displayP3ToLab, hexToLab, parseHex, srgbToLab } from '@/lib/color/srgb'
import { chromaOf, hueOf } from '@/lib/color/types'
import table from '@/tests/fixtures/color/srgb-lab-oklab.json'

const toLab65 = converter('lab65')
const anyHex = fc
  .integer({ min: 0, max: 0xffffff })
  .map((value) => `#${value.toString(16).padStart(6, '0')}`)
const unit = fc.double({ min: 0, max: 1, noNaN: true })

describe('sRGB to Lab D65', () => {
  test.each(table.colours)('$name $hex as published values say', ({ hex, labD65 }) => {
    hexToLab(hex).forEach((value, axis) => expect(value).toBeCloseTo(labD65[axis]!, 3))
  })

  test('agrees with culori on any colour', () => {
    fc.assert(
      fc.property(anyHex, (hex) => {
        const { l, a, b } = toLab65(hex)!
        const lab = hexToLab(hex)
        ;[l, a, b].forEach((value, axis) => expect(lab[axis]).toBeCloseTo(value, 9))
      }),
    )
  })

  test('a grey has no chroma at all', () => {
    fc.assert(
      fc.property(unit, (value) => {
        expect(chromaOf(srgbToLab(value, value, value))).toBe(0)
        expect(chromaOf(displayP3ToLab(value, value, value))).toBe(0)
      }),
    )
  })
})

test('Display P3 to Lab D65 agrees with culori', () => {
  fc.assert(
    fc.property(unit, unit, unit, (r, g, b) => {
      const lab = displayP3ToLab(r, g, b)
      const theirs = toLab65({ mode: 'p3', r, g, b })
      ;[theirs.l, theirs.a, theirs.b].forEach((value, axis) =>
        // culori goes on through XYZ and leaves 1e-5 of chroma in a grey.
        expect(Math.abs(lab[axis]! - value)).toBeLessThan(1e-4),
      )
    }),
  )
})

describe('reading a hex colour', () => {
  test('three or six digits, with or without the mark, in either case', () => {
    const written = ['#1fA', '1fa', ' #11ffaa ', '11FFAA'].map(parseHex)
    for (const channels of written) expect(channels).toEqual([17 / 255, 1, 170 / 255])
  })

  test.each(['', '#', '#12', '#12345', '#1234567', '#12345g', 'red', '##123456'])(
    '“%s” is none',
    (text) => {
      expect(parseHex(text)).toBeNull()
      expect(() => hexToLab(text)).toThrow(RangeError)
    },
  )
})

test('hue is counted from +a round to 360, and a neutral has 0', () => {
  expect(hueOf([50, 10, 0])).toBe(0)
  expect(hueOf([50, 0, 10])).toBe(90)
  expect(hueOf([50, 0, -10])).toBe(270)
  expect(hueOf([50, 0, 0])).toBe(0)
})

describe('the colour on a screen', () => {
  test('of any sRGB colour is that colour, inside the gamut', () => {
    fc.assert(
      fc.property(anyHex, (hex) => {
        expect(screenColor(hexToLab(hex))).toEqual({ hex, inGamut: true })
      }),
    )
  })

  test('of one beyond the screen keeps hue and lightness and gives up chroma', () => {
    const toOklch = converter('oklch')
    for (const lab of [
      [60, -70, 10],
      [50, 95, -95],
      [75, 25, 110],
      [45, -5, -60],
    ] as const) {
      const { hex, inGamut } = screenColor(lab)
      const wanted = toOklch({ mode: 'lab65', l: lab[0], a: lab[1], b: lab[2] })
      const shown = toOklch(hex)!
      expect(inGamut).toBe(false)
      expect(shown.c).toBeLessThan(wanted.c)
      expect(Math.abs(shown.l - wanted.l)).toBeLessThan(0.03)
      expect(Math.abs(shown.h! - wanted.h!)).toBeLessThan(6)
    }
  })

  test('of anything is six digits', () => {
    const axis = fc.double({ min: -150, max: 150, noNaN: true })
    fc.assert(
      fc.property(fc.double({ min: -5, max: 110, noNaN: true }), axis, axis, (L, a, b) => {
        expect(screenColor([L, a, b]).hex).toMatch(/^#[0-9a-f]{6}$/)
      }),
    )
  })
})
