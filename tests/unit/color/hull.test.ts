import fc from 'fast-check'
import { describe, expect, test } from 'vitest'

import { cornersOfHull, nearestInHull, type Point } from '@/lib/color/hull'

const coordinate = fc.double({ min: -50, max: 50, noNaN: true })
const anyPoint: fc.Arbitrary<Point> = fc.tuple(coordinate, coordinate, coordinate)
const anyPoints = fc.array(anyPoint, { minLength: 1, maxLength: 25 })
/** Points that share planes, lines and places, where rounding is worst. */
const tied = fc.constantFrom(-10, 0, 10)
const tiedPoints = fc.array(fc.tuple(tied, tied, tied), { minLength: 1, maxLength: 12 })

const dot = (one: Point, other: Point) => one.reduce((sum, v, at) => sum + v * other[at]!, 0)
const minus = (one: Point, other: Point): Point =>
  one.map((v, at) => v - other[at]!) as unknown as Point
const mix = (points: readonly Point[], weights: readonly number[]): Point => {
  const total = weights.reduce((sum, weight) => sum + weight, 0)
  return [0, 1, 2].map((axis) =>
    points.reduce((sum, point, at) => sum + (point[axis]! * weights[at]!) / total, 0),
  ) as unknown as Point
}

describe('the nearest point of a hull', () => {
  test('is at no distance for any mixture of the points', () => {
    const mixture = fc.oneof(anyPoints, tiedPoints).chain((points) =>
      fc.tuple(
        fc.constant(points),
        fc.array(fc.double({ min: 0.001, max: 1, noNaN: true }), {
          minLength: points.length,
          maxLength: points.length,
        }),
      ),
    )
    fc.assert(
      fc.property(mixture, ([points, weights]) => {
        expect(nearestInHull(points, mix(points, weights)).distance).toBeLessThan(1e-4)
      }),
      { numRuns: 1000 },
    )
  })

  test('has the whole hull behind the plane that faces the point asked for', () => {
    fc.assert(
      fc.property(fc.oneof(anyPoints, tiedPoints), anyPoint, (points, to) => {
        const { point, distance } = nearestInHull(points, to)
        expect(Math.hypot(...minus(point, to))).toBeCloseTo(distance, 9)
        const facing = minus(to, point)
        for (const other of points) expect(dot(minus(other, point), facing)).toBeLessThan(1e-6)
        // And it is of the hull: nothing of the hull's farthest reach is exceeded in any direction.
        expect(nearestInHull(points, point).distance).toBeLessThan(1e-4)
      }),
      { numRuns: 1000 },
    )
  })

  test('is a point itself, and there is none of no points', () => {
    expect(nearestInHull([[1, 2, 3]], [1, 2, 5])).toEqual({ point: [1, 2, 3], distance: 2 })
    expect(() => nearestInHull([], [0, 0, 0])).toThrow(RangeError)
  })
})

describe('the corners of a hull', () => {
  test('of a cube with more in and on it are its eight', () => {
    const sides = [0, 8]
    const cube = sides.flatMap((l) => sides.flatMap((a) => sides.map((b): Point => [l, a, b])))
    const within: Point[] = [
      [4, 4, 4],
      [0, 4, 4],
      [0, 0, 4],
      [8, 8, 8],
    ]
    const corners = cornersOfHull([...within, ...cube])
    expect(corners.map(String).sort()).toEqual(cube.map(String).sort())
  })

  test('span all the points', () => {
    fc.assert(
      fc.property(fc.oneof(anyPoints, tiedPoints), (points) => {
        const corners = cornersOfHull(points)
        for (const point of points)
          expect(nearestInHull(corners, point).distance).toBeLessThan(1e-4)
      }),
    )
  })
})
