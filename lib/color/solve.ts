import {
  freeOptions,
  improveBySwaps,
  objectiveOf,
  startingChoice,
  type ChoiceProblem,
} from './solve-start'

export type { ChoiceProblem } from './solve-start'

/** A limit on the time a proof may take; the clock is handed in so that this folder has none. */
export interface SolveLimit {
  /** Milliseconds, rising; `performance.now` will do. */
  now: () => number
  budgetMs: number
}

/** The best choice found, and what is proved about it. */
export interface Choice {
  /** Ascending. */
  chosen: number[]
  objective: number
  /** No choice costs less; equal to the objective when certified. */
  lowerBound: number
  /** Proved to be the cheapest there is, to within 1e-9 of the objective. */
  certified: boolean
  /** (objective − lowerBound) / |objective|; 0 when certified. */
  gap: number
}

/** A part of the search: some options taken, the rest to be chosen among the candidates. */
interface Node {
  taken: number[]
  need: number
  candidates: Int32Array
  /** Per cell, the cheapest of the taken options; Infinity before the first. */
  served: Float64Array
  /** Σ unary of the taken options. */
  base: number
}

/** What a Lagrangian bound says about a node. */
interface Bound {
  value: number
  /** Those that can still be in a cheaper choice, by reduced cost. */
  candidates: Int32Array
  reduced: Float64Array
  sumU: number
  u: Float64Array
}

const ROOT_STEPS = 400
const DEEP_STEPS = [0, 0, 12, 30, 60]
/** So few candidates beyond those needed are enumerated sooner than bounded further. */
const FEW = 15
/** A conflict-free set that takes longer than this to find is bounded by the cheapest of any. */
const SET_VISITS = 400

/**
 * The cheapest choice, proved: greedy and swaps above, a Lagrangian dual by subgradient below,
 * candidates fixed out by reduced cost, and depth-first enumeration of what is left. Null when no
 * choice satisfies the conflicts. Deterministic without a limit; ties go to the lower index in the
 * order of the search. Exponential at worst; 48 options and 255 cells take a few milliseconds.
 * @source Beasley (1993) Eur. J. Oper. Res. 65(3):383–399, Lagrangean heuristics for location
 */
export function solveChoice(problem: ChoiceProblem, limit?: SolveLimit): Choice | null {
  return new Search(problem, limit).run()
}

class Search {
  private best: number[] = []
  private objective = Infinity
  private stopped = false
  private readonly stopAt: number

  constructor(
    private readonly problem: ChoiceProblem,
    private readonly limit?: SolveLimit,
  ) {
    this.stopAt = limit ? limit.now() + limit.budgetMs : Infinity
  }

  run(): Choice | null {
    const { problem } = this
    const { cells, cost, unary, count, locked } = problem
    const free = freeOptions(problem)
    const start = startingChoice(problem, free)
    if (!start) return null
    this.best = start
    this.objective = objectiveOf(problem, start)

    const served = new Float64Array(cells).fill(Infinity)
    let base = 0
    for (const option of locked) {
      base += unary[option]!
      for (let i = 0; i < cells; i++) served[i] = Math.min(served[i]!, cost[option * cells + i]!)
    }
    const root: Node = {
      taken: [...locked],
      need: count - locked.length,
      candidates: Int32Array.from(free),
      served,
      base,
    }
    let rootBound = this.objective
    if (root.need === 1) this.tryLast(root)
    else if (root.need > 1) {
      const u = new Float64Array(cells)
      u.set(served)
      for (const option of start)
        for (let i = 0, at = option * cells; i < cells; i++, at++)
          if (cost[at]! < u[i]!) u[i] = cost[at]!
      const bound = this.bound(root, u, ROOT_STEPS)
      rootBound = bound.value
      // A last look around the best choice of the dual, before anything is enumerated.
      this.offer(improveBySwaps(problem, Array.from(bound.candidates), this.best))
      this.branch(root, bound)
    }
    const lowerBound = this.stopped ? Math.min(rootBound, this.objective) : this.objective
    return {
      chosen: [...this.best].sort((a, b) => a - b),
      objective: this.objective,
      lowerBound,
      certified: !this.stopped,
      gap: this.stopped
        ? (this.objective - lowerBound) / Math.max(1e-12, Math.abs(this.objective))
        : 0,
    }
  }

  /** What is not cheaper than this is not looked at: the objective less a rounding error. */
  private get ceiling(): number {
    return this.objective - 1e-9 * Math.max(1, Math.abs(this.objective))
  }

  private offer(chosen: number[]): void {
    const objective = objectiveOf(this.problem, chosen)
    if (objective < this.objective - 1e-12) {
      this.objective = objective
      this.best = chosen
    }
  }

  private outOfTime(): boolean {
    if (!this.stopped && this.limit && this.limit.now() >= this.stopAt) this.stopped = true
    return this.stopped
  }

  /**
   * LB(u) = base + Σu + the least Σρ of a conflict-free set, ρ_j = f_j + Σ min(0, c_ij − u_i);
   * u climbs by the subgradient 1 − #(chosen options that serve the cell below u).
   */
  private bound(node: Node, startU: Float64Array, steps: number): Bound {
    const { cells, cost, unary } = this.problem
    const { served, base, need } = node
    const u = Float64Array.from(startU)
    for (let i = 0; i < cells; i++) u[i] = Math.min(u[i]!, served[i]!)
    const reduced = new Float64Array(this.problem.options)
    let candidates = node.candidates
    let best: Bound = { value: -Infinity, candidates, reduced, sumU: 0, u }
    const slope = new Int8Array(cells)
    let theta = 1.5
    let idle = 0
    for (let step = 0; ; step++) {
      let sumU = base
      for (let i = 0; i < cells; i++) sumU += u[i]!
      for (let c = 0; c < candidates.length; c++) {
        const option = candidates[c]!
        let sum = unary[option]!
        for (let i = 0, at = option * cells; i < cells; i++, at++) {
          const saved = cost[at]! - u[i]!
          if (saved < 0) sum += saved
        }
        reduced[option] = sum
      }
      sortByValue(candidates, reduced)
      const set = this.cheapestSet(candidates, reduced, need)
      const value = sumU + set.sum
      if (value > best.value + 0.01 * (this.objective - best.value)) idle = 0
      else if (++idle >= 6) {
        idle = 0
        theta /= 2
      }
      if (value > best.value) {
        candidates = this.fix(candidates, reduced, need, sumU)
        best = {
          value,
          candidates: candidates.slice(),
          reduced: reduced.slice(),
          sumU,
          u: u.slice(),
        }
      }
      if (set.chosen) this.offer([...node.taken, ...set.chosen])
      if (step >= steps || theta < 0.01 || best.value >= this.ceiling) break
      if (candidates.length <= need + FEW || (step % 16 === 15 && this.outOfTime())) break

      const chosen = set.chosen ?? Array.from(candidates.subarray(0, need))
      let norm = 0
      slope.fill(1)
      for (let k = 0; k < need; k++)
        for (let i = 0, at = chosen[k]! * cells; i < cells; i++, at++)
          if (cost[at]! < u[i]!) slope[i]!--
      for (let i = 0; i < cells; i++) {
        // Where u already stands at what is served, it cannot rise.
        if (slope[i]! > 0 && u[i]! >= served[i]!) slope[i] = 0
        norm += slope[i]! * slope[i]!
      }
      if (norm === 0) break
      const stride = (theta * (this.objective - value)) / norm
      for (let i = 0; i < cells; i++)
        if (slope[i]) u[i] = Math.min(served[i]!, u[i]! + stride * slope[i]!)
    }
    return best
  }

  /** Leaves out every candidate that no cheaper choice can hold. Candidates come sorted. */
  private fix(
    candidates: Int32Array,
    reduced: Float64Array,
    need: number,
    sumU: number,
  ): Int32Array {
    if (candidates.length < need) return candidates
    let others = 0
    for (let c = 0; c < need - 1; c++) others += reduced[candidates[c]!]!
    const most = this.ceiling - sumU - others
    return candidates.filter((option, index) => index < need || reduced[option]! < most)
  }

  /**
   * The conflict-free set of least Σ reduced cost among sorted candidates; after SET_VISITS only
   * its lower bound, the least sum of any set. Infinity when there is none.
   */
  private cheapestSet(
    candidates: Int32Array,
    reduced: Float64Array,
    need: number,
    from = 0,
    against = -1,
  ): { sum: number; chosen: number[] | null } {
    const { conflicts, options } = this.problem
    const n = candidates.length
    const picked: number[] = []
    let bestSum = Infinity
    let bestSet: number[] | null = null
    let visits = 0
    const descend = (at: number, sum: number): void => {
      const left = need - picked.length
      if (left === 0) {
        bestSum = sum
        bestSet = [...picked]
        return
      }
      for (let c = at; c + left <= n; c++) {
        let least = sum
        for (let k = 0; k < left; k++) least += reduced[candidates[c + k]!]!
        if (least >= bestSum || ++visits > SET_VISITS) return
        const option = candidates[c]!
        const row = option * options
        if (against >= 0 && conflicts[row + against]) continue
        if (picked.some((other) => conflicts[row + other])) continue
        picked.push(option)
        descend(c + 1, sum + reduced[option]!)
        picked.pop()
      }
    }
    descend(from, 0)
    if (visits > SET_VISITS) {
      let sum = 0
      for (let c = from; c < from + need; c++) sum += reduced[candidates[c]!]!
      return { sum, chosen: bestSet }
    }
    return { sum: bestSum, chosen: bestSet }
  }

  /** Takes each candidate in turn, with those after it left to choose from. */
  private branch(node: Node, { candidates, reduced, sumU, u, value }: Bound): void {
    if (value >= this.ceiling) return
    const { cells, options, cost, unary, conflicts } = this.problem
    for (let c = 0; c + node.need <= candidates.length; c++) {
      if (this.outOfTime()) return
      const option = candidates[c]!
      let least = sumU
      for (let k = 0; k < node.need; k++) least += reduced[candidates[c + k]!]!
      if (least >= this.ceiling) return
      const rest = this.cheapestSet(candidates, reduced, node.need - 1, c + 1, option)
      if (sumU + reduced[option]! + rest.sum >= this.ceiling) continue
      const row = option * options
      const served = new Float64Array(cells)
      for (let i = 0, at = option * cells; i < cells; i++, at++)
        served[i] = Math.min(node.served[i]!, cost[at]!)
      const child: Node = {
        taken: [...node.taken, option],
        need: node.need - 1,
        candidates: candidates.subarray(c + 1).filter((other) => !conflicts[row + other]),
        served,
        base: node.base + unary[option]!,
      }
      if (child.need === 1) this.tryLast(child)
      else this.branch(child, this.bound(child, u, DEEP_STEPS[child.need] ?? ROOT_STEPS))
    }
  }

  private tryLast({ taken, candidates, served, base }: Node): void {
    const { cells, cost, unary } = this.problem
    for (let c = 0; c < candidates.length; c++) {
      const option = candidates[c]!
      let sum = base + unary[option]!
      for (let i = 0, at = option * cells; i < cells && sum < this.objective; i++, at++)
        sum += cost[at]! < served[i]! ? cost[at]! : served[i]!
      if (sum < this.ceiling) this.offer([...taken, option])
    }
  }
}

/** Ascending, ties by index. Insertion sort: the order hardly changes from step to step. */
function sortByValue(order: Int32Array, values: Float64Array): void {
  for (let i = 1; i < order.length; i++) {
    const option = order[i]!
    const value = values[option]!
    let at = i - 1
    while (at >= 0) {
      const other = values[order[at]!]!
      if (other < value || (other === value && order[at]! < option)) break
      order[at + 1] = order[at]!
      at--
    }
    order[at + 1] = option
  }
}
