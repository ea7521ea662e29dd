import type { Match, MatchShade } from '@/lib/color/match'
import type { Lab } from '@/lib/color/types'

export const median = (values: readonly number[]): number => {
  const sorted = [...values].sort((a, b) => a - b)
  const half = sorted.length >> 1
  return sorted.length % 2 ? sorted[half]! : (sorted[half - 1]! + sorted[half]!) / 2
}
export const mean = (values: readonly number[]): number =>
  values.reduce((a, b) => a + b, 0) / values.length
export const ms = (value: number): string => `${value.toFixed(value < 100 ? 1 : 0)} ms`

/** A piece of work and how long it took, in milliseconds. */
export async function timed<T>(work: () => T | Promise<T>): Promise<[result: T, ms: number]> {
  const started = performance.now()
  const result = await work()
  return [result, performance.now() - started]
}

/** What each of these takes, in milliseconds: medians of runs that take turns. */
export async function medianTimes(
  works: (() => Promise<unknown>)[],
  runs: number,
): Promise<number[]> {
  const times = works.map((): number[] => [])
  for (let run = 0; run < runs; run++)
    for (let turn = 0; turn < works.length; turn++) {
      // Who goes first changes, so that none always finds what another left warm.
      const at = (run + turn) % works.length
      times[at]!.push((await timed(works[at]!))[1])
    }
  return times.map(median)
}

export const labsOf = (match: Match, line: readonly MatchShade[]): Lab[] =>
  match.places.map(({ shadeId }) => line.find(({ id }) => id === shadeId)!.lab)
