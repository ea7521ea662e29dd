/** What a person may be in a brand. */
export const ROLES = ['owner', 'marketer', 'designer', 'dyer'] as const
/** One of ROLES. */
export type Role = (typeof ROLES)[number]

/** The roles as people call them. */
export const ROLE_WORDS: Record<Role, string> = {
  owner: 'Owner',
  marketer: 'Marketer',
  designer: 'Designer',
  dyer: 'Dye house',
}

/** How long a password may be, in code points. @source NIST SP 800-63B-4 § 3.1.1.2 */
export const PASSWORD_LENGTH = { min: 12, max: 256 } as const

/** How long what people write of themselves may be, in characters. */
export const PEOPLE_LIMITS = { name: 80, brandName: 80, email: 254 } as const

/** How long the link of a letter is good for, in minutes. */
export const LINK_MINUTES = 30

/** First parts of our own addresses: no brand stands there. */
export const RESERVED_SLUGS: readonly string[] = [
  'account',
  'api',
  'confirm',
  'confirm-email',
  'forgotten-password',
  'invitations',
  'launches',
  'livez',
  'readyz',
  'reset-password',
  'sign-in',
  'sign-up',
]
