import { QueryTypes, type Transaction } from 'sequelize'

import { authorize, type Actor } from '@/lib/auth/actor'
import { digest } from '@/lib/auth/seal'
import type { SignedInPerson } from '@/lib/auth/sessions'
import { NotFoundError } from '@/lib/errors'
import { Brand, Invitation, Membership, Person, sequelize } from '@/models'
import { withinScope } from '@/models/scope'

import { canManageTeam, canReadTeam } from './policy'

const OPEN = { acceptedAt: null, withdrawnAt: null }

/** Everybody of the actor's brand by name. One query. */
export async function listMembers(actor: Actor): Promise<Membership[]> {
  authorize(actor, canReadTeam)
  return Membership.findAll({
    where: { brandId: actor.brandId },
    include: [{ association: 'person', attributes: ['name', 'email', 'totpConfirmedAt'] }],
    order: [
      ['person', 'name', 'ASC'],
      ['id', 'ASC'],
    ],
  })
}

/** The brand's invitations without an answer, expired ones among them, newest first. One query. */
export async function listInvitations(actor: Actor): Promise<Invitation[]> {
  authorize(actor, canManageTeam)
  return Invitation.findAll({
    where: { brandId: actor.brandId, ...OPEN },
    include: [{ association: 'invitedBy', attributes: ['name'] }],
    order: [
      ['createdAt', 'DESC'],
      ['email', 'ASC'],
    ],
  })
}

/** How many members and open invitations a brand has. */
export async function countTeam(brandId: string, transaction: Transaction): Promise<number> {
  const members = await Membership.count({ where: { brandId }, transaction })
  return members + (await Invitation.count({ where: { brandId, ...OPEN }, transaction }))
}

/**
 * An invitation of the actor's brand, locked until the transaction ends.
 * @throws NotFoundError
 */
export async function lockInvitation(
  actor: Actor,
  invitationId: string,
  transaction: Transaction,
): Promise<Invitation> {
  const invitation = await Invitation.findOne({
    where: { brandId: actor.brandId, id: invitationId },
    lock: transaction.LOCK.UPDATE,
    transaction,
  })
  if (!invitation) throw new NotFoundError('This invitation does not exist.')
  return invitation
}

const GONE =
  'This invitation is not good any more: it was used, withdrawn, sent anew, or is too old.'

/**
 * Runs `work` with the database open to the brand whose invitation has this token: who holds one
 * need not be of any brand.
 * @throws NotFoundError when no invitation has it
 */
export async function withinInvitedBrand<T>(
  token: string,
  work: (brandId: string, tokenHash: string) => Promise<T>,
): Promise<T> {
  const tokenHash = digest(token)
  const [found] = await sequelize().query<{ brandId: string | null }>(
    'SELECT brand_of_invitation($1) AS "brandId"',
    { bind: [tokenHash], type: QueryTypes.SELECT },
  )
  const brandId = found?.brandId
  if (!brandId) throw new NotFoundError(GONE)
  return withinScope({ brandId }, () => work(brandId, tokenHash))
}

/** Goes on if the invitation can be accepted now. @throws NotFoundError */
export function requireOpen(invitation: Invitation | null): asserts invitation is Invitation {
  const isOpen =
    invitation &&
    !invitation.acceptedAt &&
    !invitation.withdrawnAt &&
    invitation.expiresAt > new Date()
  if (!isOpen) throw new NotFoundError(GONE)
}

/** An invitation to whoever opened its link, and what they can do about it. */
export type Offer =
  /** It was used, and the person is of the brand. */
  | { kind: 'joined'; brandSlug: string }
  | {
      kind: 'open'
      invitation: Invitation
      brandName: string
      /**
       * `join`: signed in with the invited address. `other-account`: with another one. `sign-in`:
       * signed out, and the address has an account. `new-account`: it has none.
       */
      next: 'join' | 'other-account' | 'sign-in' | 'new-account'
    }

/**
 * What a token offers to the signed-in person, or to somebody signed out (null). At most four
 * queries.
 * @throws NotFoundError when it is unknown, used, withdrawn, sent anew or too old
 */
export function getOffer(person: SignedInPerson | null, token: string): Promise<Offer> {
  return withinInvitedBrand(token, async (brandId, tokenHash) => {
    const invitation = await Invitation.findOne({
      where: { brandId, tokenHash },
      include: [{ association: 'invitedBy', attributes: ['name'] }],
    })
    const own = person?.memberships.find((one) => one.brandId === brandId)
    if (invitation?.acceptedAt && own) return { kind: 'joined', brandSlug: own.brandSlug }
    requireOpen(invitation)
    const { email } = invitation
    const brand = await Brand.findByPk(brandId, { rejectOnEmpty: true })
    const offer = { kind: 'open', invitation, brandName: brand.name } as const
    if (person) return { ...offer, next: person.email === email ? 'join' : 'other-account' }
    const hasAccount = (await Person.count({ where: { email } })) > 0
    return { ...offer, next: hasAccount ? 'sign-in' : 'new-account' }
  })
}
