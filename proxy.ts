import { NextResponse, type NextRequest } from 'next/server'

import { isSessionCookie } from '@/lib/auth/cookies'
import { makePageHeaders, POLICY } from '@/lib/server/page-headers'

/** Pages that open signed out, and what is no page of the studio. */
const OPEN =
  /^\/($|sign-in$|sign-up$|forgotten-password$|(reset-password|confirm|confirm-email|invitations)\/|icon|favicon)|\./

/**
 * Gives every page its headers, and sends a browser without a session cookie to the sign-in page,
 * which remembers where it wanted to go. It authorises nothing: every page, route and action asks
 * for itself.
 */
export function proxy(request: NextRequest): NextResponse {
  const headers = makePageHeaders()
  const response = isLost(request) ? toSignIn(request) : onward(request, headers[POLICY]!)
  for (const [name, value] of Object.entries(headers)) response.headers.set(name, value)
  return response
}

function isLost({ cookies, method, nextUrl }: NextRequest): boolean {
  if (method !== 'GET' || OPEN.test(nextUrl.pathname)) return false
  return !cookies.getAll().some(({ name }) => isSessionCookie(name))
}

function toSignIn({ nextUrl }: NextRequest): NextResponse {
  const to = nextUrl.clone()
  to.pathname = '/sign-in'
  to.search = ''
  to.searchParams.set('next', nextUrl.pathname)
  return NextResponse.redirect(to, { headers: { 'Cache-Control': 'private, no-store' } })
}

// Next.js puts the nonce of the request's policy on the scripts that it writes into the page.
function onward(request: NextRequest, policy: string): NextResponse {
  const headers = new Headers(request.headers)
  headers.set(POLICY, policy)
  return NextResponse.next({ request: { headers } })
}

export const config = {
  // Pages only; uploads and everything under /api pass untouched.
  matcher: ['/((?!api/|_next/|livez$|readyz$).*)'],
}
