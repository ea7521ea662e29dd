import { recordInBrands } from './record-in-brands'
import type { SignedInPerson } from '@/lib/auth/sessions'
import { ConflictError } from '@/lib/errors'
import { inTransaction, RecoveryCode } from '@/models'

import { lockWithSecondFactor } from './lock-person'
import { countingCode, takeCode } from './prove-code'
import { requirePassword } from './require-password'
import type { BothFactors } from './schema'
import { postSecondFactorLetter } from './second-factor-letter'

/**
 * Removes the second factor with its recovery codes: the password is enough again.
 * @throws InvalidError when password or code is wrong, TooManyError, ConflictError when none is in
 *   use or a brand of the person's requires it
 */
export async function removeSecondFactor(
  person: SignedInPerson,
  { password, code }: BothFactors,
): Promise<void> {
  const requiring = person.memberships.filter((one) => one.secondFactorRequired)
  if (requiring.length > 0) {
    const names = requiring.map(({ brandName }) => brandName)
    throw new ConflictError(
      `${new Intl.ListFormat('en-GB').format(names)} ${names.length === 1 ? 'asks' : 'ask'} everybody for a second factor, so yours stays in use. To change your telephone, change the authenticator instead.`,
    )
  }
  await requirePassword(person, password)
  await countingCode(person, () =>
    inTransaction(async (transaction) => {
      const row = await lockWithSecondFactor(person.id, transaction)
      await takeCode(row, code, transaction)
      const none = { totpSecret: null, totpPending: null, totpConfirmedAt: null }
      await row.update(none, { transaction })
      await RecoveryCode.destroy({ where: { personId: person.id }, transaction })
      await recordInBrands(person.id, { action: 'person.second-factor-removed' }, transaction)
      await postSecondFactorLetter(row, { kind: 'second-factor-removed' }, transaction)
    }),
  )
}
