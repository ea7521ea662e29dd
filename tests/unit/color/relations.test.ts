import fc from 'fast-check'
import { describe, expect, test } from 'vitest'

import { deltaE00 } from '@/lib/color/ciede2000'
import { isNeutral } from '@/lib/color/families'
import type { MatchShade } from '@/lib/color/match'
import { labToOklch } from '@/lib/color/oklch'
import {
  completeByRelation,
  LIGHTNESS_STEP,
  RELATION_KINDS,
  STRAINED,
  type RelationKind,
} from '@/lib/color/relations'
import type { Lab } from '@/lib/color/types'
import { dyedLine } from '@/scripts/bench/line'

const NONE = [null, null, null, null, null]

/** A line and which of it, by index, stands in each of five places; null where none does. */
const lineAndPlaces = (sizes: { min: number; max: number }) =>
  fc
    .array(
      fc.tuple(
        fc.double({ min: 5, max: 95, noNaN: true }),
        fc.double({ min: -60, max: 60, noNaN: true }),
        fc.double({ min: -60, max: 60, noNaN: true }),
      ),
      { minLength: sizes.min, maxLength: sizes.max },
    )
    .chain((labs) =>
      fc.record({
        line: fc.constant(labs.map((lab, at): MatchShade => ({ id: String(at), lab: lab as Lab }))),
        places: fc
          .uniqueArray(fc.nat(labs.length - 1), { minLength: 0, maxLength: 4 })
          .chain((filled) =>
            fc
              .shuffledSubarray([0, 1, 2, 3, 4], {
                minLength: filled.length,
                maxLength: filled.length,
              })
              .map((at) => {
                const places: (number | null)[] = [...NONE]
                filled.forEach((shade, index) => (places[at[index]!] = shade))
                return places
              }),
          ),
      }),
    )
const kinds = fc.constantFrom(...RELATION_KINDS)

/** Every way to give five ranks one of so many sides, each side at least once. */
function surjections(sides: number): number[][] {
  const all = Array.from({ length: sides ** 5 }, (_, code) =>
    [0, 1, 2, 3, 4].map((rank) => Math.floor(code / sides ** rank) % sides),
  )
  return all.filter((ranks) => new Set(ranks).size === sides)
}

const TURNS: Record<RelationKind, number[][]> = {
  near: [
    [-30, -15, 0, 15, 30],
    [30, 15, 0, -15, -30],
  ],
  opposite: surjections(2).map((ranks) => ranks.map((side) => side * 180)),
  family: [[0, 0, 0, 0, 0]],
  'three-way': surjections(3).map((ranks) => ranks.map((side) => side * 120)),
}
const LIGHTNESS: Record<RelationKind, number> = {
  near: 0.7,
  opposite: 0.5,
  family: 1,
  'three-way': 0.5,
}

/** The same problem by trying every five, base hue and order: what the best costs. */
function bruteForce(kind: RelationKind, line: MatchShade[], filled: Set<string>): number {
  const labs = line.map(({ lab }) => labToOklch(lab))
  const rank = (values: number[], part: number) =>
    values.toSorted((a, b) => a - b)[Math.round(part * (values.length - 1))]!
  const held = labs.filter((_, s) => filled.has(line[s]!.id))
  const light = Math.max(
    rank(
      labs.map(({ l }) => l),
      0.9,
    ),
    ...held.map(({ l }) => l),
  )
  const dark = Math.min(
    rank(
      labs.map(({ l }) => l),
      0.1,
    ),
    ...held.map(({ l }) => l),
  )
  const vivid = held.filter((one) => !isNeutral(one)).map(({ c }) => c)
  const all = labs.filter((one) => !isNeutral(one)).map(({ c }) => c)
  const chroma =
    vivid.length > 0
      ? vivid.reduce((sum, c) => sum + c, 0) / vivid.length
      : all.length > 0
        ? rank(all, 0.5)
        : 0
  const vector = (c: number, h: number) =>
    [c * Math.cos((h * Math.PI) / 180), c * Math.sin((h * Math.PI) / 180)] as const
  const costs = [0.6, 0.9, 1, 0.9, 0.7].map((full, at) =>
    Array.from({ length: 72 }, (_, step) => {
      const [a, b] = vector(chroma * full, step * 5)
      return labs.map(({ l, c, h }) => {
        const [x, y] = vector(c, h)
        const rung = light + ((dark - light) * at) / 4
        return (LIGHTNESS[kind] * (l - rung)) ** 2 + 4 * ((x - a) ** 2 + (y - b) ** 2)
      })
    }),
  )
  const order = line.map((_, s) => s).sort((a, b) => line[b]!.lab[0] - line[a]!.lab[0])
  const fives: number[][] = []
  const choose = (from: number, five: number[]) => {
    if (five.length === 5) fives.push(five)
    else for (let at = from; at < order.length; at++) choose(at + 1, [...five, order[at]!])
  }
  choose(0, [])
  for (const relax of [1, 0.65, 0.65 ** 2, 0.65 ** 3, 0]) {
    let best = Infinity
    for (const five of fives) {
      const shades = five.map((s) => line[s]!)
      if ([...filled].some((id) => !shades.some((shade) => shade.id === id))) continue
      const free = (a: MatchShade, b: MatchShade) => !filled.has(a.id) || !filled.has(b.id)
      const stands = shades.every((a, i) =>
        shades.every((b, j) => {
          if (j <= i || !free(a, b)) return true
          if (deltaE00(a.lab, b.lab) < 10 * relax) return false
          return j > i + 1 || a.lab[0] - b.lab[0] >= LIGHTNESS_STEP * relax
        }),
      )
      if (!stands) continue
      for (const turns of TURNS[kind])
        for (let step = 0; step < 72; step++) {
          let sum = 0
          for (let at = 0; at < 5; at++)
            sum += costs[at]![(step + turns[at]! / 5 + 72) % 72]![five[at]!]!
          if (sum < best) best = sum
        }
    }
    if (best < Infinity) return best
  }
  return Infinity
}

describe('five by a relation of hues', { timeout: 20_000 }, () => {
  test('no five of a small line costs less, whatever is filled', () => {
    fc.assert(
      fc.property(kinds, lineAndPlaces({ min: 5, max: 8 }), (kind, { line, places }) => {
        const filled = places.map((shade) => (shade === null ? null : line[shade]!))
        const found = completeByRelation(kind, filled, line)!
        const ids = new Set(filled.flatMap((shade) => shade?.id ?? []))
        expect(found.cost).toBeCloseTo(bruteForce(kind, line, ids), 10)
      }),
      { numRuns: 40 },
    )
  })

  test('filled places stay, no shade stands twice, what is added comes light first', () => {
    fc.assert(
      fc.property(kinds, lineAndPlaces({ min: 5, max: 30 }), (kind, { line, places }) => {
        const filled = places.map((shade) => (shade === null ? null : line[shade]!))
        const found = completeByRelation(kind, filled, line)!
        const ids = found.places.map(({ shadeId }) => shadeId)
        expect(new Set(ids).size).toBe(5)
        filled.forEach((shade, at) => shade && expect(ids[at]).toBe(shade.id))
        const added = ids.filter((_, at) => !filled[at]).map((id) => line[Number(id)]!.lab[0])
        expect(added).toEqual(added.toSorted((a, b) => b - a))
      }),
      { numRuns: 50 },
    )
  })

  test('what is added stands apart from every other, as far as is said', () => {
    fc.assert(
      fc.property(kinds, lineAndPlaces({ min: 5, max: 30 }), (kind, { line, places }) => {
        const filled = places.map((shade) => (shade === null ? null : line[shade]!))
        const found = completeByRelation(kind, filled, line)!
        const labs = found.places.map(({ shadeId }) => line[Number(shadeId)]!.lab)
        labs.forEach((lab, at) => {
          if (filled[at]) return
          labs.forEach((other, index) => {
            if (index !== at)
              expect(deltaE00(lab, other)).toBeGreaterThanOrEqual(found.apart - 1e-9)
          })
        })
      }),
      { numRuns: 50 },
    )
  })

  test('the order of the line does not matter', () => {
    const line = dyedLine(24)
    for (const kind of RELATION_KINDS) {
      const one = completeByRelation(kind, NONE, line)!
      const other = completeByRelation(kind, NONE, line.toReversed())!
      expect(other.places).toEqual(one.places)
    }
  })

  test('a line of 40 gives each relation what it promises', () => {
    const line = dyedLine(40)
    const byId = new Map(line.map((shade) => [shade.id, shade]))
    for (const kind of RELATION_KINDS) {
      const { places, apart, hues } = completeByRelation(kind, NONE, line)!
      expect(apart).toBe(10)
      const sides = { near: 1, opposite: 2, family: 1, 'three-way': 3 }[kind]
      expect(hues).toHaveLength(sides)
      expect(new Set(places.map(({ side }) => side)).size).toBe(sides)
      const lightness = places.map(({ shadeId }) => byId.get(shadeId)!.lab[0])
      lightness.slice(1).forEach((L, at) => {
        expect(lightness[at]! - L).toBeGreaterThanOrEqual(LIGHTNESS_STEP)
      })
    }
  })

  test('opposite shades in place are said to strain a relation of near hues', () => {
    const line = dyedLine(40)
    const filled: MatchShade[] = [
      { id: 'red', lab: [45, 55, 30] },
      { id: 'green', lab: [60, -45, 25] },
    ]
    const near = completeByRelation('near', [filled[0]!, null, null, null, filled[1]!], line)!
    expect(near.strained).toBe(true)
    expect(near.places[0]!.shadeId).toBe('red')
    expect(near.places[4]!.shadeId).toBe('green')
    expect(Math.max(near.places[0]!.hueOff!, near.places[4]!.hueOff!)).toBeGreaterThanOrEqual(
      STRAINED,
    )
    expect(
      completeByRelation('opposite', [filled[0]!, null, null, null, null], line)!.strained,
    ).toBe(false)
  })

  test('a line of greys is completed light to dark, with no hue held against it', () => {
    const greys = [15, 25, 40, 55, 70, 85, 95].map((L): MatchShade => ({
      id: `L${L}`,
      lab: [L, 0, 0],
    }))
    const { places, strained } = completeByRelation('family', NONE, greys)!
    expect(strained).toBe(false)
    expect(places.map(({ hueOff }) => hueOff)).toEqual(NONE)
    expect(places[0]!.shadeId).toMatch(/L(85|95)/)
    expect(places[4]!.shadeId).toMatch(/L(15|25)/)
  })

  test('a line too short for five gives none; other than five places are refused', () => {
    const line = dyedLine(10).slice(0, 4)
    expect(completeByRelation('near', NONE, line)).toBeNull()
    expect(() => completeByRelation('near', [null], line)).toThrow(RangeError)
  })
})
