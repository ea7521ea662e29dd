'use server'

import { keepCombination } from '@/lib/combinations/keep-combination'
import { keepCombinationSchema } from '@/lib/combinations/schema'
import { rereadPhotograph } from '@/lib/photographs/reread-photograph'
import { photographIdSchema, updatePhotographSchema } from '@/lib/photographs/schema'
import { updatePhotograph } from '@/lib/photographs/update-photograph'
import { defineAction } from '@/lib/server/define-action'

export const keepCombinationAction = defineAction(
  'keepCombination',
  keepCombinationSchema,
  async (actor, input) => {
    const { id, title } = await keepCombination(actor, input)
    return { combinationId: id, title }
  },
)

export const rereadPhotographAction = defineAction(
  'rereadPhotograph',
  photographIdSchema,
  rereadPhotograph,
)

export const updatePhotographAction = defineAction(
  'updatePhotograph',
  updatePhotographSchema,
  async (actor, input) => {
    const { version } = await updatePhotograph(actor, input)
    return { version }
  },
)
