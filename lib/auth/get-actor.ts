import { getServerSession } from 'next-auth'
import { cache } from 'react'

import { NotFoundError, UnauthenticatedError } from '@/lib/errors'

import type { Actor } from './actor'
import { authOptions } from './options'
import { actorIn, findSignedInPerson, type SignedInPerson } from './sessions'

/** Who is signed in, or null; looked up once a request. */
export const getPerson = cache(async (): Promise<SignedInPerson | null> => {
  const session = await getServerSession(authOptions())
  return session?.sessionId ? findSignedInPerson(session.sessionId) : null
})

/**
 * The signed-in person as an actor in the brand of the address.
 * @throws UnauthenticatedError when nobody is signed in
 * @throws NotFoundError when the brand does not exist or the person is not one of it
 */
export async function getActor(brandSlug: string): Promise<Actor> {
  const person = await getPerson()
  if (!person) throw new UnauthenticatedError()
  const actor = actorIn(person, brandSlug)
  if (!actor) throw new NotFoundError()
  return actor
}
