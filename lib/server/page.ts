import { headers } from 'next/headers'
import { forbidden, notFound, redirect } from 'next/navigation'

import { asActor, type Actor } from '@/lib/auth/actor'
import { getActor, getPerson } from '@/lib/auth/get-actor'
import type { SignedInPerson } from '@/lib/auth/sessions'
import {
  ForbiddenError,
  InvalidError,
  NotFoundError,
  SecondFactorNeededError,
  UnauthenticatedError,
} from '@/lib/errors'
import { withinScope } from '@/models/scope'

import { referenceOf } from './map-error'
import { recordRefusals } from './record-refusals'
import { PATH_HEADER, requestIdOf } from './request'

/** Of a longer path the activity record keeps the beginning. */
const MOST_OF_A_PATH = 200

/**
 * What queries refuse becomes the page that says so; anything else reaches the error page, which
 * shows the digest that it is given here.
 */
async function readOrSay<T>(read: () => Promise<T>): Promise<T> {
  const requestId = requestIdOf(await headers())
  try {
    return await withinScope({ requestId }, read)
  } catch (error) {
    if (error instanceof UnauthenticatedError) redirect('/sign-in')
    if (error instanceof SecondFactorNeededError) redirect('/account/second-factor')
    if (error instanceof ForbiddenError) forbidden()
    if (error instanceof NotFoundError || error instanceof InvalidError) notFound()
    throw bareError(error, referenceOf(requestId))
  }
}

/**
 * The error without what hangs on it, under the digest that its page shows: Next.js prints all of
 * it beside our log, and a database error carries its statement. Those of Next.js's own pass.
 */
function bareError(error: unknown, digest: string): unknown {
  if (!(error instanceof Error) || 'digest' in error) return error
  const { name, message, stack } = error
  return Object.assign(new Error(message), { name, stack, digest })
}

/**
 * Reads for a page, as the actor of the brand in its address: signed out → sign-in, not a row of
 * this brand → not found, no second factor where the brand requires one → where it is set up, not
 * this role → forbidden.
 */
export const readForPage = <T>(brandSlug: string, read: (actor: Actor) => Promise<T>): Promise<T> =>
  readOrSay(async () => {
    const actor = await getActor(brandSlug)
    const path = (await headers()).get(PATH_HEADER) ?? ''
    return asActor(actor, () =>
      recordRefusals(actor, { page: path.slice(0, MOST_OF_A_PATH) }, () => read(actor)),
    )
  })

/** Reads for a page of the signed-in person, in no brand. */
export const readForPerson = <T>(read: (person: SignedInPerson) => Promise<T>): Promise<T> =>
  readOrSay(async () => {
    const person = await getPerson()
    if (!person) throw new UnauthenticatedError()
    return withinScope({ personId: person.id }, () => read(person))
  })

/** Reads for a page that is open to whoever asks, signed in or not. */
export const readForAnyone = <T>(read: () => Promise<T>): Promise<T> => readOrSay(read)
