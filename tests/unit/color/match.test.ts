import fc from 'fast-check'
import { describe, expect, test } from 'vitest'

import { deltaE00 } from '@/lib/color/ciede2000'
import {
  isMatch,
  matchPhotograph,
  nearestShades,
  READING_KINDS,
  type Match,
  type MatchShade,
  type MatchWishes,
  type ReadingKind,
} from '@/lib/color/match'
import { cellWeights, type PhotographCell } from '@/lib/color/photograph-colors'
import { huePeak } from '@/lib/color/readings'
import { chromaOf, hueOf, type Lab } from '@/lib/color/types'
import { dyedLine, seededRandom } from '@/scripts/bench/line'

const LINE = dyedLine(30, 3)
const LAB = new Map(LINE.map(({ id, lab }) => [id, lab]))

/** A made-up photograph: a few fields of colour, each with its lights and shadows. */
function photograph(seed: number, fields = 4): { cells: PhotographCell[] } {
  const random = seededRandom(seed)
  const cells: PhotographCell[] = []
  for (let field = 0; field < fields; field++) {
    const centre = [25 + 60 * random(), 90 * random() - 45, 90 * random() - 45]
    for (let n = 0; n < 8; n++)
      cells.push({
        lab: centre.map((v, axis) => v + (axis ? 8 : 20) * (random() - 0.5)) as unknown as Lab,
        area: random() ** 2 + 0.01,
      })
  }
  const sum = cells.reduce((total, { area }) => total + area, 0)
  return { cells: cells.map(({ lab, area }) => ({ lab, area: area / sum })) }
}

function five(
  colors: { cells: PhotographCell[] },
  kind: ReadingKind = 'true',
  wishes?: MatchWishes,
  line: readonly MatchShade[] = LINE,
): Match {
  const match = matchPhotograph(colors, line, kind, wishes)
  if (!isMatch(match)) throw new Error(match.unavailable)
  return match
}

const labsOf = ({ places }: Match) => places.map(({ shadeId }) => LAB.get(shadeId)!)
const pairs = <T>(list: T[]): [T, T][] =>
  list.flatMap((one, at) => list.slice(at + 1).map((other): [T, T] => [one, other]))
const seeds = fc.integer({ min: 1, max: 1e6 })

describe('the true reading', () => {
  test('costs what MATCH’s formula says, and no other five allowed cost less', () => {
    // The formula written out again, over every five of a small line.
    const line = LINE.filter((_, at) => at % 2 === 0)
    for (const seed of [1, 2, 3]) {
      const { cells } = photograph(seed)
      const weights = cellWeights(cells)
      const byChroma = [...cells].sort((a, b) => chromaOf(a.lab) - chromaOf(b.lab))
      let area = 0
      const c99 = chromaOf(byChroma.find((cell) => (area += cell.area) >= 0.99)!.lab)
      const presence = (lab: Lab) => {
        const near = cells
          .map((cell) => ({ area: cell.area, d: deltaE00(cell.lab, lab) }))
          .sort((a, b) => a.d - b.d)
        let covered = 0
        return near.find((cell) => (covered += cell.area) >= 0.01)!.d
      }
      const unary = line.map(
        ({ lab }) => 0.15 * presence(lab) + 0.05 * Math.max(0, chromaOf(lab) - c99 - 3),
      )
      const distance = line.map(({ lab }) => cells.map((cell) => deltaE00(cell.lab, lab)))
      let least = Infinity
      const chosen: number[] = []
      const extend = (from: number): void => {
        if (chosen.length === 5) {
          const cost = cells.reduce(
            (sum, _, i) => sum + weights[i]! * Math.min(...chosen.map((s) => distance[s]![i]!)),
            chosen.reduce((sum, s) => sum + unary[s]!, 0),
          )
          least = Math.min(least, cost)
          return
        }
        for (let s = from; s < line.length; s++) {
          if (chosen.some((other) => deltaE00(line[other]!.lab, line[s]!.lab) < 10)) continue
          chosen.push(s)
          extend(s + 1)
          chosen.pop()
        }
      }
      extend(0)
      const match = five({ cells }, 'true', {}, line)
      expect(match.certified).toBe(true)
      expect(match.objective).toBeCloseTo(least, 9)
    }
  })

  test('is five different shades, every pair told apart, light first', () => {
    fc.assert(
      fc.property(seeds, (seed) => {
        const match = five(photograph(seed))
        const labs = labsOf(match)
        expect(new Set(match.places.map(({ shadeId }) => shadeId)).size).toBe(5)
        expect(match.apart).toBe(10)
        for (const [one, other] of pairs(labs)) {
          expect(deltaE00(one, other)).toBeGreaterThanOrEqual(10)
          expect(one[0]).toBeGreaterThanOrEqual(other[0])
        }
      }),
      { numRuns: 40 },
    )
  })

  test('accounts for the photograph: shares, differences and regions agree', () => {
    fc.assert(
      fc.property(seeds, fc.constantFrom(...READING_KINDS), (seed, kind) => {
        const colors = photograph(seed)
        const match = matchPhotograph(colors, LINE, kind)
        if (!isMatch(match)) return
        const shares = match.places.map(() => 0)
        colors.cells.forEach(({ area }, i) => (shares[match.assignment[i]!]! += area))
        match.places.forEach(({ share, deltaE, inPhotograph }, at) => {
          expect(share).toBeCloseTo(shares[at]!, 12)
          expect(inPhotograph).toBe(share > 0)
          expect(deltaE === null).toBe(share === 0)
        })
        expect(shares.reduce((a, b) => a + b, 0)).toBeCloseTo(1, 9)
        const mean = match.places.reduce((sum, place) => sum + place.share * (place.deltaE ?? 0), 0)
        expect(match.meanDeltaE).toBeCloseTo(mean, 9)
        expect(match.leastMeanDeltaE).toBeLessThanOrEqual(match.meanDeltaE + 1e-9)
        if (kind !== 'quiet')
          colors.cells.forEach(({ lab }, i) => {
            const distances = labsOf(match).map((shade) => deltaE00(lab, shade))
            expect(distances[match.assignment[i]!]).toBe(Math.min(...distances))
          })
        expect(JSON.parse(JSON.stringify(match))).toEqual(match)
      }),
      { numRuns: 60 },
    )
  })

  test('of one flat colour is one shade at 100 %, the rest not in the photograph', () => {
    const lab = LINE[7]!.lab
    const match = five({ cells: [{ lab, area: 1 }] })
    expect(match.places.filter(({ share }) => share === 1)).toHaveLength(1)
    const [own] = match.places.filter(({ inPhotograph }) => inPhotograph)
    expect(own).toMatchObject({ shadeId: LINE[7]!.id, share: 1, deltaE: 0, presence: 0 })
    for (const place of match.places)
      if (place !== own)
        expect(place).toMatchObject({ share: 0, deltaE: null, inPhotograph: false })
  })

  test('of a grey photograph is five neutrals', () => {
    const greys = [90, 75, 60, 45, 30, 15].map((L, n): MatchShade => ({
      id: `g${n}`,
      lab: [L, 0, 1],
    }))
    const cells = Array.from({ length: 20 }, (_, n): PhotographCell => ({
      lab: [n * 5, 0, 0],
      area: 0.05,
    }))
    const match = five({ cells }, 'true', {}, [
      ...greys,
      ...LINE.filter(({ lab }) => chromaOf(lab) > 15),
    ])
    for (const { shadeId } of match.places) expect(shadeId).toMatch(/^g/)
  })
})

describe('wishes', () => {
  test('locked shades are in, excluded ones are not, and neither makes it better', () => {
    fc.assert(
      fc.property(
        seeds,
        fc.shuffledSubarray(
          LINE.map(({ id }) => id),
          { maxLength: 9 },
        ),
        (seed, ids) => {
          const colors = photograph(seed)
          const locked = ids.slice(0, ids.length % 4)
          const excluded = ids.slice(locked.length)
          const match = five(colors, 'true', { locked, excluded })
          const chosen = match.places.map(({ shadeId }) => shadeId)
          for (const id of locked) expect(chosen).toContain(id)
          for (const id of excluded) expect(chosen).not.toContain(id)
          for (const { shadeId, locked: held } of match.places)
            expect(held).toBe(locked.includes(shadeId))
          if (match.apart === 10)
            expect(match.objective).toBeGreaterThanOrEqual(five(colors).objective - 1e-9)
        },
      ),
      { numRuns: 40 },
    )
  })

  test('two locked shades may be as near as the designer likes', () => {
    const near = [...LINE, { id: 'twin', lab: [...LINE[3]!.lab] as unknown as Lab }]
    const match = five(photograph(4), 'true', { locked: ['twin', LINE[3]!.id] }, near)
    expect(match.apart).toBe(10)
    expect(match.places.filter(({ locked }) => locked)).toHaveLength(2)
  })

  test('“apart” gives way by steps of 0.65, and in the end altogether', () => {
    const at = (L: number, n: number): MatchShade => ({ id: `s${n}`, lab: [L, 0, 0] })
    const close = [40, 46, 52, 58, 64, 70].map(at)
    // Of six, the best that leaving one out can do for the nearest pair.
    const room = Math.max(
      ...close.map((left) =>
        Math.min(
          ...pairs(close.filter((shade) => shade !== left)).map(([a, b]) => deltaE00(a.lab, b.lab)),
        ),
      ),
    )
    for (const apart of [room * 0.99, room * 1.2, room * 2, room * 3.5, room * 5]) {
      const steps = [1, 0.65, 0.65 ** 2, 0.65 ** 3, 0]
      const held = steps.find((step) => apart * step <= room)! * apart
      expect(five(photograph(5), 'true', { apart }, close).apart).toBeCloseTo(held, 9)
    }
    const same = Array.from({ length: 6 }, (_, n) => at(50, n))
    expect(five(photograph(5), 'true', { apart: 30 }, same).apart).toBe(0)
    expect(five(photograph(5), 'true', { apart: 0 }, same).apart).toBe(0)
  })

  test.each<[string, MatchWishes]>([
    ['more than five locks', { locked: LINE.slice(0, 6).map(({ id }) => id) }],
    ['a lock that is excluded', { locked: [LINE[0]!.id], excluded: [LINE[0]!.id] }],
    ['a lock from elsewhere', { locked: ['nowhere'] }],
    ['a negative “apart”', { apart: -1 }],
    ['an “apart” that is no number', { apart: Number.NaN }],
  ])('%s is refused in words', (_, wishes) => {
    expect(() => matchPhotograph(photograph(6), LINE, 'true', wishes)).toThrow(RangeError)
  })

  test.each(READING_KINDS)('fewer than five shades give no %s reading, but a reason', (kind) => {
    const all = matchPhotograph(photograph(7), LINE.slice(0, 4), kind)
    expect(all).toEqual({ kind, unavailable: expect.stringContaining('ewer than five') })
    const excluded = LINE.slice(4).map(({ id }) => id)
    expect(isMatch(matchPhotograph(photograph(7), LINE, kind, { excluded }))).toBe(false)
  })
})

describe('the other readings', () => {
  const [RED] = LINE.map(({ lab }) => lab)
    .filter((lab) => Math.abs(hueOf(lab) - 35) < 20)
    .sort((a, b) => chromaOf(b) - chromaOf(a)) as [Lab]
  const meadow = (): { cells: PhotographCell[] } => {
    const green = Array.from({ length: 30 }, (_, n): PhotographCell => ({
      lab: [25 + n * 2, -15 - (n % 5) * 3, 20 + (n % 7) * 2],
      area: 0.995 / 30,
    }))
    return { cells: [...green, { lab: RED, area: 0.005 }] }
  }

  test('with the accent brings the ladybird in that the true one leaves out', () => {
    const colors = meadow()
    const reddish = (match: Match) =>
      labsOf(match).filter((lab) => chromaOf(lab) > 30 && Math.abs(hueOf(lab) - 35) < 25)
    expect(reddish(five(colors))).toHaveLength(0)
    const accent = five(colors, 'accent')
    expect(reddish(accent)).toHaveLength(1)
    expect(LAB.get(accent.accent!)).toEqual(reddish(accent)[0])
    expect(accent.places.every(({ locked }) => !locked)).toBe(true)
  })

  test('with the accent is not offered for a speck, for none, or with five locks', () => {
    const colors = meadow()
    colors.cells[colors.cells.length - 1] = { lab: RED, area: 0.0005 }
    expect(isMatch(matchPhotograph(colors, LINE, 'accent'))).toBe(false)
    expect(
      isMatch(matchPhotograph({ cells: [{ lab: [50, 0, 0], area: 1 }] }, LINE, 'accent')),
    ).toBe(false)
    const locked = LINE.slice(0, 5).map(({ id }) => id)
    expect(isMatch(matchPhotograph(meadow(), LINE, 'accent', { locked }))).toBe(false)
  })

  test('value contrast keeps 13 of lightness between any two', () => {
    fc.assert(
      fc.property(seeds, (seed) => {
        const match = five(photograph(seed), 'contrast')
        const least = 13 * (match.apart / 10)
        for (const [one, other] of pairs(labsOf(match)))
          expect(Math.abs(one[0] - other[0])).toBeGreaterThanOrEqual(least)
      }),
      { numRuns: 30 },
    )
  })

  test('one family stays within 28° of the peak, with at most one pale neutral', () => {
    fc.assert(
      fc.property(seeds, (seed) => {
        const colors = photograph(seed)
        const match = matchPhotograph(colors, LINE, 'family')
        if (!isMatch(match)) return
        const peak = huePeak(colors.cells)!
        const labs = labsOf(match)
        const strangers = labs.filter((lab) => {
          const apart = Math.abs(hueOf(lab) - peak)
          return Math.min(apart, 360 - apart) > 28
        })
        expect(strangers.length).toBeLessThanOrEqual(1)
        for (const lab of strangers) {
          expect(chromaOf(lab)).toBeLessThan(8)
          expect(lab[0]).toBeGreaterThanOrEqual(70)
        }
        for (const [one, other] of pairs(labs))
          expect(Math.abs(one[0] - other[0])).toBeGreaterThanOrEqual(8 * (match.apart / 10))
      }),
      { numRuns: 60 },
    )
  })

  test('one family finds the hue a picture lies about, and none in a grey one', () => {
    const peak = huePeak(meadow().cells)!
    expect(peak).toBeGreaterThan(115)
    expect(peak).toBeLessThan(150)
    expect(huePeak([{ lab: [50, 1, -1], area: 1 }])).toBeNull()
    const grey = matchPhotograph({ cells: [{ lab: [50, 1, -1], area: 1 }] }, LINE, 'family')
    expect(grey).toMatchObject({ unavailable: expect.stringContaining('grey') })
  })

  test('quiet takes muted shades only, and hides where they are far from the picture', () => {
    let offered = 0
    for (let seed = 1; seed <= 12; seed++) {
      const match = matchPhotograph(photograph(seed), LINE, 'quiet')
      if (!isMatch(match)) continue
      offered++
      for (const lab of labsOf(match)) expect(chromaOf(lab)).toBeLessThanOrEqual(30)
    }
    expect(offered).toBeGreaterThan(0)
    const blaze: PhotographCell[] = [{ lab: [60, 70, 75], area: 1 }]
    expect(isMatch(matchPhotograph({ cells: blaze }, LINE, 'quiet'))).toBe(false)
  })

  test.each(READING_KINDS)('%s is the same for the same photograph', (kind) => {
    expect(matchPhotograph(photograph(8), LINE, kind)).toEqual(
      matchPhotograph(photograph(8), LINE, kind),
    )
  })
})

test('the nearest shades to a colour, nearest first', () => {
  const found = nearestShades(LINE[9]!.lab, LINE, 3)
  expect(found).toHaveLength(3)
  expect(found[0]).toEqual({ shadeId: LINE[9]!.id, deltaE: 0 })
  const all = LINE.map(({ lab }) => deltaE00(LINE[9]!.lab, lab)).sort((a, b) => a - b)
  expect(found.map(({ deltaE }) => deltaE)).toEqual(all.slice(0, 3))
})
