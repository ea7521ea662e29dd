'use server'

import { deletePhotographs, restorePhotographs } from '@/lib/photographs/delete-photographs'
import { photographIdsSchema } from '@/lib/photographs/schema'
import { defineAction } from '@/lib/server/define-action'

export const deletePhotographsAction = defineAction(
  'deletePhotographs',
  photographIdsSchema,
  deletePhotographs,
)

export const restorePhotographsAction = defineAction(
  'restorePhotographs',
  photographIdsSchema,
  restorePhotographs,
)
