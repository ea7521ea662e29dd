'use server'

import { defineAction } from '@/lib/server/define-action'
import { createShade } from '@/lib/shades/create-shade'
import { deleteShades } from '@/lib/shades/delete-shades'
import { importShades } from '@/lib/shades/import-shades'
import { presentShade } from '@/lib/shades/present'
import { previewImport } from '@/lib/shades/preview-import'
import { reorderShades } from '@/lib/shades/reorder-shades'
import { restoreShades } from '@/lib/shades/restore-shades'
import {
  createShadeSchema,
  deleteShadesSchema,
  importShadesSchema,
  previewImportSchema,
  reorderShadesSchema,
  restoreShadesSchema,
  setShadeStatusSchema,
  updateShadeSchema,
} from '@/lib/shades/schema'
import { setShadeStatus } from '@/lib/shades/set-shade-status'
import { updateShade } from '@/lib/shades/update-shade'

export const createShadeAction = defineAction(
  createShadeSchema,
  async function createShadeCommand(actor, input) {
    return presentShade(await createShade(actor, input))
  },
)

export const updateShadeAction = defineAction(
  updateShadeSchema,
  async function updateShadeCommand(actor, input) {
    return presentShade(await updateShade(actor, input))
  },
)

export const setShadeStatusAction = defineAction(setShadeStatusSchema, setShadeStatus)

export const reorderShadesAction = defineAction(reorderShadesSchema, reorderShades)

// The page of a deleted shade must leave before it is rendered anew; the caller does both.
export const deleteShadesAction = defineAction(deleteShadesSchema, deleteShades, {
  refreshes: false,
})

export const restoreShadesAction = defineAction(restoreShadesSchema, restoreShades)

export const previewImportAction = defineAction(previewImportSchema, previewImport, {
  refreshes: false,
})

export const importShadesAction = defineAction(importShadesSchema, importShades)
