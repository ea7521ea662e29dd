import { UniqueConstraintError } from 'sequelize'

import { postLetter } from '@/lib/mail/post-letter'
import { inTransaction, Person } from '@/models'

import { emailChangedLetter } from './letters'
import { deadLink, findLink, useLink } from './links'
import { recordInBrands } from './record-in-brands'
import type { ConfirmEmailChangeInput } from './schema'

/**
 * Gives the person of a link the address that the link was sent to; nobody is signed in by it.
 * @throws InvalidError when the link is no longer good, or the address has an account meanwhile
 */
export async function confirmEmailChange({ token }: ConfirmEmailChangeInput): Promise<void> {
  const link = await findLink('change-email', token)
  if (!link?.person || !link.newEmail) throw deadLink()
  const { person, newEmail } = link
  try {
    await inTransaction(async (transaction) => {
      await useLink(link, transaction)
      await Person.update({ email: newEmail }, { where: { id: person.id }, transaction })
      await postLetter(person.email, emailChangedLetter(person.name), transaction)
      await recordInBrands(person.id, { action: 'person.email-changed' }, transaction)
    })
  } catch (error) {
    if (error instanceof UniqueConstraintError) throw deadLink()
    throw error
  }
}
