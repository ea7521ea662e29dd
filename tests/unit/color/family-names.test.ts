import fc from 'fast-check'
import { describe, expect, test } from 'vitest'

import { nameFamilies, termOf } from '@/lib/color/family-names'
import { labToOklch } from '@/lib/color/oklch'
import { hexToLab } from '@/lib/color/srgb'
import type { Lab } from '@/lib/color/types'

/**
 * CSS named colours whose name is, or holds, an everyday term; hex values of CSS Color 4 § 6.1.
 */
const CALLED: [hex: string, term: string, css: string][] = [
  ['#ff0000', 'red', 'red'],
  ['#8b0000', 'red', 'darkred'],
  ['#ffc0cb', 'pink', 'pink'],
  ['#ffb6c1', 'pink', 'lightpink'],
  ['#ff69b4', 'pink', 'hotpink'],
  ['#ff1493', 'pink', 'deeppink'],
  ['#ffa500', 'orange', 'orange'],
  ['#ff8c00', 'orange', 'darkorange'],
  ['#8b4513', 'brown', 'saddlebrown'],
  ['#f4a460', 'orange', 'sandybrown, which is none'],
  ['#ffff00', 'yellow', 'yellow'],
  ['#008000', 'green', 'green'],
  ['#228b22', 'green', 'forestgreen'],
  ['#98fb98', 'green', 'palegreen'],
  ['#2e8b57', 'green', 'seagreen'],
  ['#0000ff', 'blue', 'blue'],
  ['#add8e6', 'blue', 'lightblue'],
  ['#4682b4', 'blue', 'steelblue'],
  ['#191970', 'blue', 'midnightblue'],
  ['#800080', 'purple', 'purple'],
  ['#663399', 'purple', 'rebeccapurple'],
]

const lab = (hex: string): Lab => hexToLab(hex)
const dyed = (...hexes: string[]) => ({ neutral: false, labs: hexes.map(lab) })

describe('what a colour is called', () => {
  test.each(CALLED)('%s is %s (%s)', (hex, term) => {
    expect(termOf(labToOklch(lab(hex)))).toBe(term)
  })

  test('brown is dull orange, and pink is pale red', () => {
    const called = (l: number, c: number, h: number) => termOf({ l, c, h })
    expect(called(0.7, 0.155, 53)).toBe('orange')
    expect(called(0.45, 0.07, 53)).toBe('brown')
    expect(called(0.5, 0.16, 18)).toBe('red')
    expect(called(0.78, 0.09, 18)).toBe('pink')
  })
})

describe('the names of families', () => {
  test('say what most of their colour is called', () => {
    expect(
      nameFamilies([
        { neutral: true, labs: [lab('#777777')] },
        dyed('#8b0000', '#ff0000'),
        dyed('#4682b4', '#191970', '#800080', '#0000ff'),
      ]),
    ).toEqual(['Neutrals', 'Reds', 'Blues'])
  })

  test('name a second colour where it holds more than a third', () => {
    expect(nameFamilies([dyed('#ffa500', '#ff8c00', '#8b4513', '#8b4513')])).toEqual([
      'Oranges and browns',
    ])
  })

  test('tell two of the same colour apart by what differs', () => {
    expect(nameFamilies([dyed('#b9d3ea', '#add8e6'), dyed('#191970', '#22406a')])).toEqual([
      'Pale blues',
      'Deep blues',
    ])
    expect(nameFamilies([dyed('#7d9a2c'), dyed('#2e8b57')])).toEqual([
      'Yellow-greens',
      'Blue-greens',
    ])
    expect(
      nameFamilies([
        { neutral: true, labs: [lab('#eeeeee')] },
        { neutral: true, labs: [lab('#333333')] },
      ]),
    ).toEqual(['Pale neutrals', 'Deep neutrals'])
  })

  test('leave alone what people named', () => {
    expect(nameFamilies([dyed('#4682b4')], ['blues'])).toEqual(['Blues 2'])
  })

  test('are never the same twice, and the same for the same line', () => {
    const color = fc.tuple(
      fc.double({ min: 10, max: 95, noNaN: true }),
      fc.double({ min: -60, max: 60, noNaN: true }),
      fc.double({ min: -60, max: 60, noNaN: true }),
    )
    const family = fc.record({
      neutral: fc.boolean(),
      labs: fc.array(color, { minLength: 1, maxLength: 6 }),
    })
    fc.assert(
      fc.property(fc.array(family, { maxLength: 12 }), (families) => {
        const names = nameFamilies(families, ['Blues', 'greens'])
        expect(new Set(names.map((name) => name.toLowerCase())).size).toBe(families.length)
        expect(names).not.toContain('Blues')
        expect(nameFamilies(families, ['Blues', 'greens'])).toEqual(names)
        for (const name of names) expect(name).toMatch(/^[A-Z][a-z]+[a-z -]*\d*$/)
      }),
    )
  })

  test('ask for colours', () => {
    expect(() => nameFamilies([{ neutral: false, labs: [] }])).toThrow(RangeError)
  })
})
