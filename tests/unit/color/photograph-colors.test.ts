import fc from 'fast-check'
import { describe, expect, test } from 'vitest'

import { deltaE00 } from '@/lib/color/ciede2000'
import {
  accentShares,
  cellWeights,
  MAX_CELLS,
  NO_CELL,
  readPhotographColors,
  type PixelImage,
} from '@/lib/color/photograph-colors'
import { displayP3ToLab, srgbToLab } from '@/lib/color/srgb'
import { strikingColors } from '@/lib/color/striking'
import type { Lab } from '@/lib/color/types'
import { seededRandom } from '@/scripts/bench/line'

type Pixel = readonly [r: number, g: number, b: number, a: number]

const imageOf = (pixels: readonly Pixel[], width = pixels.length): PixelImage => ({
  width,
  height: pixels.length / width,
  data: Uint8Array.from(pixels.flat()),
  space: 'srgb',
})
const byte = fc.integer({ min: 0, max: 255 })
const anyPixels = fc
  .array(fc.tuple(byte, byte, byte, fc.constantFrom(0, 127, 128, 255)), {
    minLength: 1,
    maxLength: 300,
  })
  .filter((pixels) => pixels.some(([, , , alpha]) => alpha >= 128))
const random = seededRandom(5)
const noise = imageOf(
  Array.from(
    { length: 40_000 },
    () => [random() * 256, random() * 256, random() * 256, 255].map(Math.floor) as unknown as Pixel,
  ),
  200,
)

describe('the colours of a photograph', () => {
  test('are shares of the visible pixels, and the map says where each lies', () => {
    fc.assert(
      fc.property(anyPixels, (pixels) => {
        const { cells, cellMap } = readPhotographColors(imageOf(pixels))
        const visible = pixels.filter(([, , , alpha]) => alpha >= 128).length
        expect(cellMap).toHaveLength(pixels.length)
        pixels.forEach(([, , , alpha], at) => {
          if (alpha < 128) expect(cellMap[at]).toBe(NO_CELL)
          else expect(cellMap[at]).toBeLessThan(cells.length)
        })
        cells.forEach(({ area }, cell) => {
          const covered = cellMap.reduce((sum, at) => sum + Number(at === cell), 0)
          expect(covered / visible).toBeCloseTo(area, 12)
        })
        expect(cells.reduce((sum, { area }) => sum + area, 0)).toBeCloseTo(1, 12)
      }),
    )
  })

  test('are near to every pixel they stand for', () => {
    fc.assert(
      fc.property(anyPixels, (pixels) => {
        const { cells, cellMap } = readPhotographColors(imageOf(pixels))
        pixels.forEach(([r, g, b, alpha], at) => {
          if (alpha < 128) return
          const lab = srgbToLab(r / 255, g / 255, b / 255)
          const cell = cells[cellMap[at]!]!.lab
          // The corner to corner of a cube of 12, and the reach of a 5-bit bin.
          expect(Math.hypot(...lab.map((v, axis) => v - cell[axis]!))).toBeLessThan(32)
        })
      }),
    )
  })

  test('fit in a byte, whatever the picture, largest first', () => {
    const { cells } = readPhotographColors(noise)
    expect(cells.length).toBeGreaterThan(40)
    expect(cells.length).toBeLessThanOrEqual(MAX_CELLS)
    const areas = cells.map(({ area }) => area)
    expect(areas).toEqual([...areas].sort((a, b) => b - a))
  })

  test('are the same whatever was read before, even where nothing was visible', () => {
    fc.assert(
      fc.property(anyPixels, anyPixels, (pixels, others) => {
        const before = readPhotographColors(imageOf(pixels))
        readPhotographColors(imageOf(others))
        expect(() => readPhotographColors(imageOf([[9, 9, 9, 0]]))).toThrow('no visible pixels')
        expect(readPhotographColors(imageOf(pixels))).toEqual(before)
      }),
    )
  })

  test('are the same however the pixels are arranged', () => {
    fc.assert(
      fc.property(anyPixels, (pixels) => {
        const turned = readPhotographColors(imageOf([...pixels].reverse()))
        const { cells } = readPhotographColors(imageOf(pixels))
        expect(turned.cells).toEqual(cells)
      }),
    )
  })

  test('of 16-bit pixels are those of the 8-bit original', () => {
    const wide: PixelImage = { ...noise, data: Uint16Array.from(noise.data, (v) => v * 257) }
    const [own, other] = [readPhotographColors(noise), readPhotographColors(wide)]
    expect(other.cellMap).toEqual(own.cellMap)
    own.cells.forEach(({ lab }, cell) =>
      expect(deltaE00(lab, other.cells[cell]!.lab)).toBeLessThan(1e-3),
    )
  })

  test('of Display P3 reach beyond sRGB', () => {
    const red = { ...imageOf([[255, 0, 0, 255]]), space: 'display-p3' as const }
    const [cell] = readPhotographColors(red).cells
    expect(deltaE00(cell!.lab, displayP3ToLab(1, 0, 0))).toBeLessThan(1e-3)
    expect(deltaE00(cell!.lab, srgbToLab(1, 0, 0))).toBeGreaterThan(2)
  })

  test('there are none without a visible pixel', () => {
    const clear = imageOf([
      [200, 30, 30, 0],
      [10, 200, 10, 127],
    ])
    expect(() => readPhotographColors(clear)).toThrow(new RangeError('no visible pixels'))
    expect(strikingColors(clear)).toEqual([])
  })

  test('need as many channel values as the picture has', () => {
    expect(() => readPhotographColors({ ...noise, width: 199 })).toThrow(RangeError)
  })
})

describe('what a cell counts for', () => {
  const cellsOf = (list: [Lab, number][]) => list.map(([lab, area]) => ({ lab, area }))

  test('sums to one, and is never negative', () => {
    fc.assert(
      fc.property(anyPixels, (pixels) => {
        const weights = cellWeights(readPhotographColors(imageOf(pixels)).cells)
        expect(Math.min(...weights)).toBeGreaterThanOrEqual(0)
        expect(weights.reduce((a, b) => a + b, 0)).toBeCloseTo(1, 9)
      }),
    )
  })

  test('is the formula’s for two cells worked by hand', () => {
    // 90 % mid grey, 10 % of a red too far for either to add to the other’s p̃; C*/45 is over 1.
    const grey: Lab = [50, 0, 0]
    const red: Lab = [50, 70, 50]
    const distance = deltaE00(grey, red)
    expect(distance).toBeGreaterThan(28)
    expect(distance).toBeLessThan(40)
    const { shares, total } = accentShares(
      cellsOf([
        [grey, 0.9],
        [red, 0.1],
      ]),
    )
    expect(shares[0]).toBe(0)
    expect(shares[1]).toBe(1)
    expect(total).toBeCloseTo((0.9 * (distance / 40)) ** 2 * 0.95, 6)
    const mix = 0.25 * (total / 3)
    const [, weight] = cellWeights(
      cellsOf([
        [grey, 0.9],
        [red, 0.1],
      ]),
    )
    expect(weight).toBeCloseTo((1 - mix) * 0.1 + mix, 6)
  })

  test('holds near-blacks down to 40 %', () => {
    const [black, white] = cellWeights(
      cellsOf([
        [[3, 0, 0], 0.5],
        [[95, 0, 0], 0.5],
      ]),
    )
    expect(black! / white!).toBeCloseTo(0.4, 9)
  })
})

describe('the striking colours', () => {
  const field = (extra: Pixel[]) =>
    imageOf([
      ...Array.from({ length: 1000 - extra.length }, () => [90, 120, 70, 255] as const),
      ...extra,
    ])

  test('name the ladybird first, by the mean of its own pixels', () => {
    const ladybird = Array.from({ length: 5 }, () => [214, 40, 26, 255] as const)
    const [first] = strikingColors(field(ladybird))
    expect(deltaE00(first!.lab, srgbToLab(214 / 255, 40 / 255, 26 / 255))).toBeLessThan(0.5)
    expect(first!.area).toBeCloseTo(0.005, 9)
  })

  test('leave out specks and greys', () => {
    expect(strikingColors(field([[214, 40, 26, 255]]))).toEqual([])
    const greys = Array.from({ length: 256 }, (_, v) => [v, v, v, 255] as const)
    expect(strikingColors(imageOf(greys))).toEqual([])
    expect(strikingColors(field([]))).toEqual([])
  })

  test('are at most eight, apart from each other, for any picture', () => {
    const offered = strikingColors(noise)
    expect(offered.length).toBeGreaterThan(2)
    expect(offered.length).toBeLessThanOrEqual(8)
    offered.forEach(({ lab }, i) =>
      offered
        .slice(i + 1)
        .forEach((other) => expect(deltaE00(lab, other.lab)).toBeGreaterThanOrEqual(10)),
    )
    fc.assert(
      fc.property(anyPixels, (pixels) => {
        expect(strikingColors(imageOf(pixels)).length).toBeLessThanOrEqual(8)
      }),
      { numRuns: 30 },
    )
  })
})
