import { recordInBrands } from './record-in-brands'
import { makeRecoveryCodes } from '@/lib/auth/second-factor'
import type { SignedInPerson } from '@/lib/auth/sessions'
import { inTransaction } from '@/models'

import { lockWithSecondFactor } from './lock-person'
import { countingCode, takeCode } from './prove-code'
import { requirePassword } from './require-password'
import type { BothFactors } from './schema'
import { postSecondFactorLetter } from './second-factor-letter'

/**
 * Makes new recovery codes; the earlier ones are no good any more.
 * @returns the codes, which are shown this once
 * @throws InvalidError when password or code is wrong, TooManyError, ConflictError when no second
 *   factor is in use
 */
export async function renewRecoveryCodes(
  person: SignedInPerson,
  { password, code }: BothFactors,
): Promise<{ recoveryCodes: string[] }> {
  await requirePassword(person, password)
  return countingCode(person, () =>
    inTransaction(async (transaction) => {
      const row = await lockWithSecondFactor(person.id, transaction)
      await takeCode(row, code, transaction)
      const recoveryCodes = await makeRecoveryCodes(person.id, transaction)
      await recordInBrands(person.id, { action: 'person.recovery-codes-renewed' }, transaction)
      await postSecondFactorLetter(row, { kind: 'recovery-codes-renewed' }, transaction)
      return { recoveryCodes }
    }),
  )
}
