'use server'

import { addRemark } from '@/lib/names/add-remark'
import { recordSearch } from '@/lib/names/record-search'
import { removeSearch } from '@/lib/names/remove-search'
import {
  addRemarkSchema,
  recordSearchSchema,
  removeSearchSchema,
  voteSchema,
} from '@/lib/names/schema'
import { vote } from '@/lib/names/vote'
import { defineAction } from '@/lib/server/define-action'

export const voteAction = defineAction('vote', voteSchema, vote)

export const addRemarkAction = defineAction('addRemark', addRemarkSchema, async (actor, input) => {
  const { id } = await addRemark(actor, input)
  return { remarkId: id }
})

export const recordSearchAction = defineAction(
  'recordSearch',
  recordSearchSchema,
  async (actor, input) => {
    const { id } = await recordSearch(actor, input)
    return { searchId: id }
  },
)

export const removeSearchAction = defineAction('removeSearch', removeSearchSchema, removeSearch)
