/** How far a shade has come: wished for, dyed as a lab dip, approved, no longer made. */
export const SHADE_STATUSES = ['target', 'dipped', 'approved', 'retired'] as const
/** One of SHADE_STATUSES. */
export type ShadeStatus = (typeof SHADE_STATUSES)[number]

/**
 * The terms a Lab reading may come with: illuminant and standard observer. Nothing is assumed for a
 * reading that does not say, and nothing is converted: instruments read D65 for textiles.
 */
export const READING_TERMS = ['D65/10', 'D65/2'] as const
/** One of READING_TERMS. */
export type ReadingTerms = (typeof READING_TERMS)[number]

/** READING_TERMS in words. */
export const TERMS_WORDS: Record<ReadingTerms, string> = {
  'D65/10': 'D65, 10° observer',
  'D65/2': 'D65, 2° observer',
}

/** The bounds of what a shade may hold. */
export const SHADE_LIMITS = {
  number: 16,
  /** CIELAB; a and b beyond ±150 are no surface colour. */
  ab: 150,
  perLine: 5_000,
  search: 60,
  tablePage: 50,
  bookPage: 200,
  /** Rows of one CSV file. */
  importRows: 5_000,
  /** Characters of one CSV file; what a server action takes is set in next.config.mjs. */
  importText: 2_500_000,
} as const

/** Where the coordinates of a surface colour in CIELAB lie. */
export const LAB_RANGES = {
  L: [0, 100],
  a: [-SHADE_LIMITS.ab, SHADE_LIMITS.ab],
  b: [-SHADE_LIMITS.ab, SHADE_LIMITS.ab],
} as const

/** A hex colour as typed, as six lower-case digits after `#`; null when it is none. */
export function parseHex(text: string): string | null {
  const digits = /^#?([0-9a-f]{3}|[0-9a-f]{6})$/.exec(text.trim().toLowerCase())?.[1]
  if (!digits) return null
  return `#${digits.length === 3 ? digits.replace(/./g, '$&$&') : digits}`
}

/** Text as it is kept: composed, on one line, without blanks at its ends. */
export const oneLine = (text: string): string => text.normalize('NFC').replace(/\s+/gu, ' ').trim()

/**
 * A reading as written: a decimal point or comma, a hyphen or a minus sign, an exponent. Null when
 * it is anything else; never NaN, infinite or −0.
 */
export function parseReading(text: string): number | null {
  const plain = text.trim().replace('\u2212', '-').replace(',', '.')
  if (!/^[+-]?(\d+\.?\d*|\.\d+)(e[+-]?\d{1,3})?$/i.test(plain)) return null
  const value = Number(plain)
  return Number.isFinite(value) ? value + 0 : null
}

/** What a column of a CSV file may hold; also the header of our own, in this order. */
export const CSV_FIELDS = [
  'number',
  'name',
  'status',
  'L',
  'a',
  'b',
  'illuminant',
  'observer',
  'hex',
  'order',
] as const
/** One of CSV_FIELDS. */
export type CsvField = (typeof CSV_FIELDS)[number]
/** Which column of the file, from 0, holds which field; null when none does. */
export type CsvMapping = Record<CsvField, number | null>

/** What the table may be sorted by. */
export const SHADE_SORTS = ['order', 'number', 'name', 'status', 'L', 'a', 'b'] as const
/** One of SHADE_SORTS. */
export type ShadeSort = (typeof SHADE_SORTS)[number]

/** What a range study takes and shows. */
export const STUDY_LIMITS = {
  /** Every pair is compared: of a larger line the study would hold up everybody else. */
  shades: 1_000,
  /** The ΔE00 under which a pair may be asked for as near-twins. */
  twins: [0.5, 12],
  /** Pairs that are told of one kind; how many there are is told besides. */
  pairs: 100,
} as const

/** The orders of the sample book. */
export const BOOK_ORDERS = ['family', 'lightness', 'number'] as const
/** One of BOOK_ORDERS. */
export type BookOrder = (typeof BOOK_ORDERS)[number]
