/** The bounds of what a line may hold. */
export const LINE_LIMITS = {
  name: 60,
  fibre: 40,
  fibres: 8,
  ply: 12,
  grams: 1_000,
  length: 5_000,
  needleMm: 50,
  gauge: 80,
  priceMinor: 1_000_000,
  perBrand: 200,
} as const

/**
 * The standard yarn weights by number.
 * @source Craft Yarn Council, Standard Yarn Weight System (names only)
 */
export const YARN_WEIGHTS = [
  'Lace',
  'Super fine',
  'Fine',
  'Light',
  'Medium',
  'Bulky',
  'Super bulky',
  'Jumbo',
] as const

/** Currencies offered; all have a hundredth as minor unit. @source ISO 4217 */
export const CURRENCIES = [
  'GBP',
  'EUR',
  'USD',
  'CAD',
  'AUD',
  'NZD',
  'CHF',
  'SEK',
  'NOK',
  'DKK',
] as const
