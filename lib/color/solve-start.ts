/** Choose `count` of n options so that the cells are served as cheaply as possible. */
export interface ChoiceProblem {
  cells: number
  options: number
  /** options×cells row-major, finite, ≥ 0: what a cell costs when this option serves it. */
  cost: Float64Array
  /** One an option: what choosing it costs, or brings when negative. */
  unary: Float64Array
  /** options×options, symmetric: 1 where two options may not be chosen together. */
  conflicts: Uint8Array
  /** How many to choose; 5 for a combination. */
  count: number
  /** Always chosen; conflicts among them do not count. */
  locked: readonly number[]
  /** Never chosen. */
  excluded: readonly number[]
}

/** Σ over cells of the cheapest chosen option, and the unary of each: what is minimised. */
export function objectiveOf(problem: ChoiceProblem, chosen: ArrayLike<number>): number {
  const { cells, cost, unary } = problem
  let sum = 0
  for (let c = 0; c < chosen.length; c++) sum += unary[chosen[c]!]!
  for (let i = 0; i < cells; i++) {
    let least = Infinity
    for (let c = 0; c < chosen.length; c++) {
      const value = cost[chosen[c]! * cells + i]!
      if (value < least) least = value
    }
    sum += least
  }
  return sum
}

/** The options that may still be chosen beside the locked ones, ascending. */
export function freeOptions({ options, conflicts, locked, excluded }: ChoiceProblem): number[] {
  const out = new Uint8Array(options)
  for (const option of excluded) out[option] = 1
  for (const option of locked) {
    out[option] = 1
    for (let other = 0; other < options; other++)
      if (conflicts[option * options + other]) out[other] = 1
  }
  return Array.from({ length: options }, (_, option) => option).filter((option) => !out[option])
}

/**
 * Any `need` of the candidates that do not conflict, or null when there are none. Complete: a
 * depth-first clique search, cut by a greedy colouring of the compatible candidates.
 */
export function anyCompatible(
  problem: ChoiceProblem,
  candidates: readonly number[],
  need: number,
): number[] | null {
  if (need === 0) return []
  if (candidates.length < need) return null
  const { conflicts, options } = problem
  // Options that all conflict with each other give at most one: fewer such groups than needed is
  // a proof that nothing fits.
  const groups: number[][] = []
  for (const candidate of candidates) {
    const row = candidate * options
    const group = groups.find((members) => members.every((member) => conflicts[row + member]))
    if (group) group.push(candidate)
    else groups.push([candidate])
  }
  // From the last group down, each candidate together with those of earlier groups only.
  const order = groups.flat()
  for (let at = order.length - 1; at >= 0; at--) {
    const candidate = order[at]!
    let last = 0
    for (let seen = 0; seen <= at; last++) seen += groups[last]!.length
    if (last < need) return null
    const row = candidate * options
    const rest = order.slice(0, at).filter((other) => !conflicts[row + other])
    const found = anyCompatible(problem, rest, need - 1)
    if (found) return [candidate, ...found]
  }
  return null
}

/** Cheapest first pick after pick; null when the conflicts leave no room for the last ones. */
function greedy(problem: ChoiceProblem, candidates: readonly number[]): number[] | null {
  const { cells, options, cost, unary, conflicts, count, locked } = problem
  const chosen = [...locked]
  const served = new Float64Array(cells).fill(Infinity)
  const serve = (option: number) => {
    for (let i = 0; i < cells; i++) served[i] = Math.min(served[i]!, cost[option * cells + i]!)
  }
  for (const option of locked) serve(option)
  let left = candidates
  while (chosen.length < count) {
    let best = -1
    let least = Infinity
    for (const option of left) {
      let sum = unary[option]!
      for (let i = 0, at = option * cells; i < cells; i++, at++)
        sum += cost[at]! < served[i]! ? cost[at]! : served[i]!
      if (sum < least) {
        least = sum
        best = option
      }
    }
    if (best < 0) return null
    chosen.push(best)
    serve(best)
    left = left.filter((option) => option !== best && !conflicts[best * options + option])
  }
  return chosen
}

/** Swaps one unlocked choice for another candidate for as long as that is cheaper. */
export function improveBySwaps(
  problem: ChoiceProblem,
  candidates: readonly number[],
  chosen: number[],
): number[] {
  const { cells, options, cost, unary, conflicts, locked } = problem
  const rest = new Float64Array(cells)
  let current = chosen
  let objective = objectiveOf(problem, current)
  for (let improved = true; improved;) {
    improved = false
    for (let place = locked.length; place < current.length; place++) {
      const others = current.filter((_, index) => index !== place)
      let base = 0
      for (const option of others) base += unary[option]!
      rest.fill(Infinity)
      for (const option of others)
        for (let i = 0, at = option * cells; i < cells; i++, at++)
          if (cost[at]! < rest[i]!) rest[i] = cost[at]!
      for (const option of candidates) {
        if (current.includes(option)) continue
        const row = option * options
        if (others.some((other) => conflicts[row + other] && !locked.includes(other))) continue
        let sum = base + unary[option]!
        for (let i = 0, at = option * cells; i < cells && sum < objective; i++, at++)
          sum += cost[at]! < rest[i]! ? cost[at]! : rest[i]!
        if (sum < objective - 1e-12) {
          objective = sum
          current = current.with(place, option)
          improved = true
        }
      }
    }
  }
  return current
}

/**
 * A good choice to start from: greedy and swaps, or any that fits where greedy gets stuck. Null
 * when the conflicts leave none, which is then proved. The locked ones come first in it.
 */
export function startingChoice(
  problem: ChoiceProblem,
  candidates: readonly number[],
): number[] | null {
  const { count, locked } = problem
  const start = greedy(problem, candidates)
  if (start) return improveBySwaps(problem, candidates, start)
  const free = anyCompatible(problem, candidates, count - locked.length)
  return free && improveBySwaps(problem, candidates, [...locked, ...free])
}
