import type { NextAuthOptions } from 'next-auth'
import CredentialsProvider from 'next-auth/providers/credentials'

import { env } from '@/lib/env'
import { signInSchema } from '@/lib/people/schema'

import { openSession, SESSION_LIFETIME } from './sessions'

declare module 'next-auth' {
  interface User {
    sessionId: string
  }
  interface Session {
    sessionId: string
  }
}
declare module 'next-auth/jwt' {
  interface JWT {
    sessionId?: string
  }
}

/**
 * next-auth with e-mail and password. Its credentials provider needs a token in the cookie; ours
 * carries nothing but the id of a row in `sessions`, which every request looks up.
 */
export function authOptions(): NextAuthOptions {
  return {
    secret: env().NEXTAUTH_SECRET,
    session: { strategy: 'jwt', maxAge: SESSION_LIFETIME / 1000 },
    pages: { signIn: '/sign-in', error: '/sign-in' },
    providers: [
      CredentialsProvider({
        credentials: { email: { type: 'email' }, password: { type: 'password' } },
        async authorize(credentials) {
          const input = signInSchema.safeParse(credentials)
          if (!input.success) return null
          const opened = await openSession(input.data.email, input.data.password)
          return opened && { id: opened.personId, sessionId: opened.sessionId }
        },
      }),
    ],
    callbacks: {
      jwt: ({ token, user }) => (user ? { sub: user.id, sessionId: user.sessionId } : token),
      session: ({ session, token }) => ({
        expires: session.expires,
        sessionId: token.sessionId ?? '',
      }),
    },
  }
}
