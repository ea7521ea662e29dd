import { hashPassword } from '@/lib/auth/password'
import { forgive } from '@/lib/auth/rate-limits'
import { InvalidError } from '@/lib/errors'
import { inTransaction } from '@/models'

import { deadLink, findLink, useLink } from './links'
import { checkPassword } from './password-rules'
import { recordInBrands } from './record-in-brands'
import type { ResetPasswordInput } from './schema'
import { setPassword } from './set-password'

/**
 * Gives the person of a link a new password. Nobody is signed in by it, and every session of theirs
 * ends; a second factor is asked for at the next sign-in as before.
 * @throws InvalidError when the link is no longer good, or the password cannot be taken
 */
export async function resetPassword({ token, password }: ResetPasswordInput): Promise<void> {
  const link = await findLink('reset-password', token)
  if (!link?.person) throw deadLink()
  const { person } = link
  const message = await checkPassword(password, person)
  if (message) throw new InvalidError(message, { password: [message] })
  const passwordHash = await hashPassword(password)
  await inTransaction(async (transaction) => {
    await useLink(link, transaction)
    await setPassword(person, passwordHash, null, transaction)
    await recordInBrands(person.id, { action: 'person.password-reset' }, transaction)
  })
  // Whoever reads the letters of the address need not wait for what others tried.
  await forgive('sign-in-account', person.email)
}
