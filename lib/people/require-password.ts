import { verifyPassword } from '@/lib/auth/password'
import { refund, spend } from '@/lib/auth/rate-limits'
import { InvalidError } from '@/lib/errors'
import { Person } from '@/models'

/**
 * Goes on if the password is the person's: what a session alone must not change asks for it. Wrong
 * ones count as wrong sign-ins do.
 * @throws InvalidError, TooManyError
 */
export async function requirePassword(
  { id, email }: { id: string; email: string },
  password: string,
): Promise<void> {
  await spend('sign-in-account', email, 'Your password')
  const person = await Person.unscoped().findByPk(id, { attributes: ['passwordHash'] })
  if (!(await verifyPassword(person?.passwordHash, password))) {
    const message = 'That is not your password. Nothing was changed.'
    throw new InvalidError(message, { password: [message] })
  }
  await refund('sign-in-account', email)
}
