import fc from 'fast-check'
import loadHighs from 'highs'
import { describe, expect, test } from 'vitest'

import { solveChoice, type ChoiceProblem } from '@/lib/color/solve'
import { objectiveOf } from '@/lib/color/solve-start'
import { seededRandom } from '@/scripts/bench/line'
import { bruteForce, randomChoice } from '@/scripts/bench/random-choice'

/** What a choice has to satisfy, whatever it costs. */
function expectAllowed(problem: ChoiceProblem, chosen: number[]): void {
  const { options, conflicts, count, locked, excluded } = problem
  expect(chosen).toHaveLength(count)
  expect(new Set(chosen).size).toBe(count)
  for (const lock of locked) expect(chosen).toContain(lock)
  for (const option of chosen) {
    expect(excluded).not.toContain(option)
    for (const other of chosen)
      if (!(locked.includes(option) && locked.includes(other)))
        expect(conflicts[option * options + other]).toBe(0)
  }
}

/** The same problem as a mixed-integer programme for an independent solver. */
function asProgramme({
  cells,
  options,
  cost,
  unary,
  conflicts,
  count,
  locked,
  excluded,
}: ChoiceProblem): string {
  const term = (value: number, name: string) =>
    `${value < 0 ? '-' : '+'} ${Math.abs(value).toFixed(12)} ${name}`
  const all = Array.from({ length: options }, (_, j) => j)
  const served = Array.from({ length: cells }, (_, i) => i)
  const lines: string[] = []
  lines.push(`${all.map((j) => `+ y${j}`).join(' ')} = ${count}`)
  for (const i of served) {
    lines.push(`${all.map((j) => `+ x${i}_${j}`).join(' ')} = 1`)
    for (const j of all) lines.push(`x${i}_${j} - y${j} <= 0`)
  }
  for (const a of all)
    for (const b of all)
      if (a < b && conflicts[a * options + b] && !(locked.includes(a) && locked.includes(b)))
        lines.push(`y${a} + y${b} <= 1`)
  for (const j of locked) lines.push(`y${j} = 1`)
  for (const j of excluded) lines.push(`y${j} = 0`)
  const costs = served.flatMap((i) => all.map((j) => term(cost[j * cells + i]!, `x${i}_${j}`)))
  return [
    'Minimize',
    ` obj: ${[...all.map((j) => term(unary[j]!, `y${j}`)), ...costs].join('\n ')}`,
    'Subject To',
    ...lines.map((line, at) => ` c${at}: ${line}`),
    'Binary',
    ` ${all.map((j) => `y${j}`).join(' ')}`,
    'End',
  ].join('\n')
}

/** Five of two dozen and more, cells and options as points in a room, so that it looks like colour. */
function roomChoice(random: () => number): ChoiceProblem {
  const options = 20 + Math.floor(random() * 16)
  const cells = 20 + Math.floor(random() * 15)
  const point = () => [random() * 60, random() * 60, random() * 60]
  const shades = Array.from({ length: options }, point)
  const colors = Array.from({ length: cells }, point)
  const weights = colors.map(() => random() ** 3 / 5)
  const apart = (a: number[], b: number[]) => Math.hypot(...a.map((value, k) => value - b[k]!))
  const conflicts = new Uint8Array(options * options)
  const limit = random() * 30
  shades.forEach((a, i) =>
    shades.forEach((b, j) => {
      if (i !== j && apart(a, b) < limit) conflicts[i * options + j] = 1
    }),
  )
  const locks = Math.floor(random() * 3)
  return {
    cells,
    options,
    cost: Float64Array.from(
      { length: options * cells },
      (_, at) => weights[at % cells]! * apart(shades[Math.floor(at / cells)]!, colors[at % cells]!),
    ),
    unary: Float64Array.from({ length: options }, () => random() * 3 - 0.5),
    conflicts,
    count: 5,
    locked: [4, 9].slice(0, locks),
    excluded: random() < 0.5 ? [1, 2, 3] : [],
  }
}

describe('the exact solver', () => {
  test('equals brute force on 4,000 small random instances', () => {
    const random = seededRandom(11)
    let impossible = 0
    for (let n = 0; n < 4000; n++) {
      const problem = randomChoice(random)
      const least = bruteForce(problem)
      const found = solveChoice(problem)
      if (!found) {
        expect(least).toBe(Infinity)
        impossible++
        continue
      }
      expect(found.certified).toBe(true)
      expect(found.objective).toBeCloseTo(least, 9)
      expect(objectiveOf(problem, found.chosen)).toBeCloseTo(least, 9)
      expectAllowed(problem, found.chosen)
    }
    // Both outcomes were really met.
    expect(impossible).toBeGreaterThan(100)
    expect(impossible).toBeLessThan(2000)
  }, 60_000)

  test('equals HiGHS, an independent solver, on three dozen of middling size', async () => {
    const highs = await loadHighs()
    const random = seededRandom(12)
    let compared = 0
    for (let n = 0; n < 36; n++) {
      const problem = roomChoice(random)
      const found = solveChoice(problem)
      const theirs = highs.solve(asProgramme(problem), {
        output_flag: false,
        mip_rel_gap: 0,
        mip_abs_gap: 1e-9,
      })
      if (!found) {
        expect(theirs.Status).toBe('Infeasible')
        continue
      }
      expect(theirs.Status).toBe('Optimal')
      expect(Math.abs(found.objective - theirs.ObjectiveValue)).toBeLessThan(1e-6)
      expectAllowed(problem, found.chosen)
      compared++
    }
    expect(compared).toBeGreaterThan(24)
  }, 120_000)

  test('answers the same twice', () => {
    fc.assert(
      fc.property(fc.integer(), (seed) => {
        const problem = randomChoice(seededRandom(seed))
        expect(solveChoice(problem)).toEqual(solveChoice(problem))
      }),
    )
  })

  test('no wish makes the best cheaper', () => {
    fc.assert(
      fc.property(fc.integer(), (seed) => {
        const problem = randomChoice(seededRandom(seed))
        const bound = solveChoice(problem)
        const free = solveChoice({
          ...problem,
          locked: [],
          excluded: [],
          conflicts: new Uint8Array(problem.conflicts.length),
        })!
        if (bound) expect(bound.objective).toBeGreaterThanOrEqual(free.objective - 1e-9)
      }),
    )
  })

  test('takes conflicts among the locked for the designer’s word', () => {
    const conflicts = new Uint8Array(9)
    for (const [a, b] of [
      [0, 1],
      [1, 0],
    ] as const)
      conflicts[a * 3 + b] = 1
    const problem = {
      cells: 1,
      options: 3,
      cost: Float64Array.of(1, 2, 3),
      unary: new Float64Array(3),
      conflicts,
      count: 2,
      excluded: [],
    }
    expect(solveChoice({ ...problem, locked: [0, 1] })?.chosen).toEqual([0, 1])
    expect(solveChoice({ ...problem, locked: [0] })?.chosen).toEqual([0, 2])
  })

  test('out of time, says so and gives a lower bound that holds', () => {
    const random = seededRandom(13)
    let stopped = 0
    for (let n = 0; n < 40; n++) {
      const problem = roomChoice(random)
      const whole = solveChoice(problem)
      if (!whole) continue
      let ticks = 0
      const cut = solveChoice(problem, { now: () => ticks++, budgetMs: 1 })!
      expectAllowed(problem, cut.chosen)
      expect(cut.lowerBound).toBeLessThanOrEqual(whole.objective + 1e-9)
      expect(cut.objective).toBeGreaterThanOrEqual(whole.objective - 1e-9)
      if (cut.certified) {
        expect(cut.objective).toBeCloseTo(whole.objective, 9)
      } else {
        stopped++
        expect(cut.gap).toBeGreaterThanOrEqual(0)
        expect(cut.gap).toBeCloseTo((cut.objective - cut.lowerBound) / Math.abs(cut.objective), 9)
      }
    }
    expect(stopped).toBeGreaterThan(0)
  })
})
