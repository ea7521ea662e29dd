import NextAuth from 'next-auth'
import type { NextRequest } from 'next/server'

import { authOptions } from '@/lib/auth/options'
import { failureResponse } from '@/lib/server/define-route'
import { failureOf } from '@/lib/server/map-error'
import { requireSameOrigin } from '@/lib/server/same-origin'

type Context = { params: Promise<{ nextauth: string[] }> }

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

/** next-auth's own addresses. */
export async function GET(request: NextRequest, context: Context): Promise<Response> {
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
