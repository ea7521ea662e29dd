import { getDerivative } from '@/lib/photographs/queries'
import { derivativeParamsSchema } from '@/lib/photographs/schema'
import { defineRoute } from '@/lib/server/define-route'

/** One of our own copies of a photograph. Its name names its content, so a browser may keep it. */
export const GET = defineRoute(derivativeParamsSchema, async (actor, { photographId, name }) => {
  const { body, format } = await getDerivative(actor, photographId, name)
  return new Response(new Uint8Array(body), {
    headers: {
      'Content-Type': `image/${format}`,
      'Cache-Control': 'private, max-age=31536000, immutable',
      'X-Content-Type-Options': 'nosniff',
    },
  })
})
