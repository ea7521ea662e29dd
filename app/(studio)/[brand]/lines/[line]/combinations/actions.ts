'use server'

import { deleteCombination } from '@/lib/combinations/delete-combination'
import { restoreCombination } from '@/lib/combinations/restore-combination'
import { saveCombination } from '@/lib/combinations/save-combination'
import { combinationIdSchema, saveCombinationSchema } from '@/lib/combinations/schema'
import { defineAction } from '@/lib/server/define-action'

// The editor shows what it saved already; its page need not come anew.
export const saveCombinationAction = defineAction(
  'saveCombination',
  saveCombinationSchema,
  async (actor, input) => {
    const { version } = await saveCombination(actor, input)
    return { version }
  },
  { refreshes: false },
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
