import { z } from 'zod'

import { KIT_LIMITS } from './constants'

const areDifferent = (ids: readonly string[]) => new Set(ids).size === ids.length

/** What the form sends to have a kit built: combinations in the order they shall stand in it. */
export const requestKitSchema = z.strictObject({
  lineSlug: z.string().max(100),
  combinationIds: z
    .array(z.uuid())
    .min(1, 'Choose at least one combination.')
    .max(
      KIT_LIMITS.combinations,
      `A kit holds at most ${KIT_LIMITS.combinations} combinations. Choose fewer, or build two.`,
    )
    .refine(areDifferent, 'Each combination can be in a kit once.'),
  requestKey: z.uuid(),
})
/** What the form holds before parsing. */
export type RequestKitValues = z.input<typeof requestKitSchema>
/** A parsed request for a kit. */
export type RequestKitInput = z.output<typeof requestKitSchema>

/** Names one kit of the brand. */
export const kitIdSchema = z.strictObject({ kitId: z.uuid() })
/** A parsed id. */
export type KitIdInput = z.output<typeof kitIdSchema>

/** A kit in an address: what is no uuid names nothing, as does an unknown one. */
export const kitParamSchema = z
  .strictObject({ kit: z.string() })
  .transform(({ kit }) => ({ kitId: kit }))

/** A picture of a kit in an address: `<combination>-<width>x<height>.png`. */
export const kitPictureParamsSchema = z
  .strictObject({ kit: z.string(), picture: z.string() })
  .transform(({ kit, picture }) => ({ kitId: kit, picture }))

/** Which kits a page follows. */
export const kitStatesSchema = z.strictObject({
  ids: z
    .string()
    .transform((ids) => ids.split(','))
    .pipe(z.array(z.uuid()).min(1).max(KIT_LIMITS.followed)),
})

const ids = z
  .string()
  .transform((text) => [...new Set(text.split(','))])
  .pipe(z.array(z.uuid()).min(1).max(500))

/** The page's address: which combinations are ticked at first, and which page of the list. */
export const kitsAddressSchema = z.object({
  combinations: ids.nullable().catch(null).default(null),
  page: z.coerce.number().int().min(1).max(10_000).catch(1).default(1),
})
/** A parsed address. */
export type KitsAddress = z.output<typeof kitsAddressSchema>
