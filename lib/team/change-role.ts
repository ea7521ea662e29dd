import { recordActivity } from '@/lib/activity/record'
import { authorize, type Actor } from '@/lib/auth/actor'
import { ConflictError } from '@/lib/errors'
import { postLetter } from '@/lib/mail/post-letter'
import { ROLE_WORDS } from '@/lib/people/constants'
import { inTransaction, Person, type Membership } from '@/models'

import { roleChangedLetter } from './letters'
import { lockMember, requireOtherOwner } from './members'
import { canManageTeam } from './policy'
import type { ChangeRoleInput } from './schema'

/**
 * Gives a member another role, from their next request on, and tells them by a letter. The last
 * owner stays one.
 * @throws NotFoundError, ConflictError
 */
export async function changeRole(
  actor: Actor,
  { membershipId, role, was }: ChangeRoleInput,
): Promise<Membership> {
  authorize(actor, canManageTeam)
  return inTransaction(async (transaction) => {
    const { member, members } = await lockMember(actor, membershipId, transaction)
    const { personId, role: before } = member
    if (before === role) return member
    if (before !== was) {
      throw new ConflictError(
        `Somebody else has changed this role meanwhile: it is ${ROLE_WORDS[before]} now. Nothing was changed.`,
      )
    }
    if (before === 'owner') requireOtherOwner(members, personId)
    await member.update({ role }, { transaction })
    if (personId !== actor.personId) {
      const { email, name } = await Person.findByPk(personId, { rejectOnEmpty: true, transaction })
      await postLetter(email, roleChangedLetter(actor, { name, before, after: role }), transaction)
    }
    const object = { kind: 'person', id: personId, label: ROLE_WORDS[role] }
    const change = { before: { role: before }, after: { role } }
    await recordActivity(
      actor,
      { action: 'membership.role-changed', object, ...change },
      transaction,
    )
    return member
  })
}
