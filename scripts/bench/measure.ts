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

/** How many times as long `slower` takes as `other`: medians of runs that take turns. */
export async function timesAsLong(
  slower: () => Promise<unknown>,
  other: () => Promise<unknown>,
  runs: number,
): Promise<number> {
  const times: [number[], number[]] = [[], []]
  for (let run = 0; run < runs; run++) {
    // Who goes first changes, so that neither always finds what the other left warm.
    for (const at of run % 2 ? [1, 0] : [0, 1])
      times[at]!.push((await timed(at === 0 ? slower : other))[1])
  }
  return median(times[0]) / median(times[1])
}

export const labsOf = (match: Match, line: readonly MatchShade[]): Lab[] =>
  match.places.map(({ shadeId }) => line.find(({ id }) => id === shadeId)!.lab)
