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
