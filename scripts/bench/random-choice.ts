import { objectiveOf, type ChoiceProblem } from '@/lib/color/solve-start'

/**
 * A small random problem: 5–13 options, 1–20 cells, 1–5 to choose, with conflicts, locks,
 * exclusions, rewards, and in four of ten small whole numbers, so that ties abound.
 */
export function randomChoice(random: () => number): ChoiceProblem {
  const whole = (below: number) => Math.floor(random() * below)
  const options = 5 + whole(9)
  const cells = 1 + whole(20)
  const count = 1 + whole(5)
  const ties = random() < 0.4
  const cost = Float64Array.from({ length: options * cells }, () =>
    ties ? whole(5) : random() * 10,
  )
  const unary = Float64Array.from({ length: options }, () =>
    ties ? whole(4) - 1 : random() * 6 - 1,
  )
  const density = random() * 0.6
  const conflicts = new Uint8Array(options * options)
  for (let a = 0; a < options; a++)
    for (let b = 0; b < a; b++)
      if (random() < density) conflicts[a * options + b] = conflicts[b * options + a] = 1
  const shuffled = Array.from({ length: options }, (_, option) => ({ option, at: random() }))
    .sort((a, b) => a.at - b.at)
    .map(({ option }) => option)
  const locks = whole(count + 1)
  const locked = random() < 0.5 ? shuffled.slice(0, locks) : []
  const excluded = random() < 0.5 ? shuffled.slice(locks, locks + whole(4)) : []
  return { cells, options, cost, unary, conflicts, count, locked, excluded }
}

/** The least objective by trying every choice there is; Infinity when none fits. */
export function bruteForce(problem: ChoiceProblem): number {
  const { options, conflicts, count, locked, excluded } = problem
  let least = Infinity
  const chosen: number[] = []
  const extend = (from: number): void => {
    if (chosen.length === count) {
      if (locked.every((lock) => chosen.includes(lock)))
        least = Math.min(least, objectiveOf(problem, chosen))
      return
    }
    for (let option = from; option < options; option++) {
      if (excluded.includes(option)) continue
      const clash = chosen.some(
        (other) =>
          conflicts[option * options + other] &&
          !(locked.includes(option) && locked.includes(other)),
      )
      if (clash) continue
      chosen.push(option)
      extend(option + 1)
      chosen.pop()
    }
  }
  extend(0)
  return least
}
