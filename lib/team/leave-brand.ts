import { recordActivity } from '@/lib/activity/record'
import { authorize, type Actor } from '@/lib/auth/actor'
import { NotFoundError } from '@/lib/errors'
import { ROLE_WORDS } from '@/lib/people/constants'
import { inTransaction } from '@/models'

import { lockMembers, requireOtherOwner } from './members'
import { canLeaveBrand } from './policy'

/**
 * Takes the actor out of the brand; what they made stays. The last owner cannot go.
 * @throws ConflictError when there is no other owner
 */
export async function leaveBrand(actor: Actor): Promise<void> {
  authorize(actor, canLeaveBrand)
  await inTransaction(async (transaction) => {
    const members = await lockMembers(actor.brandId, transaction)
    const member = members.find(({ personId }) => personId === actor.personId)
    if (!member) throw new NotFoundError()
    const { personId, role } = member
    if (role === 'owner') requireOtherOwner(members, personId)
    await member.destroy({ transaction })
    const object = { kind: 'person', id: personId, label: ROLE_WORDS[role] }
    await recordActivity(
      actor,
      { action: 'membership.left', object, before: { role } },
      transaction,
    )
  })
}
