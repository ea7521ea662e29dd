import type { z } from 'zod'

import type { ActionResult } from '@/lib/errors'
import type { DealView, IdeasPreview, NameableShade } from '@/lib/names/present'
import type {
  addIdeaSchema,
  addIdeasSchema,
  dealIdeasSchema,
  deleteIdeasSchema,
  editIdeaSchema,
  listNameableSchema,
  moveIdeasSchema,
  placeIdeasSchema,
  previewIdeasSchema,
} from '@/lib/names/schema'

type Action<Schema extends z.ZodType, Data> = (
  brand: string,
  input: z.input<Schema>,
) => Promise<ActionResult<Data>>

/** Ideas that made a move, and those that could not, each with why. */
interface Moved {
  moved: string[]
  stayed: { ideaId: string; text: string; why: string }[]
}

/** The actions that the pages of the heap hand to their components. */
export interface HeapActions {
  add: Action<typeof addIdeaSchema, unknown>
  addMany: Action<typeof addIdeasSchema, { ideaIds: string[] }>
  preview: Action<typeof previewIdeasSchema, IdeasPreview>
  edit: Action<typeof editIdeaSchema, unknown>
  place: Action<typeof placeIdeasSchema, { former: { ideaId: string; shadeId: string | null }[] }>
  putBy: Action<typeof moveIdeasSchema, Moved>
  takeUp: Action<typeof moveIdeasSchema, Moved>
  remove: Action<typeof deleteIdeasSchema, { ideaIds: string[] }>
  restore: Action<typeof deleteIdeasSchema, unknown>
  nameable: Action<typeof listNameableSchema, { waiting: NameableShade[]; named: NameableShade[] }>
  deal: Action<typeof dealIdeasSchema, DealView>
}

/** "1 name", "7 names". */
export const namesInWords = (count: number): string =>
  count === 1 ? '1 name' : `${count.toLocaleString('en-GB')} names`

/** “Thyme Will Tell”, or "3 names". */
export const whatInWords = (ideas: readonly { text: string }[]): string =>
  ideas.length === 1 ? `“${ideas[0]!.text}”` : namesInWords(ideas.length)
