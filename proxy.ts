import { NextResponse, type NextRequest } from 'next/server'

import { isSessionCookie } from '@/lib/auth/cookies'

/**
 * Sends a browser without a session cookie to the sign-in page and remembers where it wanted to
 * go. It authorises nothing: every page, route and action asks for itself.
 */
export function proxy(request: NextRequest): NextResponse {
  const signedIn = request.cookies.getAll().some(({ name }) => isSessionCookie(name))
  if (signedIn || request.method !== 'GET') return NextResponse.next()
  const to = request.nextUrl.clone()
  to.pathname = '/sign-in'
  to.search = ''
  to.searchParams.set('next', request.nextUrl.pathname)
  return NextResponse.redirect(to)
}

export const config = {
  // Pages of the studio only; uploads and everything under /api pass untouched.
  matcher: ['/((?!api/|_next/|sign-in$|livez$|readyz$|icon|favicon)[^.]+)'],
}
