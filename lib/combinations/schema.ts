import { z } from 'zod'

import { READING_KINDS } from '@/lib/color/readings'

import { COMBINATION_LIMITS } from './constants'

const title = z
  .string()
  .trim()
  .min(1, 'Give the combination a title.')
  .max(COMBINATION_LIMITS.title, `Keep the title to ${COMBINATION_LIMITS.title} characters.`)

const areDifferent = (ids: readonly string[]) => new Set(ids).size === ids.length

/** What the page sends to keep five shades; the shares are brought to a sum of exactly 1. */
export const keepCombinationSchema = z.strictObject({
  lineSlug: z.string(),
  photographId: z.uuid(),
  reading: z.enum(READING_KINDS),
  title,
  places: z
    .array(z.strictObject({ shadeId: z.uuid(), share: z.number().min(0).max(1) }))
    .length(COMBINATION_LIMITS.places, 'A combination is five shades.')
    .refine((places) => areDifferent(places.map(({ shadeId }) => shadeId)), {
      message: 'The five must be different shades.',
    })
    .refine(
      (places) =>
        Math.abs(places.reduce((sum, { share }) => sum + share, 0) - 1) <=
        COMBINATION_LIMITS.shareTolerance,
      { message: 'The five shares must come to 100 %.' },
    )
    .transform((places) => {
      const sum = places.reduce((total, { share }) => total + share, 0)
      return places.map(({ shadeId, share }) => ({ shadeId, share: share / sum }))
    }),
  requestKey: z.uuid(),
})
/** What the page holds before parsing. */
export type KeepCombinationValues = z.input<typeof keepCombinationSchema>
/** A parsed combination to keep. */
export type KeepCombinationInput = z.output<typeof keepCombinationSchema>

const edit = { combinationId: z.uuid(), version: z.number().int() }

/** A new title. */
export const renameCombinationSchema = z.strictObject({ ...edit, title })
/** What the form holds before parsing. */
export type RenameCombinationValues = z.input<typeof renameCombinationSchema>
/** A parsed new title. */
export type RenameCombinationInput = z.output<typeof renameCombinationSchema>

/** The five in their new order, by shade. */
export const reorderCombinationSchema = z.strictObject({
  ...edit,
  shadeIds: z
    .array(z.uuid())
    .length(COMBINATION_LIMITS.places)
    .refine(areDifferent, { message: 'The five must be different shades.' }),
})
/** A parsed new order. */
export type ReorderCombinationInput = z.output<typeof reorderCombinationSchema>

/** Which combination to delete or to restore. */
export const combinationIdSchema = z.strictObject({ combinationId: z.uuid() })
/** A parsed id. */
export type CombinationIdInput = z.output<typeof combinationIdSchema>

/** The list's address: what is searched for, and which page. Nonsense gives the first page of all. */
export const combinationFilterSchema = z.object({
  q: z.string().trim().max(COMBINATION_LIMITS.search).catch(''),
  page: z.coerce.number().int().min(1).max(10_000).catch(1),
})
/** A parsed filter. */
export type CombinationFilter = z.output<typeof combinationFilterSchema>
