import { z } from 'zod'

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
  name: 60,
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

/** Text as it is kept: composed, on one line, without blanks at its ends. */
export const oneLine = (text: string): string => text.normalize('NFC').replace(/\s+/gu, ' ').trim()

const kept = z
  .string()
  .transform(oneLine)
  .refine((text) => !/\p{Cc}/u.test(text), 'There is a character in it that cannot be printed.')

/** A shade's number: short, on one line, unique in its line whatever the case. */
export const shadeNumber = kept.pipe(
  z
    .string()
    .min(1, 'Give the shade a number.')
    .max(SHADE_LIMITS.number, `Keep the number to ${SHADE_LIMITS.number} characters.`),
)

/** A shade's name; null while it has none. */
export const shadeName = z
  .union([z.null(), kept])
  .pipe(
    z
      .string()
      .max(SHADE_LIMITS.name, `Keep the name to ${SHADE_LIMITS.name} characters.`)
      .nullable(),
  )
  .transform((name) => name || null)

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

const reading = (what: string, least: number, most: number) =>
  z
    .union([z.number(), z.string()])
    .transform((value, context) => {
      const number = typeof value === 'number' ? value : parseReading(value)
      if (number !== null && Number.isFinite(number)) return number + 0
      const message =
        value === '' ? `Give ${what}.` : `“${String(value)}” is not a number: give ${what}.`
      context.addIssue({ code: 'custom', message })
      return z.NEVER
    })
    .refine(
      (value) => value >= least && value <= most,
      `Give ${what} from ${String(least).replace('-', '−')} to ${most}.`,
    )

/** Lab coordinates as numbers or as text; each says what is wrong with it. */
export const labFields = {
  L: reading('L', 0, 100),
  a: reading('a', -SHADE_LIMITS.ab, SHADE_LIMITS.ab),
  b: reading('b', -SHADE_LIMITS.ab, SHADE_LIMITS.ab),
}

/** An sRGB hex colour, kept as six lower-case digits after `#`. */
export const shadeHex = z
  .string()
  .trim()
  .toLowerCase()
  .regex(/^#?([0-9a-f]{3}|[0-9a-f]{6})$/, 'Give a hex colour such as #7a8b4f.')
  .transform((text) => {
    const digits = text.replace('#', '')
    return `#${digits.length === 3 ? digits.replace(/./g, '$&$&') : digits}`
  })

/** A shade's colour as entered: a reading with its terms, or a screen colour. */
export const shadeColor = z.discriminatedUnion('kind', [
  z.object({
    kind: z.literal('lab'),
    ...labFields,
    terms: z.enum(READING_TERMS, 'Say which light and observer it was read under.'),
  }),
  z.object({ kind: z.literal('hex'), hex: shadeHex }),
])
/** A parsed colour. */
export type ShadeColor = z.output<typeof shadeColor>

const shadeFields = {
  number: shadeNumber,
  name: shadeName,
  status: z.enum(SHADE_STATUSES),
  color: shadeColor,
}
const inLine = { lineSlug: z.string() }
const shadeIds = z.array(z.uuid()).min(1, 'Choose at least one shade.').max(SHADE_LIMITS.perLine)

/** The form that adds a shade. */
export const createShadeSchema = z.strictObject({
  ...inLine,
  ...shadeFields,
  requestKey: z.uuid(),
})
/** What the form holds before parsing. */
export type CreateShadeValues = z.input<typeof createShadeSchema>
/** A parsed new shade. */
export type CreateShadeInput = z.output<typeof createShadeSchema>

/** A change of a shade; a field left out stays as it is. */
export const updateShadeSchema = z.strictObject({
  ...inLine,
  ...z.object(shadeFields).partial().shape,
  shadeId: z.uuid(),
  version: z.number().int(),
})
/** What the form holds before parsing. */
export type UpdateShadeValues = z.input<typeof updateShadeSchema>
/** A parsed change. */
export type UpdateShadeInput = z.output<typeof updateShadeSchema>

/** One status for many shades. */
export const setShadeStatusSchema = z.strictObject({
  ...inLine,
  shadeIds,
  status: z.enum(SHADE_STATUSES),
})
/** A parsed change of status. */
export type SetShadeStatusInput = z.output<typeof setShadeStatusSchema>

/** Shades to delete; `confirmed` once the person has seen where they are used. */
export const deleteShadesSchema = z.strictObject({
  ...inLine,
  shadeIds,
  confirmed: z.boolean().default(false),
})
/** A parsed deletion. */
export type DeleteShadesInput = z.output<typeof deleteShadesSchema>

/** Shades to take back. */
export const restoreShadesSchema = z.strictObject({ ...inLine, shadeIds })
/** A parsed undo. */
export type RestoreShadesInput = z.output<typeof restoreShadesSchema>

/** Shades that go, in the order they stand, to a place (from 1) in the line's order. */
export const reorderShadesSchema = z.strictObject({
  ...inLine,
  shadeIds,
  place: z.coerce
    .number('Give the place as a number.')
    .int('Give a whole number.')
    .min(1, 'The first place is 1.')
    .max(SHADE_LIMITS.perLine, `The last place is ${SHADE_LIMITS.perLine}.`),
})
/** A parsed move. */
export type ReorderShadesInput = z.output<typeof reorderShadesSchema>

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

const column = z.number().int().min(0).max(999).nullable()
const importFields = {
  ...inLine,
  text: z
    .string()
    .max(SHADE_LIMITS.importText, 'The file is over 2.5 MB. Import it in smaller parts.'),
  /** The terms of every reading in the file that does not say its own; null when each must say. */
  terms: z.enum(READING_TERMS).nullable(),
}
const mapping = z.strictObject(
  Object.fromEntries(CSV_FIELDS.map((field) => [field, column])) as Record<CsvField, typeof column>,
)

/** A CSV file to look at; a mapping of null asks for one guessed from the header. */
export const previewImportSchema = z.strictObject({ ...importFields, mapping: mapping.nullable() })
/** A parsed request for a preview. */
export type PreviewImportInput = z.output<typeof previewImportSchema>

/** A CSV file to save, as it was seen in the preview of the line's `shadesRevision`. */
export const importShadesSchema = z.strictObject({
  ...importFields,
  mapping,
  shadesRevision: z.number().int(),
})
/** A parsed import. */
export type ImportShadesInput = z.output<typeof importShadesSchema>

/** What the table may be sorted by. */
export const SHADE_SORTS = ['order', 'number', 'name', 'status', 'L', 'a', 'b'] as const
/** One of SHADE_SORTS. */
export type ShadeSort = (typeof SHADE_SORTS)[number]

/** The table's address. Nonsense in it gives the default of that part. */
export const shadeTableSchema = z.object({
  q: z.string().trim().max(SHADE_LIMITS.search).catch(''),
  status: z
    .string()
    .transform((text) => SHADE_STATUSES.filter((status) => text.split(',').includes(status)))
    .catch([]),
  outside: z
    .literal('1')
    .transform(() => true)
    .catch(false),
  sort: z.enum(SHADE_SORTS).catch('order'),
  dir: z.enum(['asc', 'desc']).catch('asc'),
  page: z.coerce.number().int().min(1).max(10_000).catch(1),
})
/** A parsed address of the table. */
export type ShadeTableFilter = z.output<typeof shadeTableSchema>
