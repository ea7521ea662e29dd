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
  'createShade',
  createShadeSchema,
  async (actor, input) => {
    return presentShade(await createShade(actor, input))
  },
)

export const updateShadeAction = defineAction(
  'updateShade',
  updateShadeSchema,
  async (actor, input) => {
    return presentShade(await updateShade(actor, input))
  },
)

export const setShadeStatusAction = defineAction(
  'setShadeStatus',
  setShadeStatusSchema,
  setShadeStatus,
)

export const reorderShadesAction = defineAction('reorderShades', reorderShadesSchema, reorderShades)

// The page of a deleted shade must leave before it is rendered anew; the caller does both.
export const deleteShadesAction = defineAction('deleteShades', deleteShadesSchema, deleteShades, {
  refreshes: false,
})

export const restoreShadesAction = defineAction('restoreShades', restoreShadesSchema, restoreShades)

export const previewImportAction = defineAction(
  'previewImport',
  previewImportSchema,
  previewImport,
  { refreshes: false },
)

export const importShadesAction = defineAction('importShades', importShadesSchema, importShades)
