import { forbidden, notFound, redirect } from 'next/navigation'

import type { Actor } from '@/lib/auth/actor'
import { getActor } from '@/lib/auth/get-actor'
import { ForbiddenError, InvalidError, NotFoundError, UnauthenticatedError } from '@/lib/errors'

/**
 * Reads for a page, as the actor of the brand in its address. What the queries refuse becomes the
 * page that says so: signed out → sign-in, not a row of this brand → not found, not this role →
 * forbidden. Anything else reaches the error page.
 */
export async function readForPage<T>(
  brandSlug: string,
  read: (actor: Actor) => Promise<T>,
): Promise<T> {
  try {
    return await read(await getActor(brandSlug))
  } catch (error) {
    if (error instanceof UnauthenticatedError) redirect('/sign-in')
    if (error instanceof ForbiddenError) forbidden()
    if (error instanceof NotFoundError || error instanceof InvalidError) notFound()
    throw error
  }
}
