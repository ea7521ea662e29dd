import { withdrawUpload } from '@/lib/photographs/confirm-upload'
import { photographParamSchema } from '@/lib/photographs/schema'
import { defineRoute } from '@/lib/server/define-route'

/** Gives up an upload that was not confirmed. */
export const DELETE = defineRoute('withdrawUpload', photographParamSchema, withdrawUpload)
