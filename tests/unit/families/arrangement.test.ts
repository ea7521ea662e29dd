import fc from 'fast-check'
import { describe, expect, test } from 'vitest'

import {
  partOf,
  placeNew,
  shadesOf,
  sortAnew,
  withoutEmpty,
  type ArrangedShade,
  type Arrangement,
} from '@/lib/families/arrangement'
import type { Lab } from '@/lib/color/types'

const counter = () => {
  let made = 0
  return () => `made-${++made}`
}

const shade = (id: string, lab: Lab, values: Partial<ArrangedShade> = {}): ArrangedShade => ({
  id,
  number: id,
  name: null,
  lab,
  familyId: null,
  pinned: false,
  position: null,
  ...values,
})

const lab: fc.Arbitrary<Lab> = fc.tuple(
  fc.integer({ min: 10, max: 95 }),
  fc.integer({ min: -50, max: 50 }),
  fc.integer({ min: -50, max: 50 }),
)

/** A line in a few families, some of its shades pinned wherever they are. */
const arrangement: fc.Arbitrary<Arrangement> = fc
  .array(fc.record({ lab, family: fc.integer({ min: 0, max: 4 }), pinned: fc.boolean() }), {
    minLength: 1,
    maxLength: 30,
  })
  .map((shades) => ({
    families: ['Fog', 'Fen', 'Fell', 'Ford', 'Firth'].map((name, at) => ({
      id: `f${at}`,
      name,
      nameGiven: at % 2 === 0,
      neutral: at === 0,
    })),
    shades: shades.map(({ lab: color, family, pinned }, at) =>
      shade(String(at), color, { familyId: `f${family}`, pinned }),
    ),
  }))

const count = fc.option(fc.integer({ min: 2, max: 12 }))

describe('sorting anew', () => {
  test('never moves a pinned shade, leaves none out, and keeps no family twice', () => {
    fc.assert(
      fc.property(arrangement, count, (before, wished) => {
        const after = sortAnew(before, wished, counter())
        const ids = after.families.map(({ id }) => id)
        expect(new Set(ids).size).toBe(ids.length)
        expect(after.shades.map(({ id }) => id)).toEqual(before.shades.map(({ id }) => id))
        after.shades.forEach(({ familyId, pinned }, at) => {
          expect(ids).toContain(familyId)
          if (pinned) expect(familyId).toBe(before.shades[at]!.familyId)
        })
        const names = after.families.map(({ name }) => name.toLowerCase())
        expect(new Set(names).size).toBe(names.length)
        for (const family of after.families) {
          if (!family.nameGiven) continue
          expect(family.name).toBe(before.families.find(({ id }) => id === family.id)!.name)
        }
      }),
    )
  })

  test('a second time changes nothing', () => {
    fc.assert(
      fc.property(arrangement, count, (before, wished) => {
        const once = withoutEmpty(sortAnew(before, wished, counter()))
        const twice = withoutEmpty(sortAnew(once, wished, counter()))
        const standing = ({ shades }: Arrangement) => shades.map(({ familyId }) => familyId)
        expect(standing(twice)).toEqual(standing(once))
        expect(twice.families.map(({ name }) => name)).toEqual(
          once.families.map(({ name }) => name),
        )
      }),
    )
  })

  test('a family follows most of its shades', () => {
    const reds: Lab[] = [
      [40, 50, 25],
      [45, 48, 24],
      [50, 45, 22],
    ]
    const blues: Lab[] = [
      [40, -5, -35],
      [45, -4, -33],
    ]
    const shades = [...reds, ...blues].map((color, at) =>
      // The last of the reds stands with the blues by mistake.
      shade(String(at), color, { familyId: at < 2 ? 'warm' : 'cold' }),
    )
    const families = [
      { id: 'warm', name: 'Embers', nameGiven: true, neutral: false },
      { id: 'cold', name: 'Ice', nameGiven: false, neutral: false },
    ]
    const after = sortAnew({ families, shades }, 2, counter())
    expect(after.families.map(({ id, name }) => [id, name])).toEqual([
      ['warm', 'Embers'],
      ['cold', 'Blues'],
    ])
    expect(after.shades[2]!.familyId).toBe('warm')
  })
})

describe('a new shade', () => {
  test('falls into the family of its nearest shade', () => {
    const placed = [
      shade('a', [40, 50, 25], { familyId: 'red' }),
      shade('b', [40, -5, -35], { familyId: 'blue' }),
    ]
    const families = ['red', 'blue'].map((id) => ({
      id,
      name: id,
      nameGiven: false,
      neutral: false,
    }))
    const fresh = shade('c', [55, -3, -20], { familyId: null })
    const after = placeNew({ families, shades: [...placed, fresh] }, counter())
    expect(after.shades.map(({ familyId }) => familyId)).toEqual(['red', 'blue', 'blue'])
  })
})

describe('a split', () => {
  const family = { id: 'f', name: 'Family', nameGiven: false, neutral: false }
  const of = (labs: Lab[], pinned: boolean[] = []) => ({
    families: [family],
    shades: labs.map((color, at) =>
      shade(String(at), color, { familyId: 'f', pinned: pinned[at] ?? false }),
    ),
  })

  test('parts the smaller arc of hues, without what is pinned', () => {
    const line = of([
      [50, 40, 20],
      [52, 41, 22],
      [50, -30, 20],
    ])
    expect(partOf(line, family).map(({ id }) => id)).toEqual(['2'])
    const pinned = of(
      [
        [50, 40, 20],
        [52, 41, 22],
        [50, -30, 20],
      ],
      [false, false, true],
    )
    expect(partOf(pinned, family).map(({ id }) => id)).toEqual(['0', '1'])
  })

  test('parts neutrals where lightness makes its widest step', () => {
    const neutrals = { ...family, neutral: true }
    const line = of([
      [90, 0, 2],
      [85, 0, 2],
      [30, 0, 1],
    ])
    expect(partOf(line, neutrals).map(({ id }) => id)).toEqual(['2'])
  })

  test('is nothing of one shade, or where all are pinned', () => {
    expect(partOf(of([[50, 40, 20]]), family)).toEqual([])
    const all = of(
      [
        [50, 40, 20],
        [50, -30, 20],
      ],
      [true, true],
    )
    expect(partOf(all, family)).toEqual([])
  })
})

describe('the order within a family', () => {
  test('is that of people, then from light to dark', () => {
    const shades = [
      shade('dark', [20, 0, 0], { familyId: 'f', position: 0 }),
      shade('mid', [50, 0, 0], { familyId: 'f' }),
      shade('light', [80, 0, 0], { familyId: 'f' }),
    ]
    expect(shadesOf({ families: [], shades }, 'f').map(({ id }) => id)).toEqual([
      'dark',
      'light',
      'mid',
    ])
  })
})
