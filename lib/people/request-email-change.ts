import { spend } from '@/lib/auth/rate-limits'
import type { SignedInPerson } from '@/lib/auth/sessions'
import { InvalidError } from '@/lib/errors'
import { postLetter } from '@/lib/mail/post-letter'
import { inTransaction, Person } from '@/models'

import { confirmEmailLetter, emailChangeNoticeLetter, emailTakenLetter } from './letters'
import { makeLink } from './links'
import { recordInBrands } from './record-in-brands'
import { requirePassword } from './require-password'
import type { RequestEmailChangeInput } from './schema'

/**
 * Sends a link to the address a person wants to have, and word of it to the one they have. Whether
 * another account has the address is told to that address only.
 * @throws InvalidError, TooManyError
 */
export async function requestEmailChange(
  person: SignedInPerson,
  { email, password }: RequestEmailChangeInput,
): Promise<void> {
  if (email === person.email) {
    const message = 'That is your address already.'
    throw new InvalidError(message, { email: [message] })
  }
  await spend('email-change', person.id, 'A new address')
  await requirePassword(person, password)
  const other = await Person.findOne({ where: { email } })
  await inTransaction(async (transaction) => {
    const token = await makeLink(person.id, 'change-email', email, transaction)
    const letter = other ? emailTakenLetter(other.name) : confirmEmailLetter(person.name, token)
    await postLetter(email, letter, transaction)
    await postLetter(person.email, emailChangeNoticeLetter(person.name, email), transaction)
    await recordInBrands(person.id, { action: 'person.email-change-requested' }, transaction)
  })
}
