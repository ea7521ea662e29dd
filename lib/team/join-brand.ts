import type { Transaction } from 'sequelize'

import { recordActivity } from '@/lib/activity/record'
import { ROLE_WORDS } from '@/lib/people/constants'
import { Invitation, Membership } from '@/models'

/** The invitation with this token, locked until the transaction ends, or null. */
export function lockByToken(
  brandId: string,
  tokenHash: string,
  transaction: Transaction,
): Promise<Invitation | null> {
  return Invitation.findOne({
    where: { brandId, tokenHash },
    lock: transaction.LOCK.UPDATE,
    transaction,
  })
}

/** Makes a person a member by a locked invitation, which is then used up. Who is one stays as is. */
export async function joinBrand(
  invitation: Invitation,
  personId: string,
  transaction: Transaction,
): Promise<void> {
  const { brandId, role } = invitation
  await invitation.update({ acceptedAt: new Date() }, { transaction })
  const where = { brandId, personId }
  if ((await Membership.count({ where, transaction })) > 0) return
  await Membership.create({ ...where, role }, { transaction })
  const object = { kind: 'person', id: personId, label: ROLE_WORDS[role] }
  await recordActivity(where, { action: 'membership.joined', object, after: { role } }, transaction)
}
