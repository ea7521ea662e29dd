/**
 * Where a photograph stands: `pending` (bytes expected in the object store), `waiting` (confirmed,
 * queued), `reading`, `ready`, `failed`.
 */
export const PHOTOGRAPH_STATES = ['pending', 'waiting', 'reading', 'ready', 'failed'] as const
/** One of PHOTOGRAPH_STATES. */
export type PhotographState = (typeof PHOTOGRAPH_STATES)[number]

/** Whether a state will still change by itself, so that a page follows it. */
export const isUnsettled = (state: PhotographState): boolean =>
  state === 'waiting' || state === 'reading'

/** The licence a photograph is used under. */
export const LICENCES = ['own-work', 'permission', 'cc0', 'cc-by', 'other'] as const
/** One of LICENCES. */
export type Licence = (typeof LICENCES)[number]

/** The licences as people call them. */
export const LICENCE_LABELS: Record<Licence, string> = {
  'own-work': 'Own work',
  permission: 'With permission',
  cc0: 'CC0 (no rights reserved)',
  'cc-by': 'CC BY (name the photographer)',
  other: 'Another licence',
}

/** The bounds of what a photograph may hold. */
export const PHOTOGRAPH_LIMITS = {
  title: 120,
  photographer: 120,
  licenceNote: 600,
  url: 500,
  altText: 300,
  fileName: 255,
  search: 80,
  perPage: 24,
  /** Offered to choose one from. */
  choices: 200,
  perLine: 2_000,
  /** Deleted, restored or followed in one request. */
  atOnce: 100,
} as const

/** How long a deleted photograph can be brought back, in milliseconds; then it is swept. */
export const UNDO_WINDOW = 24 * 60 * 60 * 1000

/** A copy of a photograph made for the screen. */
export interface Derivative {
  format: 'webp' | 'avif'
  /** Pixels. */
  width: number
  height: number
}

/** The states the gallery can be narrowed to; `reading` covers waiting too. */
export const GALLERY_STATES = ['ready', 'reading', 'failed'] as const

/** What the gallery can be narrowed to because it is not there yet. */
export const GALLERY_MISSING = ['licence', 'alt'] as const

/** Where one photograph stands, as a page that follows it is told. */
export interface PhotographStanding {
  id: string
  state: PhotographState
  failure: string | null
}
