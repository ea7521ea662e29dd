import type { Actor } from '@/lib/auth/actor'
import type { LetterContent } from '@/lib/mail/letter'
import type { Role } from '@/lib/people/constants'

import { ROLE_PHRASES } from './constants'
import { momentInWords } from './present'

type Sender = Pick<Actor, 'personName' | 'brandName' | 'brandSlug'>

/** The invitation itself; its link holds the token. */
export function invitationLetter(
  { personName, brandName }: Sender,
  { role, expiresAt, token }: { role: Role; expiresAt: Date; token: string },
): LetterContent {
  return {
    kind: 'invitation',
    subject: `${personName} invites you to ${brandName}`,
    paragraphs: [
      `${personName} invites you to join ${brandName} on Woadmap as ${ROLE_PHRASES[role]}. Woadmap is where a yarn brand keeps its lines, from the first photograph to launch day.`,
      `The invitation is for this address and good until ${momentInWords(expiresAt)}.`,
    ],
    action: { label: 'Open the invitation', path: `/invitations/${token}` },
    closing: `If you do not know ${personName} or ${brandName}, do nothing: you will not become part of anything.`,
  }
}

/** Tells somebody that their role is another one now. */
export function roleChangedLetter(
  { personName, brandName, brandSlug }: Sender,
  { name, before, after }: { name: string; before: Role; after: Role },
): LetterContent {
  return {
    kind: 'role-changed',
    subject: `Your role at ${brandName} has changed`,
    name,
    paragraphs: [
      `${personName} has changed your role at ${brandName}: you were ${ROLE_PHRASES[before]} and are now ${ROLE_PHRASES[after]}.`,
    ],
    action: { label: `Open ${brandName}`, path: `/${brandSlug}` },
  }
}

/** Tells somebody that they are not of the brand any more. */
export function removedLetter({ personName, brandName }: Sender, name: string): LetterContent {
  return {
    kind: 'membership-removed',
    subject: `You are no longer part of ${brandName}`,
    name,
    paragraphs: [
      `${personName} has removed you from the team of ${brandName}. Its lines are closed to you from now on; your account and your other brands stay as they are.`,
    ],
  }
}
