import { z } from 'zod'

import { ACTIONS, ACTIVITY_KINDS, type ActivityAction, type ActivityKind } from './constants'

const WHAT = [...Object.keys(ACTIVITY_KINDS), ...Object.keys(ACTIONS)] as (
  ActivityKind | ActivityAction
)[]

/** A day of the years that a record can be of. */
const day = z.iso
  .date()
  .refine((date) => date >= '2000-01-01' && date < '2100-01-01')
  .nullable()
  .catch(null)

/** Which entries of the record are asked for. Nonsense gives the default of that part: all. */
export const activityFilterSchema = z.strictObject({
  /** A person's id, or those whose accounts are closed. */
  person: z
    .union([z.uuid(), z.literal('former')])
    .nullable()
    .catch(null),
  /** A kind of thing, or one action. */
  what: z.enum(WHAT).nullable().catch(null),
  /** The first and the last day, in UTC. */
  from: day,
  to: day,
})
/** A parsed filter. */
export type ActivityFilter = z.output<typeof activityFilterSchema>

/** The page's address: a filter, and the entry after which the page begins. */
export const activityPageSchema = activityFilterSchema.extend({
  before: z.uuid().nullable().catch(null),
})
/** A parsed address. */
export type ActivityPage = z.output<typeof activityPageSchema>
