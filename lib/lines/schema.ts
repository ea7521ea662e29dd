import { z } from 'zod'

import { LINE_LIMITS, CURRENCIES } from './constants'

/** One fibre of a line and its share of the weight, in whole per cent. */
export const fibreSchema = z.strictObject({
  fibre: z.string().trim().min(1, 'Name the fibre.').max(LINE_LIMITS.fibre),
  percent: z.coerce
    .number('Give a whole number.')
    .int('Give a whole number.')
    .min(1, 'At least 1 %.')
    .max(100, 'At most 100 %.'),
})
/** A fibre and its per cent. */
export type Fibre = z.infer<typeof fibreSchema>

const positive = (most: number, what: string) =>
  z.coerce
    .number(`Give ${what} as a number.`)
    .positive(`Give ${what}; it must be more than 0.`)
    .max(most, `At most ${most}.`)

const lineFields = {
  name: z
    .string()
    .trim()
    .min(1, 'Name the line.')
    .max(LINE_LIMITS.name, `Keep the name to ${LINE_LIMITS.name} characters.`),
  fibres: z
    .array(fibreSchema)
    .min(1, 'Name at least one fibre.')
    .max(LINE_LIMITS.fibres)
    .superRefine((fibres, context) => {
      const total = fibres.reduce((sum, { percent }) => sum + percent, 0)
      if (total !== 100) {
        context.addIssue({ code: 'custom', message: `The fibres come to ${total} %, not 100 %.` })
      }
      if (fibres.some(({ percent }, at) => at > 0 && percent > fibres[at - 1]!.percent)) {
        context.addIssue({ code: 'custom', message: 'Put the largest share first, as on a label.' })
      }
    }),
  ply: z.coerce.number('Give the number of plies.').int().min(1).max(LINE_LIMITS.ply),
  weightNumber: z.coerce.number().int().min(0).max(7),
  netGrams: positive(LINE_LIMITS.grams, 'the weight in grams'),
  length: positive(LINE_LIMITS.length, 'the length'),
  lengthUnit: z.enum(['m', 'yd']),
  needleMm: positive(LINE_LIMITS.needleMm, 'the needle in millimetres'),
  gaugeStitches: positive(LINE_LIMITS.gauge, 'the stitches'),
  gaugeRows: positive(LINE_LIMITS.gauge, 'the rows'),
  currency: z.enum(CURRENCIES),
  price: z.coerce
    .number('Give the price as a number.')
    .min(0, 'The price cannot be negative.')
    .max(LINE_LIMITS.priceMinor / 100)
    .refine((price) => Math.abs(price * 100 - Math.round(price * 100)) < 1e-6, {
      message: 'At most two decimals.',
    }),
  launchDate: z.union([z.iso.date('Give a date.'), z.literal('').transform(() => null), z.null()]),
}

/** The form that makes a line. */
export const createLineSchema = z.strictObject({ ...lineFields, requestKey: z.uuid() })

/** The form that changes a line. */
export const updateLineSchema = z.strictObject({
  ...lineFields,
  lineSlug: z.string(),
  version: z.number().int(),
})
/** What the form holds before parsing. */
export type CreateLineValues = z.input<typeof createLineSchema>
/** A parsed new line. */
export type CreateLineInput = z.output<typeof createLineSchema>
/** What the form holds before parsing. */
export type UpdateLineValues = z.input<typeof updateLineSchema>
/** A parsed change. */
export type UpdateLineInput = z.output<typeof updateLineSchema>
