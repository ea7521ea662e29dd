'use server'

import { cookies, headers } from 'next/headers'
import { redirect } from 'next/navigation'

import { isSessionCookie } from '@/lib/auth/cookies'
import { getPerson } from '@/lib/auth/get-actor'
import { endSession } from '@/lib/auth/sessions'
import { requireSameOrigin } from '@/lib/server/same-origin'

/** Ends the session of this browser; also works before the page's script has arrived. */
export async function signOutAction(): Promise<never> {
  requireSameOrigin(await headers())
  const person = await getPerson()
  if (person) await endSession(person.sessionId)
  const jar = await cookies()
  for (const { name } of jar.getAll()) {
    if (isSessionCookie(name)) jar.delete(name)
  }
  redirect('/sign-in')
}
