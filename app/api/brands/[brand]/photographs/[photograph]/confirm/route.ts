import { confirmUpload } from '@/lib/photographs/confirm-upload'
import { photographParamSchema } from '@/lib/photographs/schema'
import { defineRoute } from '@/lib/server/define-route'

/** Takes in a file that has been sent to the object store. */
export const POST = defineRoute('confirmUpload', photographParamSchema, confirmUpload)
