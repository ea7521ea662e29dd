'use server'

import { dealIdeas } from '@/lib/names/deal-ideas'
import { listNameable } from '@/lib/names/list-heap'
import { previewIdeas } from '@/lib/names/preview-ideas'
import { dealIdeasSchema, listNameableSchema, previewIdeasSchema } from '@/lib/names/schema'
import { defineAction } from '@/lib/server/define-action'

// None of these changes anything that a page shows.

export const previewIdeasAction = defineAction('previewIdeas', previewIdeasSchema, previewIdeas, {
  refreshes: false,
})

export const listNameableAction = defineAction('listNameable', listNameableSchema, listNameable, {
  refreshes: false,
})

export const dealIdeasAction = defineAction('dealIdeas', dealIdeasSchema, dealIdeas, {
  refreshes: false,
})
