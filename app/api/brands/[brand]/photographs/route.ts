import { requestUpload } from '@/lib/photographs/request-upload'
import { requestUploadSchema } from '@/lib/photographs/schema'
import { defineRoute } from '@/lib/server/define-route'

/** Announces a file; the answer says where to send it. */
export const POST = defineRoute('requestUpload', requestUploadSchema, requestUpload)
