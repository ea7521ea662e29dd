import { recordActivity } from '@/lib/activity/record'
import { authorize, type Actor } from '@/lib/auth/actor'
import { ConflictError } from '@/lib/errors'
import { ROLE_WORDS } from '@/lib/people/constants'
import { inTransaction } from '@/models'

import { canManageTeam } from './policy'
import { lockInvitation } from './queries'
import type { InvitationIdInput } from './schema'

/**
 * Takes an invitation back: its link is void at once. Again is no error.
 * @throws NotFoundError, ConflictError when it has been accepted
 */
export async function withdrawInvitation(
  actor: Actor,
  { invitationId }: InvitationIdInput,
): Promise<void> {
  authorize(actor, canManageTeam)
  await inTransaction(async (transaction) => {
    const invitation = await lockInvitation(actor, invitationId, transaction)
    const { acceptedAt, withdrawnAt, id, role } = invitation
    if (withdrawnAt) return
    if (acceptedAt) {
      throw new ConflictError('This invitation has been accepted. Remove the member instead.')
    }
    await invitation.update({ withdrawnAt: new Date() }, { transaction })
    const object = { kind: 'invitation', id, label: ROLE_WORDS[role] }
    await recordActivity(actor, { action: 'membership.withdrawn', object }, transaction)
  })
}
