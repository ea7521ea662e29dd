import { recordActivity } from '@/lib/activity/record'
import { authorize, type Actor } from '@/lib/auth/actor'
import { spend } from '@/lib/auth/rate-limits'
import { makeToken } from '@/lib/auth/seal'
import { ConflictError } from '@/lib/errors'
import { postLetter } from '@/lib/mail/post-letter'
import { ROLE_WORDS } from '@/lib/people/constants'
import { inTransaction, type Invitation } from '@/models'

import { invitationEnd } from './invite-members'
import { invitationLetter } from './letters'
import { canManageTeam } from './policy'
import { lockInvitation } from './queries'
import type { InvitationIdInput } from './schema'

/** A letter is given this long to arrive before it is sent again, in milliseconds. */
const ARRIVING = 60_000

/**
 * Sends an invitation again with a new link, good for as long as a new one; the old link is void.
 * @throws NotFoundError, ConflictError when it was answered, or sent a moment ago, TooManyError
 */
export async function resendInvitation(
  actor: Actor,
  { invitationId }: InvitationIdInput,
): Promise<Invitation> {
  authorize(actor, canManageTeam)
  await spend('invitation', actor.brandId, 'An invitation')
  return inTransaction(async (transaction) => {
    const invitation = await lockInvitation(actor, invitationId, transaction)
    const { email, role } = invitation
    if (invitation.acceptedAt) throw new ConflictError('This invitation has been accepted.')
    if (invitation.withdrawnAt) throw new ConflictError('This invitation has been withdrawn.')
    if (Date.now() - invitation.updatedAt.getTime() < ARRIVING) {
      throw new ConflictError(
        'This invitation was sent less than a minute ago. Give it a moment to arrive.',
      )
    }
    const { token, tokenHash } = makeToken()
    const expiresAt = invitationEnd()
    await invitation.update({ tokenHash, expiresAt, invitedById: actor.personId }, { transaction })
    await postLetter(email, invitationLetter(actor, { role, expiresAt, token }), transaction)
    const object = { kind: 'invitation', id: invitation.id, label: ROLE_WORDS[role] }
    await recordActivity(actor, { action: 'membership.invitation-resent', object }, transaction)
    return invitation
  })
}
