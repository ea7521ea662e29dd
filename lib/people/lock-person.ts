import type { Transaction } from 'sequelize'

import { ConflictError, UnauthenticatedError } from '@/lib/errors'
import { Person } from '@/models'

/**
 * A person's whole row, secrets among it, locked until the transaction ends.
 * @throws UnauthenticatedError when the account was closed meanwhile
 */
export async function lockPerson(id: string, transaction: Transaction): Promise<Person> {
  const lock = transaction.LOCK.UPDATE
  const person = await Person.unscoped().findByPk(id, { lock, transaction })
  if (!person) throw new UnauthenticatedError()
  return person
}

/**
 * The same of somebody with a second factor in use.
 * @throws ConflictError when none is, UnauthenticatedError
 */
export async function lockWithSecondFactor(id: string, transaction: Transaction): Promise<Person> {
  const person = await lockPerson(id, transaction)
  if (!person.totpConfirmedAt) throw new ConflictError('You have no second factor in use.')
  return person
}
