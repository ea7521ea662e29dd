import { cookies, headers } from 'next/headers'

import { isSessionCookie } from '@/lib/auth/cookies'
import { getPerson } from '@/lib/auth/get-actor'
import { endSession } from '@/lib/auth/sessions'

import { requireSameOrigin } from './same-origin'

/** Ends the session of this browser, on the server and in its cookies. @throws ForbiddenError */
export async function endThisSession(): Promise<void> {
  requireSameOrigin(await headers())
  const person = await getPerson()
  if (person) await endSession(person.sessionId)
  const jar = await cookies()
  for (const { name } of jar.getAll()) {
    if (isSessionCookie(name)) jar.delete(name)
  }
}
