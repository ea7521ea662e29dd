import { READING_KINDS, type ReadingKind } from '@/lib/color/readings'

/** The most ΔE00 that the five can be asked to stand apart. */
export const MOST_APART = 25
/** The most shades that can be locked, or excluded. */
const MOST_SHADES = 500

const UUID = /^[0-9a-f]{8}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{12}$/i

/** What a designer asks of a match. */
export interface MatchWishes {
  reading: ReadingKind
  /** Ids of shades. */
  lock: string[]
  exclude: string[]
  /** ΔE00. */
  apart?: number
}

/**
 * The wishes of an address, for the page that shows them and the route that grants them; null when
 * anything in it makes no sense. By hand, since every visit would load zod for these four.
 */
export function readWishes(address: Readonly<Record<string, unknown>>): MatchWishes | null {
  const idsOf = (value: unknown = '') => String(value).split(',').filter(Boolean)
  const [lock, exclude] = [idsOf(address.lock), idsOf(address.exclude)]
  const { reading = 'true', apart } = address
  const makesSense =
    READING_KINDS.includes(reading as ReadingKind) &&
    [lock, exclude].every((ids) => ids.length <= MOST_SHADES && ids.every((id) => UUID.test(id))) &&
    (apart === undefined || (Number(apart) >= 0 && Number(apart) <= MOST_APART))
  if (!makesSense) return null
  return {
    reading: reading as ReadingKind,
    lock,
    exclude,
    ...(apart !== undefined && { apart: Number(apart) }),
  }
}
