import { Secret, TOTP } from 'otpauth'

/** Seconds a one-time code is good for. @source RFC 6238 § 5.2 */
const PERIOD = 30
/** Steps before and after this one that are still taken, for clocks that differ. @source the same */
const WINDOW = 1

const totpOf = (secret: string, label = '') =>
  new TOTP({ issuer: 'Woadmap', label, secret, period: PERIOD })

/** A new secret of 160 bits, in base32. @source RFC 4226 § 4 R6 */
export const newSecret = (): string => new Secret({ size: 20 }).base32

/** The `otpauth:` address that sets an authenticator up. @param secret base32 */
export const authenticatorAddress = (secret: string, label: string): string =>
  totpOf(secret, label).toString()

/** A code as it counts: without the spaces and hyphens that make it easier to read. */
export const plainCode = (code: string): string => code.replace(/[\s-]/g, '').toLowerCase()

/**
 * The time step whose code this is, or null when it is none of those around `now`.
 * @param secret base32
 * @param now milliseconds since 1970
 * @source RFC 6238 § 4.2 (SHA-1, six digits)
 */
export function stepOfTotp(secret: string, code: string, now = Date.now()): number | null {
  const token = plainCode(code)
  // The library compares bytes, and throws where letters are of more than one.
  if (!/^[0-9]{6}$/.test(token)) return null
  const totp = totpOf(secret)
  const delta = totp.validate({ token, window: WINDOW, timestamp: now })
  return delta === null ? null : totp.counter({ timestamp: now }) + delta
}
