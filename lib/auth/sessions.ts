import { Op } from 'sequelize'

import { SecondFactorNeededError } from '@/lib/errors'
import { Membership, Person, Session } from '@/models'
import { withinScope } from '@/models/scope'

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

/** The person behind a live session with their brands by name, or null. Two queries. */
export async function findSignedInPerson(sessionId: string): Promise<SignedInPerson | null> {
  const now = Date.now()
  const session = await Session.findOne({
    where: {
      id: sessionId,
      expiresAt: { [Op.gt]: new Date(now) },
      lastSeenAt: { [Op.gt]: new Date(now - SESSION_IDLE) },
    },
    include: [{ model: Person, as: 'person' }],
  })
  if (!session?.person) return null
  if (now - session.lastSeenAt.getTime() > SEEN_EVERY) {
    await session.update({ lastSeenAt: new Date(now) })
  }
  const { personId } = session
  const memberships = await withinScope({ personId }, () =>
    Membership.findAll({
      where: { personId },
      include: ['brand'],
      order: [['brand', 'name', 'ASC']],
    }),
  )
  return {
    id: session.person.id,
    name: session.person.name,
    email: session.person.email,
    sessionId: session.id,
    hasSecondFactor: session.person.totpConfirmedAt !== null,
    memberships: memberships.map(({ brand, role }) => ({
      brandId: brand!.id,
      brandSlug: brand!.slug,
      brandName: brand!.name,
      role,
      secondFactorRequired: brand!.secondFactorRequired,
    })),
  }
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
