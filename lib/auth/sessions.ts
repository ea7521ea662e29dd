import { QueryTypes } from 'sequelize'

import { SecondFactorNeededError } from '@/lib/errors'
import { sequelize, Session } from '@/models'

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
  readonly memberships: readonly {
    brandId: string
    brandSlug: string
    brandName: string
    role: Actor['role']
    /** The brand's pages open only to who has a second factor. */
    secondFactorRequired: boolean
  }[]
}

/** Ends a session; ending one that is over is no error. */
export async function endSession(sessionId: string): Promise<void> {
  await Session.destroy({ where: { id: sessionId } })
}

/** What `session_of` answers (migrations, session-of). */
interface SessionRow {
  personId: string
  personName: string
  email: string
  hasSecondFactor: boolean
  expiresAt: Date
  lastSeenAt: Date
  memberships: SignedInPerson['memberships']
}

const SESSION_OF = /* sql */ `
  SELECT person_id AS "personId", person_name AS "personName", email,
    has_second_factor AS "hasSecondFactor", expires_at AS "expiresAt",
    last_seen_at AS "lastSeenAt", memberships
  FROM session_of($sessionId)`

/**
 * The person behind a live session with their brands by name, or null. One query, without models:
 * every request begins with it.
 */
export async function findSignedInPerson(sessionId: string): Promise<SignedInPerson | null> {
  const [row] = await sequelize().query<SessionRow>(SESSION_OF, {
    bind: { sessionId },
    type: QueryTypes.SELECT,
  })
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
