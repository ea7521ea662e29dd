const MINUTE = 60
const HOUR = 60 * MINUTE

/** How often something may be asked for: so many times in so many seconds, by one key. */
export const RATE_LIMITS = {
  /** Wrong passwords and codes for one account, and from one address. */
  'sign-in-account': { points: 5, duration: 15 * MINUTE },
  'sign-in-address': { points: 5, duration: 15 * MINUTE },
  /** Letters that reset a password, by e-mail address and by network address. */
  'reset-email': { points: 3, duration: HOUR },
  'reset-address': { points: 10, duration: HOUR },
  /** Letters that confirm an address, by the address and by the network address or person. */
  'sign-up-email': { points: 3, duration: HOUR },
  'sign-up-address': { points: 10, duration: HOUR },
  'email-change': { points: 5, duration: HOUR },
  /** By brand. */
  invitation: { points: 30, duration: HOUR },
  upload: { points: 600, duration: HOUR },
  kit: { points: 40, duration: HOUR },
  /** Lines of the activity record about the same person refused the same thing. */
  refusal: { points: 1, duration: MINUTE },
  /** Those about the same person, whatever it was. */
  'refusal-person': { points: 200, duration: HOUR },
} as const
/** One of RATE_LIMITS. */
export type RateLimit = keyof typeof RATE_LIMITS
