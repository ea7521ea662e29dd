import { matchPhotograph, type Match, type MatchShade, type NoMatch } from '@/lib/color/match'
import type { PhotographCell } from '@/lib/color/photograph-colors'
import { READING_KINDS } from '@/lib/color/readings'

/** What is stored of the five readings of a photograph, in the order of READING_KINDS. */
export type StoredMatches = (Match | NoMatch)[]

/** The five readings of a photograph with no wishes; a line of too few shades gives the reason. */
export function computeMatches(
  cells: PhotographCell[],
  shades: readonly MatchShade[],
): StoredMatches {
  return READING_KINDS.map((kind) => {
    try {
      return matchPhotograph({ cells }, [...shades], kind)
    } catch (error) {
      if (error instanceof RangeError) return { kind, unavailable: error.message }
      throw error
    }
  })
}
