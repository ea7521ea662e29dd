import { getDerivative } from '@/lib/photographs/queries'
import { derivativeParamsSchema } from '@/lib/photographs/schema'
import { defineRoute } from '@/lib/server/define-route'

/** One of our own copies of a photograph; as private as the photograph, so no browser keeps it. */
export const GET = defineRoute(
  'getDerivative',
  derivativeParamsSchema,
  async (actor, { photographId, name }) => {
    const { body, format } = await getDerivative(actor, photographId, name)
    return new Response(new Uint8Array(body), {
      headers: {
        'Content-Type': `image/${format}`,
        'Cache-Control': 'private, no-store',
      },
    })
  },
)
