'use server'

import { deleteCombination } from '@/lib/combinations/delete-combination'
import { renameCombination } from '@/lib/combinations/rename-combination'
import { reorderCombination } from '@/lib/combinations/reorder-combination'
import { restoreCombination } from '@/lib/combinations/restore-combination'
import {
  combinationIdSchema,
  renameCombinationSchema,
  reorderCombinationSchema,
} from '@/lib/combinations/schema'
import { defineAction } from '@/lib/server/define-action'

export const renameCombinationAction = defineAction(
  'renameCombination',
  renameCombinationSchema,
  async (actor, input) => {
    const { title, version } = await renameCombination(actor, input)
    return { title, version }
  },
)

export const reorderCombinationAction = defineAction(
  'reorderCombination',
  reorderCombinationSchema,
  async (actor, input) => {
    const { version } = await reorderCombination(actor, input)
    return { version }
  },
)

// The page it is called from is gone after it: its own page would answer "not found".
export const deleteCombinationAction = defineAction(
  'deleteCombination',
  combinationIdSchema,
  deleteCombination,
  { refreshes: false },
)

export const restoreCombinationAction = defineAction(
  'restoreCombination',
  combinationIdSchema,
  restoreCombination,
)
