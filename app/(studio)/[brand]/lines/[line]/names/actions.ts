'use server'

import { addIdea, addIdeas } from '@/lib/names/add-ideas'
import { deleteIdeas, restoreIdeas } from '@/lib/names/delete-ideas'
import { editIdea } from '@/lib/names/edit-idea'
import { decideIdea, moveIdeas } from '@/lib/names/move-ideas'
import { placeIdeas } from '@/lib/names/place-ideas'
import {
  addIdeaSchema,
  addIdeasSchema,
  decideIdeaSchema,
  deleteIdeasSchema,
  editIdeaSchema,
  moveIdeasSchema,
  placeIdeasSchema,
} from '@/lib/names/schema'
import { defineAction } from '@/lib/server/define-action'

export const addIdeaAction = defineAction('addIdea', addIdeaSchema, async (actor, input) => {
  const { id, version } = await addIdea(actor, input)
  return { ideaId: id, version }
})

export const addIdeasAction = defineAction('addIdeas', addIdeasSchema, async (actor, input) => {
  const ideas = await addIdeas(actor, input)
  return { ideaIds: ideas.map(({ id }) => id) }
})

export const editIdeaAction = defineAction('editIdea', editIdeaSchema, async (actor, input) => {
  const { id, version, text } = await editIdea(actor, input)
  return { ideaId: id, version, text }
})

export const placeIdeasAction = defineAction('placeIdeas', placeIdeasSchema, placeIdeas)

export const deleteIdeasAction = defineAction('deleteIdeas', deleteIdeasSchema, deleteIdeas)

export const restoreIdeasAction = defineAction('restoreIdeas', deleteIdeasSchema, restoreIdeas)

export const sendForReviewAction = defineAction('sendForReview', moveIdeasSchema, (actor, input) =>
  moveIdeas(actor, 'send', input),
)

export const recallIdeasAction = defineAction('recallIdeas', moveIdeasSchema, (actor, input) =>
  moveIdeas(actor, 'recall', input),
)

export const putByIdeasAction = defineAction('putByIdeas', moveIdeasSchema, (actor, input) =>
  moveIdeas(actor, 'put-by', input),
)

export const takeUpIdeasAction = defineAction('takeUpIdeas', moveIdeasSchema, (actor, input) =>
  moveIdeas(actor, 'take-up', input),
)

export const approveNameAction = defineAction(
  'approveName',
  decideIdeaSchema,
  async (actor, input) => {
    const { id, version } = await decideIdea(actor, 'approve', input)
    return { ideaId: id, version }
  },
)

export const returnNameAction = defineAction(
  'returnName',
  decideIdeaSchema,
  async (actor, input) => {
    const { id, version } = await decideIdea(actor, 'return', input)
    return { ideaId: id, version }
  },
)

export const reopenNameAction = defineAction(
  'reopenName',
  decideIdeaSchema,
  async (actor, input) => {
    const { id, version } = await decideIdea(actor, 'reopen', input)
    return { ideaId: id, version }
  },
)

export const unlockNameAction = defineAction(
  'unlockName',
  decideIdeaSchema,
  async (actor, input) => {
    const { id, version } = await decideIdea(actor, 'unlock', input)
    return { ideaId: id, version }
  },
)
