import { randomInt } from 'node:crypto'

import { Secret, TOTP } from 'otpauth'
import { Op, type Transaction } from 'sequelize'

import { Person, RecoveryCode } from '@/models'

import { digest, seal, unseal } from './seal'

/** Seconds a one-time code is good for. @source RFC 6238 § 5.2 */
const PERIOD = 30
/** Steps before and after this one that are still taken, for clocks that differ. */
const WINDOW = 1
/** Recovery codes handed out at once. */
export const RECOVERY_CODES = 10
/** Without those that are mistaken for one another. */
const ALPHABET = '23456789abcdefghjkmnpqrstuvwxyz'

const totpOf = (secret: string, label = '') =>
  new TOTP({ issuer: 'Woadmap', label, secret, period: PERIOD })

/** A new secret for an authenticator: sealed to be kept, and as the address that sets one up. */
export function makeTotpSecret(label: string): { sealed: string; secret: string; uri: string } {
  const secret = new Secret({ size: 20 }).base32
  return { sealed: seal(secret, 'totp'), secret, uri: totpOf(secret, label).toString() }
}

/** The address that sets an authenticator up for a secret made before. */
export function totpAddress(sealed: string, label: string): { secret: string; uri: string } {
  const secret = unseal(sealed, 'totp')
  return { secret, uri: totpOf(secret, label).toString() }
}

const plain = (code: string) => code.replace(/[\s-]/g, '').toLowerCase()

/**
 * Takes a one-time code, which is then used up; so are those of the steps before it. The row is
 * raised only if no other request has taken the step meanwhile.
 * @source RFC 6238 § 5.2: a code is accepted once
 */
export async function takeTotp(
  person: { id: string; totpSecret: string | null; totpLastStep: number },
  code: string,
  transaction?: Transaction,
): Promise<boolean> {
  if (!person.totpSecret) return false
  const totp = totpOf(unseal(person.totpSecret, 'totp'))
  const delta = totp.validate({ token: plain(code), window: WINDOW })
  if (delta === null) return false
  const step = totp.counter() + delta
  const [taken] = await Person.update(
    { totpLastStep: step },
    { where: { id: person.id, totpLastStep: { [Op.lt]: step } }, transaction },
  )
  return taken === 1
}

/** Takes a recovery code, which is then used up. */
export async function takeRecoveryCode(personId: string, code: string): Promise<boolean> {
  const [taken] = await RecoveryCode.update(
    { usedAt: new Date() },
    { where: { personId, codeHash: digest(plain(code)), usedAt: null } },
  )
  return taken === 1
}

/** New recovery codes in place of all old ones, to be shown once: 50 bits each. */
export async function makeRecoveryCodes(
  personId: string,
  transaction: Transaction,
): Promise<string[]> {
  const one = () => Array.from({ length: 10 }, () => ALPHABET[randomInt(ALPHABET.length)]).join('')
  const codes = Array.from({ length: RECOVERY_CODES }, one)
  await RecoveryCode.destroy({ where: { personId }, transaction })
  await RecoveryCode.bulkCreate(
    codes.map((code) => ({ personId, codeHash: digest(code) })),
    { transaction },
  )
  return codes.map((code) => `${code.slice(0, 5)}-${code.slice(5)}`)
}
