'use server'

import { mergeFamilies } from '@/lib/families/merge-families'
import { moveShadesToFamily } from '@/lib/families/move-shades-to-family'
import { orderFamilies } from '@/lib/families/order-families'
import { orderFamilyShades } from '@/lib/families/order-family-shades'
import { pinShades } from '@/lib/families/pin-shades'
import { previewSort } from '@/lib/families/preview-sort'
import { renameFamily } from '@/lib/families/rename-family'
import { restoreFamilies } from '@/lib/families/restore-families'
import {
  mergeFamiliesSchema,
  moveShadesToFamilySchema,
  orderFamiliesSchema,
  orderFamilyShadesSchema,
  pinShadesSchema,
  previewSortSchema,
  renameFamilySchema,
  restoreFamiliesSchema,
  sortIntoFamiliesSchema,
  splitFamilySchema,
} from '@/lib/families/schema'
import { sortIntoFamilies } from '@/lib/families/sort-into-families'
import { splitFamily } from '@/lib/families/split-family'
import { defineAction } from '@/lib/server/define-action'

export const sortIntoFamiliesAction = defineAction(
  'sortIntoFamilies',
  sortIntoFamiliesSchema,
  sortIntoFamilies,
)

export const previewSortAction = defineAction('previewSort', previewSortSchema, previewSort, {
  refreshes: false,
})

export const renameFamilyAction = defineAction('renameFamily', renameFamilySchema, renameFamily)

export const mergeFamiliesAction = defineAction('mergeFamilies', mergeFamiliesSchema, mergeFamilies)

export const splitFamilyAction = defineAction('splitFamily', splitFamilySchema, splitFamily)

export const moveShadesToFamilyAction = defineAction(
  'moveShadesToFamily',
  moveShadesToFamilySchema,
  moveShadesToFamily,
)

export const pinShadesAction = defineAction('pinShades', pinShadesSchema, pinShades)

export const orderFamilyShadesAction = defineAction(
  'orderFamilyShades',
  orderFamilyShadesSchema,
  orderFamilyShades,
)

export const orderFamiliesAction = defineAction('orderFamilies', orderFamiliesSchema, orderFamilies)

export const restoreFamiliesAction = defineAction(
  'restoreFamilies',
  restoreFamiliesSchema,
  restoreFamilies,
)
