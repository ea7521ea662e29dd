import fc from 'fast-check'
import { describe, expect, test } from 'vitest'

import { hexToLab } from '@/lib/color/srgb'
import { assign, dealHeap, fitToShade } from '@/lib/naming/deal'

/** The largest sum that any way of pairing reaches. */
function best(fits: number[][], row = 0, taken: readonly number[] = []): number {
  if (row === fits.length) return 0
  return Math.max(
    best(fits, row + 1, taken),
    ...fits[row]!.map((fit, column) =>
      taken.includes(column) ? 0 : fit + best(fits, row + 1, [...taken, column]),
    ),
  )
}

const fitsOf = (rows: number, columns: number) =>
  fc.array(
    fc.array(fc.constantFrom(0, 0, 0.25, 0.5, 0.75, 1), { minLength: columns, maxLength: columns }),
    { minLength: rows, maxLength: rows },
  )

describe('dealing the heap', () => {
  test('reaches what trying every way reaches', () => {
    const matrices = fc
      .tuple(fc.integer({ min: 1, max: 5 }), fc.integer({ min: 1, max: 5 }))
      .chain(([rows, columns]) => fitsOf(rows, columns))
    fc.assert(
      fc.property(matrices, (fits) => {
        const pairs = assign(fits)
        const sum = pairs.reduce((total, [row, column]) => total + fits[row]![column]!, 0)
        expect(sum).toBeCloseTo(best(fits), 9)
        expect(new Set(pairs.map(([row]) => row)).size).toBe(pairs.length)
        expect(new Set(pairs.map(([, column]) => column)).size).toBe(pairs.length)
      }),
    )
  })

  const MOSS = { id: 'moss', lab: hexToLab('#6f7f36'), neighbours: [] }
  const PLUM = { id: 'plum', lab: hexToLab('#5f2f57'), neighbours: [] }

  test('ideas go to the shades they suit; the rest stay and say why', () => {
    const { dealt, left } = dealHeap(
      [
        { id: '1', name: 'Plum Job' },
        { id: '2', name: 'Moss Likely' },
        { id: '3', name: 'Nearly There' },
        { id: '4', name: 'Snow Way' },
      ],
      [MOSS, PLUM],
    )
    expect(dealt.map(({ ideaId, shadeId }) => [ideaId, shadeId])).toEqual([
      ['1', 'plum'],
      ['2', 'moss'],
    ])
    expect(left).toEqual([
      { ideaId: '3', why: 'no colour' },
      { ideaId: '4', why: 'no shade near' },
    ])
  })

  test('a name like its neighbour’s fits less', () => {
    const alone = fitToShade('Plum Job', PLUM)
    expect(fitToShade('Plum Job', { ...PLUM, neighbours: ['Plum Duff'] })).toBeLessThan(alone)
  })

  test('two alike are not dealt side by side', () => {
    const one = { ...PLUM, id: 'one', beside: ['two'] }
    const two = { ...PLUM, id: 'two', beside: ['one'] }
    const { dealt, left } = dealHeap(
      [
        { id: '1', name: 'Plum Job' },
        { id: '2', name: 'Plum Tart' },
      ],
      [one, two],
    )
    expect(dealt).toHaveLength(1)
    expect(left).toHaveLength(1)
  })

  test('of many alike no two stand side by side in a row', () => {
    const row = Array.from({ length: 6 }, (_, at) => ({
      ...PLUM,
      id: String(at),
      beside: [String(at - 1), String(at + 1)],
    }))
    const plums = ['Plum Job', 'Plum Tart', 'Plum Line', 'Plum Tree', 'Plum Duff', 'Plum Crazy']
    const ideas = plums.map((name) => ({ id: name, name }))
    const { dealt, left } = dealHeap(ideas, row)
    const places = dealt.map(({ shadeId }) => Number(shadeId)).sort()
    expect(places.length).toBeGreaterThanOrEqual(2)
    for (const [at, place] of places.entries())
      if (at > 0) expect(place - places[at - 1]!).toBeGreaterThan(1)
    expect(dealt.length + left.length).toBe(ideas.length)
  })

  test('nothing dealt from nothing', () => {
    expect(dealHeap([], [MOSS])).toEqual({ dealt: [], left: [], total: 0 })
    expect(dealHeap([{ id: '1', name: 'Plum' }], []).dealt).toEqual([])
  })
})
