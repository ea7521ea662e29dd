import { Op, type Transaction } from 'sequelize'

import { postLetter } from '@/lib/mail/post-letter'
import { Person, Session } from '@/models'

import { passwordChangedLetter } from './letters'

/**
 * Puts a new hash in place of the old one, ends every session but one, and tells the person by
 * letter.
 * @param kept the session that stays, or null for none
 */
export async function setPassword(
  { id, name, email }: { id: string; name: string; email: string },
  passwordHash: string,
  kept: string | null,
  transaction: Transaction,
): Promise<void> {
  await Person.update({ passwordHash }, { where: { id }, transaction })
  await Session.destroy({
    where: { personId: id, ...(kept && { id: { [Op.ne]: kept } }) },
    transaction,
  })
  await postLetter(email, passwordChangedLetter(name), transaction)
}
