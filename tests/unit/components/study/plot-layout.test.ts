import fc from 'fast-check'
import { describe, expect, test } from 'vitest'

import { outlineOf, spreadLabels, type PlotPoint } from '@/components/study/plot-layout'

const GAP = 12
const mark = fc.double({ min: 0, max: 200, noNaN: true })

describe('labels beside a ladder', () => {
  test('stay where they are when none covers another', () => {
    expect(spreadLabels([150, 10, 60], GAP, 0, 200)).toEqual([150, 10, 60])
  })

  test('of marks in one place stand about it', () => {
    expect(spreadLabels([100, 100, 100], GAP, 0, 200)).toEqual([88, 100, 112])
  })

  test('never cover each other, keep the order of their marks, and stay inside', () => {
    fc.assert(
      fc.property(fc.array(mark, { maxLength: 16 }), (marks) => {
        const places = spreadLabels(marks, GAP, 0, 200)
        expect(places).toHaveLength(marks.length)
        const order = marks.map((_, at) => at).sort((one, other) => places[one]! - places[other]!)
        order.forEach((at, rank) => {
          expect(places[at]).toBeGreaterThanOrEqual(-1e-9)
          expect(places[at]).toBeLessThanOrEqual(200 + 1e-9)
          if (rank === 0) return
          const before = order[rank - 1]!
          expect(places[at]! - places[before]!).toBeGreaterThanOrEqual(GAP - 1e-9)
          expect(marks[at]).toBeGreaterThanOrEqual(marks[before]!)
        })
      }),
    )
  })
})

describe('the outline of points', () => {
  test('of a square with points in it is the square', () => {
    const square: PlotPoint[] = [
      [0, 0],
      [4, 0],
      [4, 4],
      [0, 4],
    ]
    const within: PlotPoint[] = [
      [2, 2],
      [2, 0],
      [1, 3],
    ]
    expect(
      outlineOf([...within, ...square])
        .map(String)
        .sort(),
    ).toEqual(square.map(String).sort())
  })

  test('has every point on its inner side', () => {
    const point: fc.Arbitrary<PlotPoint> = fc.tuple(mark, mark)
    fc.assert(
      fc.property(fc.array(point, { minLength: 3, maxLength: 20 }), (points) => {
        const outline = outlineOf(points)
        outline.forEach(([x, y], at) => {
          const [nextX, nextY] = outline[(at + 1) % outline.length]!
          for (const [px, py] of points) {
            const side = (nextX - x) * (py - y) - (nextY - y) * (px - x)
            expect(side).toBeGreaterThanOrEqual(-1e-6)
          }
        })
      }),
    )
  })

  test('of one point, or none, is what is given', () => {
    expect(outlineOf([])).toEqual([])
    expect(outlineOf([[1, 2]])).toEqual([[1, 2]])
    expect(
      outlineOf([
        [1, 2],
        [0, 0],
      ]),
    ).toHaveLength(2)
  })
})
