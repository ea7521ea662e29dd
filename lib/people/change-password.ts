import { hashPassword } from '@/lib/auth/password'
import type { SignedInPerson } from '@/lib/auth/sessions'
import { InvalidError } from '@/lib/errors'
import { inTransaction } from '@/models'

import { voidLinks } from './links'
import { checkPassword } from './password-rules'
import { recordInBrands } from './record-in-brands'
import { requirePassword } from './require-password'
import type { ChangePasswordInput } from './schema'
import { setPassword } from './set-password'

/**
 * Changes the password of somebody who knows the old one. Their other sessions end and links they
 * asked for before are void.
 * @throws InvalidError, TooManyError
 */
export async function changePassword(
  person: SignedInPerson,
  { password, newPassword }: ChangePasswordInput,
): Promise<void> {
  await requirePassword(person, password)
  const message = await checkPassword(newPassword, person)
  if (message) throw new InvalidError(message, { newPassword: [message] })
  const passwordHash = await hashPassword(newPassword)
  await inTransaction(async (transaction) => {
    await voidLinks(person.id, transaction)
    await setPassword(person, passwordHash, person.sessionId, transaction)
    await recordInBrands(person.id, { action: 'person.password-changed' }, transaction)
  })
}
