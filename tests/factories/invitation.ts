import { randomUUID } from 'node:crypto'

import { unseal } from '@/lib/auth/seal'
import { inviteMembers } from '@/lib/team/invite-members'
import { inviteMembersSchema } from '@/lib/team/schema'
import type { Actor } from '@/lib/auth/actor'
import type { Role } from '@/lib/people/constants'
import { Invitation, Letter } from '@/models'

/** An address nobody else's test writes to. */
export const anAddress = (): string => `${randomUUID()}@people.example`

/** A letter of the outbox as it will be sent. */
export interface PostedLetter {
  kind: string
  subject: string
  text: string
  html: string
}

/** All letters posted to an address, oldest first. */
export async function lettersTo(recipient: string): Promise<PostedLetter[]> {
  const letters = await Letter.findAll({ where: { recipient }, order: [['createdAt', 'ASC']] })
  return letters.map(({ kind, subject, sealedBody }) => ({
    kind,
    subject,
    ...(JSON.parse(unseal(sealedBody, 'letter')) as { text: string; html: string }),
  }))
}

/** The token of the newest invitation's link in the letters to an address. */
export async function tokenSentTo(recipient: string): Promise<string> {
  const letter = (await lettersTo(recipient)).at(-1)
  const token = /\/invitations\/([\w-]{43})\n/.exec(letter?.text ?? '')?.[1]
  if (!token) throw new Error(`No invitation was sent to ${recipient}.`)
  return token
}

/** Invites an address as the form does, and gives what came of it. */
export async function makeInvitation(
  owner: Actor,
  { email = anAddress(), role = 'designer' }: { email?: string; role?: Role } = {},
): Promise<{ invitation: Invitation; email: string; token: string }> {
  const form = { emails: email, role, requestKey: randomUUID() }
  await inviteMembers(owner, inviteMembersSchema.parse(form))
  const invitation = await Invitation.findOne({
    where: { brandId: owner.brandId, email, acceptedAt: null, withdrawnAt: null },
    rejectOnEmpty: true,
  })
  return { invitation, email, token: await tokenSentTo(email) }
}

/** Lets the moments of an invitation lie this many milliseconds further back. */
export async function age(invitation: Invitation, milliseconds: number): Promise<void> {
  const back = (at: Date) => new Date(at.getTime() - milliseconds)
  await Invitation.update(
    {
      expiresAt: back(invitation.expiresAt),
      createdAt: back(invitation.createdAt),
      updatedAt: back(invitation.updatedAt),
    },
    { where: { id: invitation.id }, silent: true },
  )
}
