import {
  createCipheriv,
  createDecipheriv,
  createHash,
  createHmac,
  hkdfSync,
  randomBytes,
} from 'node:crypto'

import { env } from '@/lib/env'

/** Seals of different purposes cannot be opened as one another. */
export type SealPurpose = 'letter' | 'totp' | 'recovery-code'

const NONCE = 12
const TAG = 16

const keyOf = (purpose: SealPurpose) =>
  new Uint8Array(hkdfSync('sha256', env().NEXTAUTH_SECRET, '', `woadmap ${purpose}`, 32))

/**
 * Text that only this product can read again, for what must be kept but not lie open in the
 * database or its backups. @source AES-256-GCM, NIST SP 800-38D; key by HKDF, RFC 5869
 */
export function seal(text: string, purpose: SealPurpose): string {
  const nonce = randomBytes(NONCE)
  const cipher = createCipheriv('aes-256-gcm', keyOf(purpose), nonce)
  const body = Buffer.concat([cipher.update(text, 'utf8'), cipher.final()])
  return Buffer.concat([nonce, cipher.getAuthTag(), body]).toString('base64')
}

/** What was sealed. @throws Error when it was altered, or sealed with another secret or purpose */
export function unseal(sealed: string, purpose: SealPurpose): string {
  const bytes = Buffer.from(sealed, 'base64')
  const decipher = createDecipheriv('aes-256-gcm', keyOf(purpose), bytes.subarray(0, NONCE))
  decipher.setAuthTag(bytes.subarray(NONCE, NONCE + TAG))
  const body = bytes.subarray(NONCE + TAG)
  return Buffer.concat([decipher.update(body), decipher.final()]).toString('utf8')
}

/** SHA-256 in hexadecimal: how a secret of 128 bits or more is kept. */
export const digest = (secret: string): string => createHash('sha256').update(secret).digest('hex')

/**
 * How a secret of fewer bits is kept: hashed with a key that is not in the database, so that who
 * has only that cannot try them all. @source HMAC-SHA-256, RFC 2104; NIST SP 800-63B § 5.1.2.2
 */
export const keyedDigest = (secret: string, purpose: SealPurpose): string =>
  createHmac('sha256', keyOf(purpose)).update(secret).digest('hex')

/** A secret of 256 bits for a link, and what of it is kept. */
export function makeToken(): { token: string; tokenHash: string } {
  const token = randomBytes(32).toString('base64url')
  return { token, tokenHash: digest(token) }
}
