import type { z } from 'zod'

import type { ActionResult } from '@/lib/errors'
import type { addIdeaSchema, editIdeaSchema, moveIdeasSchema } from '@/lib/names/schema'

type Action<Schema extends z.ZodType, Data> = (
  brand: string,
  input: z.input<Schema>,
) => Promise<ActionResult<Data>>

/** What became of names that were to move together. */
export interface Moved {
  moved: string[]
  /** Those that stayed as they were, and why. */
  stayed: { ideaId: string; text: string; why: string }[]
}

/** The actions that the page hands to the list of names. */
export interface ListActions {
  add: Action<typeof addIdeaSchema, { ideaId: string; version: number }>
  edit: Action<typeof editIdeaSchema, { ideaId: string; version: number }>
  send: Action<typeof moveIdeasSchema, Moved>
  recall: Action<typeof moveIdeasSchema, Moved>
  putBy: Action<typeof moveIdeasSchema, Moved>
  takeUp: Action<typeof moveIdeasSchema, Moved>
}
