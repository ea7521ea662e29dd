import { converter } from 'culori'
import fc from 'fast-check'
import { describe, expect, test } from 'vitest'

import { deltaE00 } from '@/lib/color/ciede2000'
import { screenColor } from '@/lib/color/gamut'
import {
  din99oToLab,
  findGaps,
  GAP_TOLERANCE,
  labToDin99o,
  LEAST_GAP,
  MOST_GAPS,
} from '@/lib/color/gaps'
import { nearestInHull, type Point } from '@/lib/color/hull'
import { hexToLab } from '@/lib/color/srgb'
import type { Lab } from '@/lib/color/types'
import { dyedLine, seededRandom } from '@/scripts/bench/line'

const labsOf = (size: number, seed: number): Lab[] => dyedLine(size, seed).map(({ lab }) => lab)
const distance = (one: Point, other: Point) =>
  Math.hypot(...one.map((value, axis) => value - other[axis]!))
const anyShade: fc.Arbitrary<Lab> = fc
  .integer({ min: 0, max: 0xffffff })
  .map((value) => hexToLab(value.toString(16).padStart(6, '0')))
/** What rounding a target to one decimal of Lab may move it in DIN99o. */
const ROUNDED = 0.15

describe('DIN99o', () => {
  test('goes there and back', () => {
    fc.assert(
      fc.property(anyShade, (lab) => {
        din99oToLab(labToDin99o(lab)).forEach((value, axis) =>
          expect(value).toBeCloseTo(lab[axis]!, 6),
        )
      }),
    )
  })

  // The reference white and black keep their L, and a grey has no chroma (DIN 6176:2018).
  test('keeps white, black and grey', () => {
    expect(labToDin99o([100, 0, 0])).toEqual([expect.closeTo(100, 6), 0, 0])
    expect(labToDin99o([0, 0, 0])).toEqual([0, 0, 0])
    const [, a, b] = labToDin99o([54, 0, 0])
    expect(Math.hypot(a, b)).toBe(0)
    expect(converter('dlab')({ mode: 'lab65', l: 54, a: 20, b: -8 }).l).toBeCloseTo(
      labToDin99o([54, 20, -8])[0],
      12,
    )
  })
})

describe('gaps', () => {
  test.each([3, 12, 24])(
    'no place of a fine grid is emptier than the first (%i shades)',
    (size) => {
      const labs = labsOf(size, size)
      const points = labs.map(labToDin99o)
      const [gap] = findGaps(labs)
      let emptiest = 0
      const step = 2
      for (let l = 0; l <= 100; l += step) {
        for (let a = -46; a <= 46; a += step) {
          for (let b = -46; b <= 46; b += step) {
            const place: Point = [l, a, b]
            const empty = Math.min(...points.map((point) => distance(point, place)))
            if (empty <= emptiest || !screenColor(din99oToLab(place)).inGamut) continue
            if (nearestInHull(points, place).distance > 1e-6) continue
            emptiest = empty
          }
        }
      }
      expect(gap!.radius).toBeGreaterThan(emptiest - GAP_TOLERANCE - ROUNDED)
      const target = labToDin99o(gap!.target)
      const empty = Math.min(...points.map((point) => distance(point, target)))
      expect(gap!.radius).toBeCloseTo(empty, 9)
    },
  )

  test.each([24, 40, 120])(
    'lie in the range, on the screen, and far from all (%i shades)',
    (size) => {
      const labs = labsOf(size, 3)
      const points = labs.map(labToDin99o)
      const gaps = findGaps(labs)
      expect(gaps.length).toBeGreaterThan(0)
      expect(gaps.length).toBeLessThanOrEqual(MOST_GAPS)
      gaps.forEach(({ target, nearest, radius }, at) => {
        expect(nearestInHull(points, labToDin99o(target)).distance).toBeLessThan(ROUNDED)
        expect(screenColor(target).inGamut).toBe(true)
        const others = [...labs, ...gaps.slice(0, at).map((before) => before.target)]
        for (const other of others)
          expect(deltaE00(target, other)).toBeGreaterThanOrEqual(LEAST_GAP)
        const byDistance = labs
          .map((lab, index) => ({ index, deltaE: deltaE00(target, lab) }))
          .sort((one, other) => one.deltaE - other.deltaE)
        expect(nearest).toEqual(byDistance.slice(0, 3))
        // A later search may find what the one before it left within the tolerance.
        if (at > 0)
          expect(radius).toBeLessThanOrEqual(gaps[at - 1]!.radius + GAP_TOLERANCE + ROUNDED)
      })
    },
  )

  test('are the same whatever order the shades come in', () => {
    const labs = labsOf(40, 5)
    const random = seededRandom(11)
    const shuffled = labs
      .map((lab) => ({ lab, at: random() }))
      .sort((one, other) => one.at - other.at)
      .map(({ lab }) => lab)
    const targets = (of: Lab[]) => findGaps(of).map(({ target }) => target)
    expect(targets(shuffled)).toEqual(targets(labs))
    expect(targets(labs)).toEqual(targets(labs))
  })

  test('a hole left in the middle of a line of greys is the gap', () => {
    const greys = [92, 84, 76, 68, 60, 30, 22].map((L): Lab => [L, 0, 0])
    const [gap, ...others] = findGaps(greys)
    expect(others).toEqual([])
    expect(gap!.target[0]).toBeGreaterThan(42)
    expect(gap!.target[0]).toBeLessThan(46)
    expect(gap!.target[1]).toBeCloseTo(0, 5)
    expect(
      gap!.nearest
        .map(({ index }) => index)
        .slice(0, 2)
        .sort(),
    ).toEqual([4, 5])
  })

  test('a target that is added is no gap any more', () => {
    const labs = labsOf(40, 7)
    const gaps = findGaps(labs)
    const after = findGaps([...labs, gaps[0]!.target])
    for (const { target } of after) {
      expect(deltaE00(target, gaps[0]!.target)).toBeGreaterThanOrEqual(LEAST_GAP)
    }
    expect(after[0]!.radius).toBeLessThanOrEqual(gaps[0]!.radius + GAP_TOLERANCE + ROUNDED)
  })

  test('there are none without a range, or where everything is near', () => {
    expect(findGaps([])).toEqual([])
    expect(findGaps([[50, 0, 0]])).toEqual([])
    expect(
      findGaps([
        [50, 0, 0],
        [50, 0, 0],
      ]),
    ).toEqual([])
    expect(
      findGaps([
        [50, 0, 0],
        [54, 3, 0],
        [52, 0, 4],
        [48, 2, 2],
      ]),
    ).toEqual([])
  })

  test('two shades far apart leave one between them', () => {
    const [gap] = findGaps([
      [80, 5, 5],
      [30, -5, -5],
    ])
    expect(gap!.nearest).toHaveLength(2)
    expect(Math.abs(gap!.nearest[0]!.deltaE - gap!.nearest[1]!.deltaE)).toBeLessThan(6)
  })

  test('a range out of the screen has targets on it only', () => {
    const vivid: Lab[] = [
      [60, 100, 0],
      [60, -100, 0],
      [60, 0, 100],
      [60, 0, -100],
    ]
    for (const { target } of findGaps(vivid)) expect(screenColor(target).inGamut).toBe(true)
  })
})
