import type { Transaction } from 'sequelize'
import { Op } from 'sequelize'

import { recordActivity } from '@/lib/activity/record'
import { authorize, type Actor } from '@/lib/auth/actor'
import { refund, spend } from '@/lib/auth/rate-limits'
import { digest, makeToken } from '@/lib/auth/seal'
import { ConflictError, TooManyError } from '@/lib/errors'
import { postLetter } from '@/lib/mail/post-letter'
import { ROLE_WORDS } from '@/lib/people/constants'
import { createOnce, inTransaction, Invitation, Membership } from '@/models'

import { INVITATION_DAYS, TEAM_LIMITS } from './constants'
import { invitationLetter } from './letters'
import { canManageTeam } from './policy'
import { countTeam } from './queries'
import type { InviteMembersInput } from './schema'

/** What became of each address. */
export interface InviteAnswer {
  invited: string[]
  /** Are of the brand already. */
  members: string[]
  /** Have an invitation that waits for its answer. */
  waiting: string[]
}

/**
 * A form invites several addresses: the key of each is made of the form's and the address.
 * @source RFC 9562 § 5.8, UUID version 8
 */
function keyOf(requestKey: string, email: string): string {
  const hash = digest(`${requestKey} ${email}`)
  const parts = [hash.slice(0, 8), hash.slice(8, 12), `8${hash.slice(12, 15)}`]
  return [...parts, `8${hash.slice(15, 18)}`, hash.slice(18, 30)].join('-')
}

/** When an invitation that is sent now ends. */
export const invitationEnd = (): Date => new Date(Date.now() + INVITATION_DAYS * 24 * 3_600_000)

/**
 * Invites people by e-mail, each by a letter, all or none. Who is of the brand or waits for an
 * answer gets none; an invitation that has expired makes way for the new one. The same
 * `requestKey` again sends nothing more.
 * @throws ConflictError when the brand has no room for so many, TooManyError
 */
export async function inviteMembers(
  actor: Actor,
  input: InviteMembersInput,
): Promise<InviteAnswer> {
  authorize(actor, canManageTeam)
  const { brandId } = actor
  const count = input.emails.length
  await spend('invitation', brandId, 'An invitation', count).catch(async (error: unknown) => {
    // A list that was too long leaves room for a shorter one.
    if (error instanceof TooManyError) await refund('invitation', brandId, count)
    throw error
  })
  const { sent, ...answer } = await inTransaction((transaction) =>
    inviteAll(actor, input, transaction),
  )
  if (sent < count) await refund('invitation', brandId, count - sent)
  return answer
}

async function inviteAll(
  actor: Actor,
  { emails, role, requestKey }: InviteMembersInput,
  transaction: Transaction,
): Promise<InviteAnswer & { sent: number }> {
  const { brandId, personId } = actor
  const answer: InviteAnswer & { sent: number } = { invited: [], members: [], waiting: [], sent: 0 }
  const members = await emailsOfMembers(brandId, emails, transaction)
  await withdrawExpired(brandId, emails, transaction)
  // In one order everywhere, so that two lists with the same addresses do not lock each other.
  for (const email of emails.toSorted()) {
    if (members.has(email)) {
      answer.members.push(email)
      continue
    }
    const { token, tokenHash } = makeToken()
    const expiresAt = invitationEnd()
    const made = await createOnce(
      Invitation,
      {
        brandId,
        email,
        role,
        tokenHash,
        expiresAt,
        invitedById: personId,
        requestKey: keyOf(requestKey, email),
      },
      transaction,
    )
    if (!made) {
      answer.waiting.push(email)
      continue
    }
    answer.invited.push(email)
    if (!made.created) continue
    answer.sent++
    await postLetter(email, invitationLetter(actor, { role, expiresAt, token }), transaction)
    const object = { kind: 'invitation', id: made.row.id, label: ROLE_WORDS[role] }
    await recordActivity(
      actor,
      { action: 'membership.invited', object, after: { role } },
      transaction,
    )
  }
  if (answer.sent > 0 && (await countTeam(brandId, transaction)) > TEAM_LIMITS.perBrand) {
    throw new ConflictError(
      `A team holds at most ${TEAM_LIMITS.perBrand} members and invitations. Nobody has been invited; withdraw what is no longer needed first.`,
    )
  }
  return answer
}

async function emailsOfMembers(
  brandId: string,
  emails: string[],
  transaction: Transaction,
): Promise<Set<string>> {
  const members = await Membership.findAll({
    where: { brandId },
    include: [{ association: 'person', attributes: ['email'], where: { email: emails } }],
    transaction,
  })
  return new Set(members.map(({ person }) => person!.email))
}

async function withdrawExpired(
  brandId: string,
  emails: string[],
  transaction: Transaction,
): Promise<void> {
  const now = new Date()
  await Invitation.update(
    { withdrawnAt: now },
    {
      where: {
        brandId,
        email: emails,
        acceptedAt: null,
        withdrawnAt: null,
        expiresAt: { [Op.lte]: now },
      },
      transaction,
    },
  )
}
