import type { Role } from '../people/constants'

/** The bounds of a brand's team. */
export const TEAM_LIMITS = {
  /** Addresses invited at once. */
  addresses: 20,
  /** Members and open invitations together. */
  perBrand: 200,
  /** Characters of a pasted list of addresses. */
  pasted: 6_000,
} as const

/** How long an invitation can be accepted, in days. */
export const INVITATION_DAYS = 7

/** The roles as they stand in a sentence: "invites you to join as a designer". */
export const ROLE_PHRASES: Record<Role, string> = {
  owner: 'an owner',
  marketer: 'a marketer',
  designer: 'a designer',
  dyer: 'its dye house',
}

/** What each role does. */
export const ROLE_HINTS: Record<Role, string> = {
  owner: 'Runs the team, makes lines, and does all that the others do.',
  marketer: 'Sees everything; words photographs and titles combinations.',
  designer: 'Keeps shades and photographs, and puts combinations together.',
  dyer: 'Sees the shades and takes them away as a file.',
}
