import { randomInt } from 'node:crypto'

import { Op, type Transaction } from 'sequelize'

import { Person, RecoveryCode } from '@/models'

import { keyedDigest, seal, unseal } from './seal'
import { authenticatorAddress, newSecret, plainCode, stepOfTotp } from './totp'

/** Recovery codes handed out at once. */
export const RECOVERY_CODES = 10
/** Letters and digits of a recovery code, in two halves. */
const CODE_LENGTH = 10
/** Without those that are mistaken for one another. */
const ALPHABET = '23456789abcdefghjkmnpqrstuvwxyz'

/**
 * A new secret for an authenticator: sealed to be kept, in base32 to be typed, and as the address
 * that sets one up.
 */
export function makeTotpSecret(label: string): { sealed: string; secret: string; uri: string } {
  const secret = newSecret()
  return { sealed: seal(secret, 'totp'), secret, uri: authenticatorAddress(secret, label) }
}

/** The time step whose code of a sealed secret this is now, or null. */
export const stepOfCode = (sealed: string, code: string): number | null =>
  stepOfTotp(unseal(sealed, 'totp'), code)

/**
 * Takes a one-time code, which is then used up; so are those of the steps before it. The row is
 * raised only if no other request has taken the step meanwhile, and still has that secret.
 * @source RFC 6238 § 5.2: a code is accepted once
 */
export async function takeTotp(
  { id, totpSecret }: { id: string; totpSecret: string | null },
  code: string,
  transaction?: Transaction,
): Promise<boolean> {
  if (!totpSecret) return false
  const step = stepOfCode(totpSecret, code)
  if (step === null) return false
  const [taken] = await Person.update(
    { totpLastStep: step },
    { where: { id, totpSecret, totpLastStep: { [Op.lt]: step } }, transaction },
  )
  return taken === 1
}

const recoveryDigest = (personId: string, code: string) =>
  keyedDigest(`${personId} ${plainCode(code)}`, 'recovery-code')

/** Takes a recovery code, which is then used up. */
export async function takeRecoveryCode(
  personId: string,
  code: string,
  transaction?: Transaction,
): Promise<boolean> {
  const [taken] = await RecoveryCode.update(
    { usedAt: new Date() },
    { where: { personId, codeHash: recoveryDigest(personId, code), usedAt: null }, transaction },
  )
  return taken === 1
}

/** How many recovery codes the person has not used yet. */
export const countRecoveryCodes = (personId: string, transaction?: Transaction): Promise<number> =>
  RecoveryCode.count({ where: { personId, usedAt: null }, transaction })

/** New recovery codes in place of all old ones, to be shown once: 49 bits each. */
export async function makeRecoveryCodes(
  personId: string,
  transaction: Transaction,
): Promise<string[]> {
  const letter = () => ALPHABET[randomInt(ALPHABET.length)]
  const codes = Array.from({ length: RECOVERY_CODES }, () =>
    Array.from({ length: CODE_LENGTH }, letter).join(''),
  )
  await RecoveryCode.destroy({ where: { personId }, transaction })
  await RecoveryCode.bulkCreate(
    codes.map((code) => ({ personId, codeHash: recoveryDigest(personId, code) })),
    { transaction },
  )
  const half = CODE_LENGTH / 2
  return codes.map((code) => `${code.slice(0, half)}-${code.slice(half)}`)
}
