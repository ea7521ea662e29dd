import { downloadKit } from '@/lib/kits/download-kit'
import { kitParamSchema } from '@/lib/kits/schema'
import { defineRoute } from '@/lib/server/define-route'

/** Leads to a kit's file by a link of the object store that is good for some minutes. */
export const GET = defineRoute('downloadKit', kitParamSchema, async (actor, { kitId }) => {
  const location = await downloadKit(actor, kitId)
  return new Response(null, {
    status: 303,
    headers: { Location: location, 'Cache-Control': 'private, no-store' },
  })
})
