import type { ActionResult } from '@/lib/errors'
import type {
  addRemarkSchema,
  decideIdeaSchema,
  deleteIdeasSchema,
  editIdeaSchema,
  moveIdeasSchema,
  recordSearchSchema,
  removeSearchSchema,
  voteSchema,
} from '@/lib/names/schema'
import type { z } from 'zod'

type Action<Schema extends z.ZodType, Data> = (
  brand: string,
  input: z.input<Schema>,
) => Promise<ActionResult<Data>>

type Bulk = Action<
  typeof moveIdeasSchema,
  { moved: string[]; stayed: { ideaId: string; text: string; why: string }[] }
>
type Decision = Action<typeof decideIdeaSchema, { ideaId: string; version: number }>

/** What a page hands to the components that move one idea. */
export interface MoveActions {
  send: Bulk
  recall: Bulk
  'put-by': Bulk
  'take-up': Bulk
  approve: Decision
  return: Decision
  reopen: Decision
  unlock: Decision
}

/** What a page hands to the components in which an idea is talked about. */
export interface TalkActions {
  vote: Action<typeof voteSchema, void>
  addRemark: Action<typeof addRemarkSchema, { remarkId: string }>
}

/** What a page hands to the record of searches. */
export interface SearchActions {
  record: Action<typeof recordSearchSchema, { searchId: string }>
  remove: Action<typeof removeSearchSchema, void>
}

/** What a page hands to the form of an idea's words, and to the button that deletes it. */
export interface WordsActions {
  edit: Action<typeof editIdeaSchema, { ideaId: string; version: number; text: string }>
  remove: Action<typeof deleteIdeasSchema, { ideaIds: string[] }>
  restore: Action<typeof deleteIdeasSchema, unknown>
}
