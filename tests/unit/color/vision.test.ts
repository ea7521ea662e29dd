import { converter } from 'culori'
import fc from 'fast-check'
import { describe, expect, test } from 'vitest'

import { deltaE00 } from '@/lib/color/ciede2000'
import { decodeChannel, hexToLab, labToLinear, linearToLab, parseHex } from '@/lib/color/srgb'
import type { LinearRgb } from '@/lib/color/srgb'
import { chromaOf, type Lab } from '@/lib/color/types'
import { pairsLost, seenAs, seenLight, VISIONS } from '@/lib/color/vision'
import published from '@/tests/fixtures/color/color-vision.json'

const toLinear = converter('lrgb')
const encode = converter('rgb')
const light = (hex: string): LinearRgb => parseHex(hex)!.map(decodeChannel) as unknown as LinearRgb
/** As the check values were made: clipped, encoded, in 8 bits. */
const shownAs = ([r, g, b]: LinearRgb): number[] => {
  const clip = (value: number) => Math.min(1, Math.max(0, value))
  const shown = encode({ mode: 'lrgb', r: clip(r), g: clip(g), b: clip(b) })
  return [shown.r, shown.g, shown.b].map((channel) => Math.round(channel * 255))
}
const bytes = (hex: string): number[] => parseHex(hex)!.map((channel) => Math.round(channel * 255))

const unit = fc.double({ min: 0, max: 1, noNaN: true })
const anyLight = fc.tuple(unit, unit, unit)
const anyShade: fc.Arbitrary<Lab> = fc
  .integer({ min: 0, max: 0xffffff })
  .map((value) => hexToLab(value.toString(16).padStart(6, '0')))

describe('Lab and linear light', () => {
  test('go there and back, and agree with culori', () => {
    fc.assert(
      fc.property(anyShade, ([l, a, b]) => {
        const linear = labToLinear([l, a, b])
        const theirs = toLinear({ mode: 'lab65', l, a, b })
        ;[theirs.r, theirs.g, theirs.b].forEach((value, at) =>
          expect(linear[at]).toBeCloseTo(value, 9),
        )
        linearToLab(linear).forEach((value, at) => expect(value).toBeCloseTo([l, a, b][at]!, 9))
      }),
    )
  })
})

describe(`the check values of ${published.source}`, () => {
  test.each(published.cases)('$hex to the last of 8 bits', ({ hex, protan, deutan }) => {
    expect(shownAs(seenLight(light(hex), 'protan'))).toEqual(bytes(protan))
    expect(shownAs(seenLight(light(hex), 'deutan'))).toEqual(bytes(deutan))
  })
})

describe(published.tritan.source, () => {
  type Rows = number[][]
  const times = (one: Rows, other: Rows): Rows =>
    one.map((row) =>
      other[0]!.map((_, at) => row.reduce((sum, v, k) => sum + v * other[k]![at]!, 0)),
    )
  const apply = (matrix: Rows, vector: number[]): number[] =>
    times(
      matrix,
      vector.map((value) => [value]),
    ).map(([value]) => value!)
  const cross = ([a, b, c]: number[], [d, e, f]: number[]): number[] => [
    b! * f! - c! * e!,
    c! * d! - a! * f!,
    a! * e! - b! * d!,
  ]
  const inverse = (m: Rows): Rows => {
    const columns = [cross(m[1]!, m[2]!), cross(m[2]!, m[0]!), cross(m[0]!, m[1]!)]
    const det = m[0]!.reduce((sum, value, at) => sum + value * columns[0]![at]!, 0)
    return [0, 1, 2].map((row) => columns.map((column) => column[row]! / det))
  }
  const srgb: Rows = [
    [0.4123907992659593, 0.357584339383878, 0.1804807884018343],
    [0.2126390058715102, 0.715168678767756, 0.0721923153607337],
    [0.0193308187155918, 0.119194779794626, 0.9505321522496607],
  ]
  const cones = times(published.tritan.cones.matrix, srgb)
  const white = apply(cones, [1, 1, 1])
  /** Linear sRGB seen in the half-plane of the white and one light, L and M as they were. */
  const towards = (anchor: number[]): Rows => {
    const normal = cross(white, apply(published.tritan.cones.matrix, anchor))
    const project = [
      [1, 0, 0],
      [0, 1, 0],
      [-normal[0]! / normal[2]!, -normal[1]! / normal[2]!, 0],
    ]
    return times(inverse(cones), times(project, cones))
  }
  const { nm485, nm660 } = published.tritan.anchors

  test('is what its cones and lights derive, whichever side the light is on', () => {
    fc.assert(
      fc.property(anyLight, (rgb) => {
        const [long, middle] = apply(cones, rgb)
        const side = long! / middle! - white[0]! / white[1]!
        fc.pre(Math.abs(side) > 1e-3)
        const expected = apply(towards(side > 0 ? nm660 : nm485), rgb)
        seenLight(rgb, 'tritan').forEach((value, at) =>
          expect(Math.abs(value - expected[at]!)).toBeLessThan(5e-6),
        )
      }),
    )
  })

  test('is near what others derived with corrected primaries', () => {
    const { towards660, towards485 } = published.tritan.independent
    for (const [ours, theirs] of [
      [towards(nm660), towards660],
      [towards(nm485), towards485],
    ] as const) {
      ours
        .flat()
        .forEach((value, at) => expect(Math.abs(value - theirs.flat()[at]!)).toBeLessThan(0.013))
    }
  })

  test('keeps both cones it has', () => {
    fc.assert(
      fc.property(anyLight, (rgb) => {
        const before = apply(cones, rgb)
        const after = apply(cones, [...seenLight(rgb, 'tritan')])
        expect(after[0]).toBeCloseTo(before[0]!, 5)
        expect(after[1]).toBeCloseTo(before[1]!, 5)
      }),
    )
  })
})

describe('every vision', () => {
  test.each(VISIONS)('%s leaves greys grey', (vision) => {
    fc.assert(
      fc.property(unit, (grey) => {
        const seen = seenAs(linearToLab([grey, grey, grey]), vision)
        expect(chromaOf(seen)).toBeLessThan(0.02)
      }),
    )
  })

  test.each(VISIONS)('%s seen once more stays nearly what it is', (vision) => {
    fc.assert(
      fc.property(anyLight, (rgb) => {
        const once = seenLight(rgb, vision)
        const twice = seenLight(once, vision)
        // Machado's model is no projection, so it is held only loosely; Brettel's is one.
        const bar = vision === 'tritan' ? 1e-4 : 0.12
        once.forEach((value, at) => expect(Math.abs(twice[at]! - value)).toBeLessThan(bar))
      }),
    )
  })
})

describe('pairs lost', () => {
  const shades = (...hexes: string[]) => hexes.map(hexToLab)

  test('are red and green of one lightness for protan and deutan, not for tritan', () => {
    const [red] = shades('#a35a4a')
    // A green that deutan vision takes for the red: same lightness as seen, other hue.
    const lost = pairsLost([red!, ...shades('#6f6f41', '#ffffff')], { together: 8 })
    expect(lost.map(({ vision }) => vision)).toContain('deutan')
    expect(lost.map(({ vision }) => vision)).not.toContain('tritan')
  })

  test('are exactly those apart before and together after, the worst first', () => {
    fc.assert(
      fc.property(fc.array(anyShade, { maxLength: 12 }), (labs) => {
        const lost = pairsLost(labs, { apart: 8, together: 6 })
        const expected = VISIONS.flatMap((vision) =>
          labs.flatMap((one, first) =>
            labs.flatMap((other, second) => {
              const seen = deltaE00(seenAs(one, vision), seenAs(other, vision))
              const both = second > first && deltaE00(one, other) >= 8 && seen < 6
              return both ? [`${vision} ${first} ${second}`] : []
            }),
          ),
        )
        const names = lost.map(({ vision, first, second }) => `${vision} ${first} ${second}`)
        expect([...names].sort()).toEqual([...expected].sort())
        for (const vision of VISIONS) {
          const seen = lost.filter((pair) => pair.vision === vision).map((p) => p.seenDeltaE)
          expect(seen).toEqual([...seen].sort((one, other) => one - other))
        }
      }),
      { numRuns: 50 },
    )
  })

  test('need two shades, and limits that say something', () => {
    expect(pairsLost([])).toEqual([])
    expect(pairsLost(shades('#808080'))).toEqual([])
    expect(() => pairsLost([], { apart: Number.NaN })).toThrow(RangeError)
    expect(() => pairsLost([], { together: -1 })).toThrow(RangeError)
  })
})
