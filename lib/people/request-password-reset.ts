import { inAnswerTime } from '@/lib/auth/answer-time'
import { spend } from '@/lib/auth/rate-limits'
import { postLetter } from '@/lib/mail/post-letter'
import { inTransaction, Person } from '@/models'

import { noAccountLetter, resetPasswordLetter } from './letters'
import { makeLink } from './links'
import type { RequestPasswordResetInput } from './schema'

/**
 * Sends a letter to whoever has forgotten their password: a link to choose a new one or, where
 * nobody has the address, word of that. The answer and its time are the same either way.
 * @throws TooManyError
 */
export async function requestPasswordReset(
  { email }: RequestPasswordResetInput,
  { address }: { address: string },
): Promise<void> {
  await spend('reset-address', address, 'A new password')
  await spend('reset-email', email, 'A new password')
  await inAnswerTime(() => sendLetter(email))
}

async function sendLetter(email: string): Promise<void> {
  const person = await Person.findOne({ where: { email } })
  await inTransaction(async (transaction) => {
    const letter = person
      ? resetPasswordLetter(
          person.name,
          await makeLink(person.id, 'reset-password', null, transaction),
        )
      : noAccountLetter()
    await postLetter(email, letter, transaction)
  })
}
