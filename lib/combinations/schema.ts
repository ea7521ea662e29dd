import { z } from 'zod'

import { READING_KINDS } from '@/lib/color/readings'

import { COMBINATION_LIMITS, LANES, PLACE_ROLES } from './constants'

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

const draftPlace = z.strictObject({
  shadeId: z.uuid().nullable(),
  share: z
    .number()
    .min(COMBINATION_LIMITS.leastPercent / 100)
    .max(1),
  role: z.enum(PLACE_ROLES),
  locked: z.boolean(),
})

/**
 * An open combination as the editor saves it: whole, or the title alone by those who may change
 * nothing else. The shares are whole percents.
 */
export const saveCombinationSchema = z.strictObject({
  combinationId: z.uuid(),
  version: z.number().int(),
  title,
  story: z
    .string()
    .trim()
    .max(
      COMBINATION_LIMITS.story,
      `Keep the story to ${COMBINATION_LIMITS.story.toLocaleString('en-GB')} characters.`,
    )
    .optional(),
  photographId: z.uuid().nullish(),
  places: z
    .array(draftPlace)
    .length(COMBINATION_LIMITS.places, 'A combination has five places.')
    .refine((places) => areDifferent(places.flatMap(({ shadeId }) => shadeId ?? [])), {
      message: 'The shades of a combination must be different.',
    })
    .refine((places) => areDifferent(places.map(({ role }) => role)), {
      message: 'Each role is given once.',
    })
    .refine(
      (places) => places.reduce((sum, { share }) => sum + Math.round(share * 100), 0) === 100,
      { message: 'The five shares must come to 100 %.' },
    )
    .optional(),
})
/** What the editor sends. */
export type SaveCombinationValues = z.input<typeof saveCombinationSchema>
/** A parsed combination to save; what is undefined stays as it is. */
export type SaveCombinationInput = z.output<typeof saveCombinationSchema>

/** Which combination an editor has open, and the version it knows. */
export const newerCombinationSchema = z.strictObject({
  combination: z.uuid(),
  version: z.coerce.number().int(),
})

/** Which combination to delete or to restore. */
export const combinationIdSchema = z.strictObject({ combinationId: z.uuid() })
/** A parsed id. */
export type CombinationIdInput = z.output<typeof combinationIdSchema>

/** Where on the board a combination goes, and the lane it was seen in. */
export const moveCombinationSchema = z.strictObject({
  combinationId: z.uuid(),
  from: z.enum(LANES),
  lane: z.enum(LANES),
  after: z.uuid().nullable(),
  before: z.uuid().nullable(),
})
/** A parsed move. */
export type MoveCombinationInput = z.output<typeof moveCombinationSchema>

/** A combination to begin. */
export const sketchCombinationSchema = z.strictObject({
  lineSlug: z.string(),
  requestKey: z.uuid(),
})
/** A parsed beginning. */
export type SketchCombinationInput = z.output<typeof sketchCombinationSchema>

/** Which board, and the revision of it that is known. */
export const boardSchema = z.strictObject({
  line: z.string(),
  revision: z.coerce.number().int().optional(),
})
