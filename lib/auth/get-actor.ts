import { decode } from 'next-auth/jwt'
import { cookies } from 'next/headers'
import { cache } from 'react'

import { env } from '@/lib/env'
import { NotFoundError, UnauthenticatedError } from '@/lib/errors'

import type { Actor } from './actor'
import { sessionCookieName } from './cookies'
import { isSecure } from './options'
import { actorIn, findSignedInPerson, type SignedInPerson } from './sessions'

/** Who is signed in, or null; looked up once a request. */
export const getPerson = cache(async (): Promise<SignedInPerson | null> => {
  const token = (await cookies()).get(sessionCookieName(isSecure()))?.value
  // A token that is none, or that another secret made, signs nobody in.
  const read = await decode({ token, secret: env().NEXTAUTH_SECRET }).catch(() => null)
  return read?.sessionId ? findSignedInPerson(read.sessionId) : null
})

/**
 * The signed-in person as an actor in the brand of the address.
 * @throws UnauthenticatedError when nobody is signed in
 * @throws NotFoundError when the brand does not exist or the person is not one of it
 * @throws SecondFactorNeededError when the brand requires a second factor and they have none
 */
export async function getActor(brandSlug: string): Promise<Actor> {
  const person = await getPerson()
  if (!person) throw new UnauthenticatedError()
  const actor = actorIn(person, brandSlug)
  if (!actor) throw new NotFoundError()
  return actor
}
