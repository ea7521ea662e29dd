import { readReadiness } from '@/lib/server/health'

/** Whether this instance can serve: the database answers and is migrated. */
export const dynamic = 'force-dynamic'

export async function GET(): Promise<Response> {
  const readiness = await readReadiness()
  return new Response(readiness.ready ? `ready ${readiness.migration}\n` : `${readiness.why}\n`, {
    status: readiness.ready ? 200 : 503,
    headers: { 'Cache-Control': 'no-store' },
  })
}
