import { recordActivity } from '@/lib/activity/record'
import { authorize, type Actor } from '@/lib/auth/actor'
import { ConflictError } from '@/lib/errors'
import { postLetter } from '@/lib/mail/post-letter'
import { ROLE_WORDS } from '@/lib/people/constants'
import { inTransaction, Person } from '@/models'

import { removedLetter } from './letters'
import { lockMember } from './members'
import { canManageTeam } from './policy'
import type { MembershipIdInput } from './schema'

/**
 * Removes somebody else from the brand, whose next request there is refused, and tells them by a
 * letter. What they made stays.
 * @throws NotFoundError, ConflictError when it is the actor
 */
export async function removeMember(
  actor: Actor,
  { membershipId }: MembershipIdInput,
): Promise<void> {
  authorize(actor, canManageTeam)
  await inTransaction(async (transaction) => {
    const { member } = await lockMember(actor, membershipId, transaction)
    const { personId, role } = member
    if (personId === actor.personId) {
      throw new ConflictError('That is you. To go, leave the brand.')
    }
    const { email, name } = await Person.findByPk(personId, { rejectOnEmpty: true, transaction })
    await member.destroy({ transaction })
    await postLetter(email, removedLetter(actor, name), transaction)
    const object = { kind: 'person', id: personId, label: ROLE_WORDS[role] }
    await recordActivity(
      actor,
      { action: 'membership.removed', object, before: { role } },
      transaction,
    )
  })
}
