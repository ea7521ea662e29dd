import type { Actor } from '@/lib/auth/actor'
import type { Role } from '@/lib/people/constants'
import type { Invitation, Membership } from '@/models'

import { ROLE_PHRASES } from './constants'
import { canManageTeam } from './policy'
import type { Offer } from './queries'

const day = new Intl.DateTimeFormat('en-GB', { dateStyle: 'long', timeZone: 'UTC' })
const minute = new Intl.DateTimeFormat('en-GB', { timeStyle: 'short', timeZone: 'UTC' })

/** "8 December 2026, 10:55 UTC". */
export const momentInWords = (at: Date): string => `${day.format(at)}, ${minute.format(at)} UTC`

/** A member of the brand as its team sees them. */
export interface MemberView {
  id: string
  name: string
  role: Role
  /** "1 December 2026". */
  since: string
  isYou: boolean
  /** What only owners see. */
  account?: { email: string; hasSecondFactor: boolean }
}

/** A member, with no more of their account than the actor may see. */
export function presentMember(actor: Actor, member: Membership): MemberView {
  const person = member.person!
  return {
    id: member.id,
    name: person.name,
    role: member.role,
    since: day.format(member.createdAt),
    isYou: member.personId === actor.personId,
    ...(canManageTeam(actor) && {
      account: { email: person.email, hasSecondFactor: person.totpConfirmedAt !== null },
    }),
  }
}

/** An invitation that waits for its answer, or has waited too long. */
export interface InvitationView {
  id: string
  email: string
  role: Role
  /** "8 December 2026, 10:55 UTC". */
  until: string
  expired: boolean
  /** Null when the account of who sent it is closed. */
  invitedBy: string | null
}

/** An invitation as owners see it. */
export function presentInvitation(invitation: Invitation, now = new Date()): InvitationView {
  return {
    id: invitation.id,
    email: invitation.email,
    role: invitation.role,
    until: momentInWords(invitation.expiresAt),
    expired: invitation.expiresAt <= now,
    invitedBy: invitation.invitedBy?.name ?? null,
  }
}

/** An invitation as whoever holds its link reads it. */
export interface OfferView {
  brandName: string
  /** As it stands in a sentence: "a designer". */
  role: string
  invitedBy: string
  email: string
  /** "8 December 2026, 10:55 UTC". */
  until: string
  next: OpenOffer['next']
}

type OpenOffer = Extract<Offer, { kind: 'open' }>

/** What a link offers, in words. */
export function presentOffer({ invitation, brandName, next }: OpenOffer): OfferView {
  return {
    brandName,
    role: ROLE_PHRASES[invitation.role],
    invitedBy: invitation.invitedBy?.name ?? 'Somebody who has left Woadmap',
    email: invitation.email,
    until: momentInWords(invitation.expiresAt),
    next,
  }
}
