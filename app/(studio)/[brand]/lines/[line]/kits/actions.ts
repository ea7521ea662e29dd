'use server'

import { deleteKit } from '@/lib/kits/delete-kit'
import { requestKit } from '@/lib/kits/request-kit'
import { kitIdSchema, requestKitSchema } from '@/lib/kits/schema'
import { defineAction } from '@/lib/server/define-action'

export const requestKitAction = defineAction(
  'requestKit',
  requestKitSchema,
  async (actor, input) => {
    const { id } = await requestKit(actor, input)
    return { kitId: id }
  },
)

// The page it is called from may be the kit's own, which is gone after it.
export const deleteKitAction = defineAction('deleteKit', kitIdSchema, deleteKit, {
  refreshes: false,
})
