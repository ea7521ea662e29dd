import type { Transaction } from 'sequelize'

import type { Actor } from '@/lib/auth/actor'
import { ConflictError, ForbiddenError, NotFoundError } from '@/lib/errors'
import { Membership } from '@/models'

/**
 * All memberships of a brand, locked until the transaction ends: of two who change the team at the
 * same moment the second waits, and decides on what the first has left.
 */
export function lockMembers(brandId: string, transaction: Transaction): Promise<Membership[]> {
  return Membership.findAll({
    where: { brandId },
    order: [['id', 'ASC']],
    lock: transaction.LOCK.UPDATE,
    transaction,
  })
}

/**
 * The member an owner wants to change, and the whole team, locked.
 * @throws ForbiddenError when the actor has been demoted or removed meanwhile
 * @throws NotFoundError when the brand has no such member
 */
export async function lockMember(
  actor: Actor,
  membershipId: string,
  transaction: Transaction,
): Promise<{ member: Membership; members: Membership[] }> {
  const members = await lockMembers(actor.brandId, transaction)
  const self = members.find(({ personId }) => personId === actor.personId)
  if (self?.role !== 'owner') throw new ForbiddenError()
  const member = members.find(({ id }) => id === membershipId)
  if (!member) throw new NotFoundError('This person is not in the team any more.')
  return { member, members }
}

/** Goes on if the brand keeps an owner without this person. @throws ConflictError */
export function requireOtherOwner(members: readonly Membership[], personId: string): void {
  const others = members.filter((one) => one.role === 'owner' && one.personId !== personId)
  if (others.length === 0) {
    throw new ConflictError(
      'A brand needs an owner, and there is no other. Make somebody else an owner first.',
    )
  }
}
