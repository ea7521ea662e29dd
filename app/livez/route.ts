/** The process answers; nothing else is asked. */
export const dynamic = 'force-dynamic'

export function GET(): Response {
  return new Response('ok\n', { headers: { 'Cache-Control': 'no-store' } })
}
