import NextAuth from 'next-auth'
import type { NextRequest } from 'next/server'

import { authOptions } from '@/lib/auth/options'

type Context = { params: Promise<{ nextauth: string[] }> }

/** next-auth answers every refusal with 401; one for asking too often says so, and until when. */
async function handler(request: NextRequest, context: Context): Promise<Response> {
  const response = (await NextAuth(request, context, authOptions())) as Response
  if (response.status !== 401) return response
  const { url } = (await response
    .clone()
    .json()
    .catch(() => ({}))) as { url?: string }
  const seconds = /[?&]error=too-many%3A(\d+)/.exec(url ?? '')?.[1]
  if (!seconds) return response
  const headers = new Headers(response.headers)
  headers.set('Retry-After', seconds)
  return new Response(response.body, { status: 429, headers })
}

export { handler as GET, handler as POST }
