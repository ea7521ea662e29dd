/** The bounds of what a line's families may be. */
export const FAMILY_LIMITS = {
  name: 40,
  /** Families that may be asked for, the neutrals not counted. */
  least: 2,
  most: 12,
  /** All families of a line, by whatever way they came. */
  perLine: 40,
  /**
   * A line with fewer shades than this, in which nobody has put anything in its place, is sorted
   * whole when a shade comes: a family or two made of the first few would not hold the rest.
   */
  settled: 12,
} as const

/** The name of a family as it is compared with others. */
export const familyKey = (name: string): string => name.normalize('NFC').trim().toLowerCase()
