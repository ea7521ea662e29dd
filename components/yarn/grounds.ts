/** The viewing grounds shades are compared on; grey is L* 50. */
export const GROUNDS = ['white', 'grey', 'black'] as const

/** One of {@link GROUNDS}. */
export type GroundName = (typeof GROUNDS)[number]

/** The cookie that keeps the choice, so that the server draws the right ground at once. */
export const GROUND_COOKIE = 'woadmap-ground'

/** The ground a cookie names, white when it names none. */
export const parseGround = (value: string | undefined): GroundName =>
  GROUNDS.find((ground) => ground === value) ?? 'white'
