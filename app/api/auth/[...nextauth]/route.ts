import NextAuth from 'next-auth'
import type { NextRequest } from 'next/server'

import { authOptions } from '@/lib/auth/options'
import { failureResponse } from '@/lib/server/define-route'
import { failureOf } from '@/lib/server/map-error'
import { requireSameOrigin } from '@/lib/server/same-origin'

type Context = { params: Promise<{ nextauth: string[] }> }

/**
 * What the sign-in form asks for. The rest of next-auth stays shut: its pages are ours, and what it
 * tells of a session comes from the cookie alone, also when the session has long ended.
 */
const OPEN = ['GET csrf', 'GET providers', 'POST callback/credentials']

const shut = () =>
  new Response(null, { status: 404, headers: { 'Cache-Control': 'private, no-store' } })

/** next-auth answers every refusal with 401; one for asking too often says so, and until when. */
async function tellWhen(answer: Response): Promise<Response> {
  if (answer.status !== 401) return answer
  const { url } = (await answer
    .clone()
    .json()
    .catch(() => ({}))) as { url?: string }
  const seconds = /[?&]error=too-many%3A(\d+)/.exec(url ?? '')?.[1]
  if (!seconds) return answer
  const headers = new Headers(answer.headers)
  headers.set('Retry-After', seconds)
  return new Response(answer.body, { status: 429, headers })
}

/** Those of next-auth's own addresses that are open. */
export async function GET(request: NextRequest, context: Context): Promise<Response> {
  const asked = `${request.method} ${(await context.params).nextauth.join('/')}`
  if (!OPEN.includes(asked)) return shut()
  const answer = await tellWhen((await NextAuth(request, context, authOptions())) as Response)
  answer.headers.set('Cache-Control', 'private, no-store')
  return answer
}

/** next-auth has a token of its own against other sites' forms; ours comes before it. */
export async function POST(request: NextRequest, context: Context): Promise<Response> {
  try {
    requireSameOrigin(request.headers)
  } catch (error) {
    return failureResponse(failureOf(error, 'POST /api/auth'))
  }
  return GET(request, context)
}
