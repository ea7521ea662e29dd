import { isReady } from '@/lib/server/health'

/** Whether this instance can serve: the database answers. */
export const dynamic = 'force-dynamic'

export async function GET(): Promise<Response> {
  const ready = await isReady()
  return new Response(ready ? 'ready\n' : 'the database does not answer\n', {
    status: ready ? 200 : 503,
    headers: { 'Cache-Control': 'no-store' },
  })
}
