import type { ReadingKind } from '@/lib/color/readings'

/** The bounds of a kept combination. */
export const COMBINATION_LIMITS = {
  title: 80,
  story: 1200,
  places: 5,
  search: 80,
  /** How far the five shares may be from 1 before they are no shares of one thing. */
  shareTolerance: 0.01,
  /** The least share of a place, in percent: less is no band on the card. */
  leastPercent: 2,
} as const

/**
 * What each of the five is called in a pattern, by its place: the main colour and four contrasts.
 * @source common practice of knitting patterns (MC, CC)
 */
export const PLACE_ROLES = ['MC', 'CC1', 'CC2', 'CC3', 'CC4'] as const
/** One of PLACE_ROLES. */
export type PlaceRole = (typeof PLACE_ROLES)[number]

/** The lanes of the board, from first idea to what is published. */
export const LANES = ['sketched', 'short-listed', 'chosen'] as const
/** One of LANES. */
export type Lane = (typeof LANES)[number]
/** What the lanes are called. */
export const LANE_WORDS: Record<Lane, string> = {
  sketched: 'Sketched',
  'short-listed': 'Short-listed',
  chosen: 'Chosen',
}

/** What a combination is called until somebody gives it a title. */
export const SKETCH_TITLE = 'A new sketch'

const DRAFT_ENDINGS: Record<ReadingKind, string> = {
  true: 'in five',
  accent: 'with its accent',
  contrast: 'light to dark',
  family: 'all of a kind',
  quiet: 'spoken low',
}

/** A first title for a combination, from its photograph's: "Hillside above the tarn, in five". */
export function draftTitle(photographTitle: string, reading: ReadingKind): string {
  const ending = `, ${DRAFT_ENDINGS[reading]}`
  const room = COMBINATION_LIMITS.title - ending.length
  const title = photographTitle.trim()
  const start = title.length > room ? `${title.slice(0, room - 1).trimEnd()}…` : title
  return `${start}${ending}`
}
