import { recordInBrands } from './record-in-brands'
import { makeRecoveryCodes, stepOfCode } from '@/lib/auth/second-factor'
import type { SignedInPerson } from '@/lib/auth/sessions'
import { ConflictError } from '@/lib/errors'
import { inTransaction } from '@/models'

import { lockPerson } from './lock-person'
import { codeRefused, countingCode } from './prove-code'
import { postSecondFactorLetter } from './second-factor-letter'

/**
 * Puts the second factor into use that was begun, in place of any other: a code proves that an
 * authenticator has it. Sessions that are open go on.
 * @returns the recovery codes, which are shown this once
 * @throws InvalidError when the code is wrong, TooManyError, ConflictError when none was begun
 */
export async function confirmSecondFactor(
  person: SignedInPerson,
  { code }: { code: string },
): Promise<{ recoveryCodes: string[] }> {
  return countingCode(person, () =>
    inTransaction(async (transaction) => {
      const row = await lockPerson(person.id, transaction)
      const { totpPending } = row
      if (!totpPending) {
        throw new ConflictError('No second factor waits for a code. Begin again.')
      }
      const step = stepOfCode(totpPending, code)
      if (step === null) throw codeRefused()
      const change = row.totpConfirmedAt ? 'second-factor-replaced' : 'second-factor-set'
      await row.update(
        {
          totpSecret: totpPending,
          totpPending: null,
          totpConfirmedAt: new Date(),
          // The code that confirmed it is used up.
          totpLastStep: step,
        },
        { transaction },
      )
      const recoveryCodes = await makeRecoveryCodes(person.id, transaction)
      await recordInBrands(person.id, { action: `person.${change}` }, transaction)
      await postSecondFactorLetter(row, { kind: change }, transaction)
      return { recoveryCodes }
    }),
  )
}
