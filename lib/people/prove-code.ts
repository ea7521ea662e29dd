import type { Transaction } from 'sequelize'

import { refund, spend } from '@/lib/auth/rate-limits'
import { takeRecoveryCode, takeTotp } from '@/lib/auth/second-factor'
import { InvalidError } from '@/lib/errors'

/**
 * Does work that asks for a code. One that fails counts as a wrong sign-in does: a session left
 * open somewhere is no place to try codes.
 * @throws TooManyError
 */
export async function countingCode<T>(
  { email }: { email: string },
  work: () => Promise<T>,
): Promise<T> {
  await spend('sign-in-account', email, 'A code')
  const result = await work()
  await refund('sign-in-account', email)
  return result
}

/** A code that is not good, or not any more. */
export function codeRefused(): InvalidError {
  const message =
    'That code is not good, or was used before. Wait for the next one your authenticator shows.'
  return new InvalidError(message, { code: [message] })
}

/** Takes a one-time or a recovery code of the person. @throws InvalidError when it is neither */
export async function takeCode(
  person: { id: string; totpSecret: string | null },
  code: string,
  transaction: Transaction,
): Promise<void> {
  if (await takeTotp(person, code, transaction)) return
  if (await takeRecoveryCode(person.id, code, transaction)) return
  throw codeRefused()
}
