/** The bounds of a kit. */
export const KIT_LIMITS = {
  /** Combinations of one kit. */
  combinations: 24,
  perPage: 20,
  /** Kits whose progress is asked for in one request. */
  followed: 20,
  /** Days that a kit can be downloaded; then its file is removed, and it can be built again. */
  keptDays: 30,
  /** Seconds that the link of one download is good for. */
  linkSeconds: 10 * 60,
} as const

/** Where a kit stands; one that is ready can be downloaded until it expires. */
export type KitState = 'waiting' | 'building' | 'ready' | 'failed'

/** Where one kit stands, as a page that follows it is told. */
export interface KitStanding {
  id: string
  state: KitState
  /** How many of `total` steps are done. */
  done: number
  total: number
  failure: string | null
}

/** Whether a state will still change by itself, so that a page follows it. */
export const isUnbuilt = (state: KitState): boolean => state === 'waiting' || state === 'building'
