import { SecondFactorNeededError } from '@/lib/errors'
import { Session, sessionOf } from '@/models'
import type { SessionRow } from '@/models/session-of'

import type { Actor } from './actor'

const HOUR = 60 * 60 * 1000

/** A session ends this long after it began, whatever happens, in milliseconds. */
export const SESSION_LIFETIME = 14 * 24 * HOUR
/** A session ends after this long without a request, in milliseconds. */
export const SESSION_IDLE = 12 * HOUR
/** `lastSeenAt` is written at most this often, in milliseconds. */
const SEEN_EVERY = 5 * 60 * 1000

/** The signed-in person and the brands they belong to. */
export interface SignedInPerson {
  readonly id: string
  readonly name: string
  readonly email: string
  readonly sessionId: string
  readonly hasSecondFactor: boolean
  readonly memberships: readonly Readonly<SessionRow['memberships'][number]>[]
}

/** Ends a session; ending one that is over is no error. */
export async function endSession(sessionId: string): Promise<void> {
  await Session.destroy({ where: { id: sessionId } })
}

/** The person behind a live session with their brands by name, or null. One query. */
export async function findSignedInPerson(sessionId: string): Promise<SignedInPerson | null> {
  const row = await sessionOf(sessionId)
  const now = Date.now()
  if (!row || row.expiresAt.getTime() <= now) return null
  const silence = now - row.lastSeenAt.getTime()
  if (silence >= SESSION_IDLE) return null
  if (silence > SEEN_EVERY) {
    await Session.update({ lastSeenAt: new Date(now) }, { where: { id: sessionId } })
  }
  const { personId: id, personName: name, email, hasSecondFactor, memberships } = row
  return { id, name, email, sessionId, hasSecondFactor, memberships }
}

/**
 * The person as an actor in one of their brands, or null when it is not one of theirs.
 * @throws SecondFactorNeededError when the brand requires a second factor and they have none
 */
export function actorIn(person: SignedInPerson, brandSlug: string): Actor | null {
  const found = person.memberships.find((one) => one.brandSlug === brandSlug)
  if (!found) return null
  const { secondFactorRequired, ...membership } = found
  if (secondFactorRequired && !person.hasSecondFactor) {
    throw new SecondFactorNeededError(membership.brandName)
  }
  return { personId: person.id, personName: person.name, ...membership }
}
