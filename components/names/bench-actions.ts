import type { z } from 'zod'

import type { ActionResult } from '@/lib/errors'
import type { CheckedName, ProposedNames } from '@/lib/names/present'
import type {
  addIdeaSchema,
  checkNameSchema,
  deleteIdeasSchema,
  editIdeaSchema,
  moveIdeasSchema,
  proposeNamesSchema,
} from '@/lib/names/schema'

type Action<Schema extends z.ZodType, Data> = (
  brand: string,
  input: z.input<Schema>,
) => Promise<ActionResult<Data>>

/** A move of several ideas at once, with those that stayed as they were. */
export type MoveIdeas = Action<
  typeof moveIdeasSchema,
  { moved: string[]; stayed: { ideaId: string; text: string; why: string }[] }
>

/** The checks of a name that is being written. */
export type CheckName = Action<typeof checkNameSchema, CheckedName>

/** The actions that the page of a shade's naming bench hands down. */
export interface BenchActions {
  check: CheckName
  propose: Action<typeof proposeNamesSchema, ProposedNames>
  add: Action<typeof addIdeaSchema, { ideaId: string; version: number }>
  edit: Action<typeof editIdeaSchema, { ideaId: string; version: number; text: string }>
  send: MoveIdeas
  recall: MoveIdeas
  putBy: MoveIdeas
  takeUp: MoveIdeas
  remove: Action<typeof deleteIdeasSchema, { ideaIds: string[] }>
  restore: Action<typeof deleteIdeasSchema, { ideaIds: string[] }>
}
