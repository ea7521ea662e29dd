'use server'

import { checkOne } from '@/lib/names/check-one'
import { proposeNames } from '@/lib/names/propose-names'
import { checkNameSchema, proposeNamesSchema } from '@/lib/names/schema'
import { defineAction } from '@/lib/server/define-action'

// Both only look: the page stays as it is.
export const checkNameAction = defineAction('checkName', checkNameSchema, checkOne, {
  refreshes: false,
})

export const proposeNamesAction = defineAction('proposeNames', proposeNamesSchema, proposeNames, {
  refreshes: false,
})
