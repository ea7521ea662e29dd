import type { NextAuthOptions } from 'next-auth'
import CredentialsProvider from 'next-auth/providers/credentials'

import { env } from '@/lib/env'
import { signInSchema } from '@/lib/people/schema'
import { failureOf } from '@/lib/server/map-error'
import { addressOf, requestIdOf } from '@/lib/server/request'
import { withinScope } from '@/models/scope'

import { sessionCookieName } from './cookies'
import { SESSION_LIFETIME } from './sessions'
import { signIn, type SignInOutcome } from './sign-in'

declare module 'next-auth' {
  interface User {
    sessionId: string
  }
}
declare module 'next-auth/jwt' {
  interface JWT {
    sessionId?: string
  }
}

/** Whether people reach the product over https, so that its cookies may be bound to that. */
export const isSecure = (): boolean => new URL(env().APP_ORIGIN).protocol === 'https:'

/** next-auth sends the words of whatever is thrown to the browser: ours are written for people. */
function maskError(error: unknown): never {
  throw new Error(`failed:${failureOf(error, 'signIn').message}`)
}

/** An outcome as the sign-in form reads it from next-auth: "too-many:540". */
const asError = (outcome: Exclude<SignInOutcome, { kind: 'opened' }>): string =>
  outcome.kind === 'too-many' ? `too-many:${outcome.retryAfter}` : outcome.kind

/**
 * next-auth with e-mail and password. Its credentials provider needs a token in the cookie; ours
 * carries nothing but the id of a row in `sessions`, which every request looks up.
 */
export function authOptions(): NextAuthOptions {
  const secure = isSecure()
  const terms = { httpOnly: true, sameSite: 'lax', path: '/', secure } as const
  const prefix = secure ? '__Host-woadmap' : 'woadmap'
  return {
    secret: env().NEXTAUTH_SECRET,
    session: { strategy: 'jwt', maxAge: SESSION_LIFETIME / 1000 },
    useSecureCookies: secure,
    cookies: {
      sessionToken: { name: sessionCookieName(secure), options: terms },
      csrfToken: { name: `${prefix}.csrf`, options: terms },
      callbackUrl: { name: `${prefix}.callback`, options: terms },
    },
    pages: { signIn: '/sign-in', error: '/sign-in' },
    providers: [
      CredentialsProvider({
        credentials: {
          email: { type: 'email' },
          password: { type: 'password' },
          code: { type: 'text' },
        },
        async authorize(credentials, request) {
          const input = signInSchema.safeParse(credentials)
          if (!input.success) return null
          const headers = new Headers(request.headers as Record<string, string>)
          const outcome = await withinScope({ requestId: requestIdOf(headers) }, () =>
            signIn({
              ...input.data,
              address: addressOf(headers),
              userAgent: headers.get('user-agent') ?? '',
            }).catch(maskError),
          )
          if (outcome.kind === 'refused') return null
          if (outcome.kind !== 'opened') throw new Error(asError(outcome))
          return { id: outcome.personId, sessionId: outcome.sessionId }
        },
      }),
    ],
    callbacks: {
      jwt: ({ token, user }) => (user ? { sub: user.id, sessionId: user.sessionId } : token),
      // Who is signed in is asked of the server; a page's script has no use for more.
      session: ({ session }) => ({ expires: session.expires }),
    },
  }
}
