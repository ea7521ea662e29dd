import { z } from 'zod'

import { NEAR_TWIN_LIMIT } from '@/lib/color/range-study'
import { nameText } from '@/lib/names/schema'

import {
  SHADE_STATUSES,
  READING_TERMS,
  SHADE_LIMITS,
  oneLine,
  parseReading,
  parseHex,
  LAB_RANGES,
  CSV_FIELDS,
  type CsvField,
  SHADE_SORTS,
  STUDY_LIMITS,
  BOOK_ORDERS,
} from './constants'

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

/** What is typed where a shade's name stands: an idea for it; null when nothing is. */
export const shadeName = z
  .union([z.null(), z.string()])
  .transform((text) => oneLine(text ?? '') || null)
  .pipe(nameText.nullable())

const reading = (what: string, [least, most]: readonly [number, number]) =>
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
  L: reading('L', LAB_RANGES.L),
  a: reading('a', LAB_RANGES.a),
  b: reading('b', LAB_RANGES.b),
}

/** An sRGB hex colour, kept as six lower-case digits after `#`. */
export const shadeHex = z.string().transform((text, context) => {
  const hex = parseHex(text)
  if (hex) return hex
  context.addIssue({ code: 'custom', message: 'Give a hex colour such as #7a8b4f.' })
  return z.NEVER
})

const labColor = {
  kind: z.literal('lab'),
  ...labFields,
  terms: z.enum(READING_TERMS, 'Say which light and observer it was read under.'),
}
const hexColor = { kind: z.literal('hex'), hex: shadeHex }

/** A shade's colour as entered: a reading with its terms, or a screen colour. */
export const shadeColor = z.discriminatedUnion('kind', [
  z.strictObject(labColor),
  z.strictObject(hexColor),
])
/** A parsed colour. */
export type ShadeColor = z.output<typeof shadeColor>

const shadeFields = {
  number: shadeNumber,
  status: z.enum(SHADE_STATUSES),
  color: shadeColor,
}
/** What people fill in of a shade, new or not; the form keeps both kinds of colour, and one counts. */
export const shadeFormSchema = z.strictObject({
  ...shadeFields,
  name: shadeName,
  color: z.discriminatedUnion('kind', [z.object(labColor), z.object(hexColor)]),
})

const inLine = { lineSlug: z.string() }

const shadeIds = z.array(z.uuid()).min(1, 'Choose at least one shade.').max(SHADE_LIMITS.perLine)

/** The form that adds a shade; a name in it begins as a draft. */
export const createShadeSchema = z.strictObject({
  ...inLine,
  ...shadeFields,
  name: shadeName,
  requestKey: z.uuid(),
})
/** What the form holds before parsing. */
export type CreateShadeValues = z.input<typeof createShadeSchema>
/** A parsed new shade. */
export type CreateShadeInput = z.output<typeof createShadeSchema>

/** A change of a shade; a field left out stays as it is. */
export const updateShadeSchema = z.strictObject({
  ...inLine,
  ...z.strictObject(shadeFields).partial().shape,
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

/** The range study's address: under which ΔE00 a pair is a near-twin. */
export const rangeStudySchema = z.object({
  twins: z.coerce
    .number()
    .min(STUDY_LIMITS.twins[0])
    .max(STUDY_LIMITS.twins[1])
    .catch(NEAR_TWIN_LIMIT),
})

/** The sample book's address. Nonsense in it gives the default of that part. */
export const sampleBookSchema = z.object({
  order: z.enum(BOOK_ORDERS).catch('family'),
  page: z.coerce.number().int().min(1).max(10_000).catch(1),
})
/** A parsed address of the sample book. */
export type SampleBookFilter = z.output<typeof sampleBookSchema>
