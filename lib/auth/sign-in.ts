import { TooManyError } from '@/lib/errors'
import { recordInBrands } from '@/lib/people/record-in-brands'
import { postSecondFactorLetter } from '@/lib/people/second-factor-letter'
import { inTransaction, Person, Session } from '@/models'

import { inAnswerTime } from './answer-time'
import { hashPassword, isOutdated, verifyPassword } from './password'
import { forgive, refund, spend } from './rate-limits'
import { countRecoveryCodes, takeRecoveryCode, takeTotp } from './second-factor'
import { SESSION_LIFETIME } from './sessions'

/** What somebody signs in with. */
export interface SignInAttempt {
  email: string
  password: string
  /** A one-time or a recovery code; asked for once the password fits. */
  code?: string
  /** The network address it comes from, and what the browser calls itself. */
  address: string
  userAgent: string
}

/** How an attempt ended. */
export type SignInOutcome =
  | { kind: 'opened'; sessionId: string; personId: string }
  | { kind: 'refused' }
  | { kind: 'code-wanted' }
  | { kind: 'code-refused' }
  | { kind: 'too-many'; retryAfter: number }

/**
 * Checks e-mail, password and, where one is in use, the second factor, and opens a session. Every
 * wrong attempt counts against the account and against the address; a right one takes its counts
 * back. The activity record of each of the person's brands tells of it.
 */
export async function signIn(attempt: SignInAttempt): Promise<SignInOutcome> {
  const { email, password, code, address } = attempt
  try {
    await spend('sign-in-address', address)
    await spend('sign-in-account', email)
  } catch (error) {
    if (error instanceof TooManyError) return { kind: 'too-many', retryAfter: error.retryAfter }
    throw error
  }
  const person = await inAnswerTime(async () => {
    const found = await Person.unscoped().findOne({ where: { email } })
    if (found && (await verifyPassword(found.passwordHash, password))) return found
    if (found) await tellBrands(found.id, 'session.refused')
    else await verifyPassword(undefined, password)
    return null
  })
  if (!person) return { kind: 'refused' }
  if (person.totpConfirmedAt) {
    if (!code) {
      // The account's wrong codes still count: asking for a code takes back only itself.
      await refund('sign-in-account', email)
      await refund('sign-in-address', address)
      return { kind: 'code-wanted' }
    }
    if (!(await takeTotp(person, code)) && !(await spendRecoveryCode(person, code))) {
      await tellBrands(person.id, 'session.refused')
      return { kind: 'code-refused' }
    }
  }
  await settle(attempt)
  if (isOutdated(person.passwordHash)) {
    await person.update({ passwordHash: await hashPassword(password) })
  }
  return { kind: 'opened', personId: person.id, sessionId: await openSession(person.id, attempt) }
}

/** Opens a session for somebody who has proved who they are. @returns its id */
export async function openSession(
  personId: string,
  { address, userAgent }: Pick<SignInAttempt, 'address' | 'userAgent'>,
): Promise<string> {
  const session = await Session.create({
    personId,
    expiresAt: new Date(Date.now() + SESSION_LIFETIME),
    address,
    userAgent: userAgent.slice(0, 300),
  })
  await tellBrands(personId, 'session.opened')
  return session.id
}

async function settle({ email, address }: SignInAttempt): Promise<void> {
  await forgive('sign-in-account', email)
  await refund('sign-in-address', address)
}

function tellBrands(personId: string, action: 'session.opened' | 'session.refused'): Promise<void> {
  return inTransaction((transaction) => recordInBrands(personId, { action }, transaction))
}

/** Takes a recovery code and says so by letter: who still has the authenticator needs none. */
function spendRecoveryCode(person: Person, code: string): Promise<boolean> {
  return inTransaction(async (transaction) => {
    if (!(await takeRecoveryCode(person.id, code, transaction))) return false
    const left = await countRecoveryCodes(person.id, transaction)
    const entry = { action: 'person.recovery-code-used', after: { left } } as const
    await recordInBrands(person.id, entry, transaction)
    await postSecondFactorLetter(person, { kind: 'recovery-code-used', left }, transaction)
    return true
  })
}
