import { getCellMap } from '@/lib/photographs/match'
import { photographParamSchema } from '@/lib/photographs/schema'
import { defineRoute } from '@/lib/server/define-route'

/** The cell of each pixel, one byte a pixel, with the picture's size in two headers. */
export const GET = defineRoute('getCellMap', photographParamSchema, async (actor, input) => {
  const { width, height, cells } = await getCellMap(actor, input)
  return new Response(new Uint8Array(cells), {
    headers: {
      'Content-Type': 'application/octet-stream',
      'Cache-Control': 'private, no-store',
      'X-Map-Width': String(width),
      'X-Map-Height': String(height),
    },
  })
})
