'use server'

import { deleteCombination } from '@/lib/combinations/delete-combination'
import { moveCombination } from '@/lib/combinations/move-combination'
import { restoreCombination } from '@/lib/combinations/restore-combination'
import { saveCombination } from '@/lib/combinations/save-combination'
import {
  combinationIdSchema,
  moveCombinationSchema,
  saveCombinationSchema,
  sketchCombinationSchema,
} from '@/lib/combinations/schema'
import { sketchCombination } from '@/lib/combinations/sketch-combination'
import { defineAction } from '@/lib/server/define-action'

// The board shows a move before it is answered, and hears of everything else by itself.
export const moveCombinationAction = defineAction(
  'moveCombination',
  moveCombinationSchema,
  moveCombination,
  { refreshes: false },
)

export const sketchCombinationAction = defineAction(
  'sketchCombination',
  sketchCombinationSchema,
  async (actor, input) => {
    const { id } = await sketchCombination(actor, input)
    return { id }
  },
  { refreshes: false },
)

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
