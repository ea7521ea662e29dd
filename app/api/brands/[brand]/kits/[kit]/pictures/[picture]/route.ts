import { getKitPicture } from '@/lib/kits/queries'
import { kitPictureParamsSchema } from '@/lib/kits/schema'
import { defineRoute } from '@/lib/server/define-route'

/** One picture of a kit, as it lies in its zip. */
export const GET = defineRoute(
  'getKitPicture',
  kitPictureParamsSchema,
  async (actor, { kitId, picture }) =>
    new Response(new Uint8Array(await getKitPicture(actor, kitId, picture)), {
      headers: { 'Content-Type': 'image/png', 'Cache-Control': 'private, no-store' },
    }),
)
