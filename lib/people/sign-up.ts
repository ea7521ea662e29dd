import { hashPassword } from '@/lib/auth/password'
import { spend } from '@/lib/auth/rate-limits'
import { makeToken } from '@/lib/auth/seal'
import { InvalidError } from '@/lib/errors'
import { postLetter } from '@/lib/mail/post-letter'
import { inTransaction, Person, SignUp } from '@/models'

import { accountExistsLetter, confirmSignUpLetter } from './letters'
import { linkEnd } from './links'
import { checkPassword } from './password-rules'
import type { SignUpInput } from './schema'

/**
 * Sends a letter to whoever wants an account: a link that makes it or, where the address has one,
 * word of that. The answer and the work are the same either way; nothing is made yet.
 * @throws InvalidError when the password cannot be taken, TooManyError
 */
export async function signUp(
  { name, email, password, brandName }: SignUpInput,
  { address }: { address: string },
): Promise<void> {
  const message = await checkPassword(password, { name: `${name} ${brandName}`, email })
  if (message) throw new InvalidError(message, { password: [message] })
  await spend('sign-up-address', address, 'An account')
  await spend('sign-up-email', email, 'An account')
  const passwordHash = await hashPassword(password)
  const person = await Person.findOne({ where: { email } })
  await inTransaction(async (transaction) => {
    if (person) return postLetter(email, accountExistsLetter(person.name), transaction)
    const { token, tokenHash } = makeToken()
    await SignUp.create(
      { name, email, brandName, passwordHash, tokenHash, expiresAt: linkEnd() },
      { transaction },
    )
    await postLetter(email, confirmSignUpLetter({ name, brandName }, token), transaction)
  })
}
