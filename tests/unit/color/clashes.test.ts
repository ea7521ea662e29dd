import fc from 'fast-check'
import { describe, expect, test } from 'vitest'

import { deltaE00 } from '@/lib/color/ciede2000'
import { clashesOf, neighboursOf, readPairs, valueContrast } from '@/lib/color/clashes'
import { hexToLab } from '@/lib/color/srgb'
import type { Lab } from '@/lib/color/types'
import { seenAs } from '@/lib/color/vision'
import { dyedLine } from '@/scripts/bench/line'

const grey = (L: number): Lab => [L, 0, 0]

describe('what clashes among five', () => {
  test.each([
    [50, 70, 'clear'],
    [50, 69.9, 'soft'],
    [60, 50, 'soft'],
    [50, 59.9, 'muddy'],
    [50, 50, 'muddy'],
  ] as const)('L* %s beside L* %s is %s, whatever the hues', (one, other, value) => {
    expect(valueContrast([one, 60, 20], [other, -40, 5])).toBe(value)
    expect(valueContrast([other, 0, 0], [one, 0, 80])).toBe(value)
  })

  test('every pair of filled places is read once, the upper first', () => {
    const pairs = readPairs([grey(90), null, grey(60), grey(57), null])
    expect(pairs.map(({ first, second }) => [first, second])).toEqual([
      [0, 2],
      [0, 3],
      [2, 3],
    ])
    expect(pairs[2]).toMatchObject({ deltaL: 3, value: 'muddy', twins: true, lost: [] })
  })

  test('near-twins are those under ΔE00 4, or under the limit asked for', () => {
    const five = [grey(60), grey(55), null, null, null]
    const [{ deltaE } = { deltaE: 0 }] = readPairs(five)
    expect(deltaE).toBeGreaterThan(4)
    expect(readPairs(five)[0]!.twins).toBe(false)
    expect(readPairs(five, deltaE + 0.01)[0]!.twins).toBe(true)
    expect(readPairs(five, deltaE)[0]!.twins).toBe(false)
    expect(() => readPairs(five, Number.NaN)).toThrow(RangeError)
  })

  test('a red and the green that is its twin to a protan are lost to that vision', () => {
    const red = hexToLab('#a53a2a')
    const greens = Array.from({ length: 600 }, (_, at): Lab => [20 + (at % 30), -12, 2 * (at / 30)])
    const near = (lab: Lab) => deltaE00(seenAs(lab, 'protan'), seenAs(red, 'protan'))
    const green = greens.reduce((best, lab) => (near(lab) < near(best) ? lab : best))
    const [pair] = readPairs([red, null, null, null, green])
    expect(pair!.lost).toContain('protan')
    expect(pair!.twins).toBe(false)
    expect(clashesOf([pair!])).toContainEqual({ kind: 'protan', first: 0, second: 4 })
  })

  test('twins are not called muddy besides', () => {
    expect(clashesOf(readPairs([grey(60), grey(58), null, null, null]))).toEqual([
      { kind: 'twins', first: 0, second: 1 },
    ])
    expect(clashesOf(readPairs([grey(60), grey(30), null, null, null]))).toEqual([])
  })
})

describe('the neighbours of a place', () => {
  const line = dyedLine(40)
  const five = fc
    .uniqueArray(fc.nat(39), { minLength: 5, maxLength: 5 })
    .map((at) => at.map((s) => line[s]!))

  test('are the nearest that are not among the five, nearest first', () => {
    fc.assert(
      fc.property(five, fc.nat(4), (shades, place) => {
        const found = neighboursOf(place, shades, line, 6)
        const here = shades[place]!
        const all = line
          .filter((shade) => !shades.includes(shade))
          .map(({ lab }) => deltaE00(here.lab, lab))
          .sort((a, b) => a - b)
        expect(found.map(({ deltaE }) => deltaE)).toEqual(all.slice(0, 6))
      }),
    )
  })

  test('bring and end exactly the clashes by which the two fives differ', () => {
    fc.assert(
      fc.property(five, fc.nat(4), (shades, place) => {
        const clashes = (list: typeof shades) =>
          clashesOf(readPairs(list.map(({ lab }) => lab))).map((clash) => JSON.stringify(clash))
        const now = clashes(shades)
        for (const { shadeId, gained, ended } of neighboursOf(place, shades, line, 4)) {
          const other = line.find(({ id }) => id === shadeId)!
          const then = clashes(shades.with(place, other))
          const told = (list: typeof gained) => list.map((clash) => JSON.stringify(clash))
          expect(told(gained)).toEqual(then.filter((clash) => !now.includes(clash)))
          expect(told(ended)).toEqual(now.filter((clash) => !then.includes(clash)))
          for (const clash of [...gained, ...ended])
            expect([clash.first, clash.second]).toContain(place)
        }
      }),
    )
  })

  test('an empty place has none', () => {
    expect(neighboursOf(0, [null, null, null, null, null], line, 5)).toEqual([])
  })
})
