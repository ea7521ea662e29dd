import { QueryTypes } from 'sequelize'

import type { SignedInPerson } from '@/lib/auth/sessions'
import { ConflictError, InvalidError } from '@/lib/errors'
import { postLetter } from '@/lib/mail/post-letter'
import { lockMembers } from '@/lib/team/members'
import { Brand, Combination, inTransaction, Person, sequelize, SignUp, speakFor } from '@/models'

import { accountClosedLetter } from './letters'
import { fateOf } from './queries'
import { recordInBrands } from './record-in-brands'
import { requirePassword } from './require-password'
import type { CloseAccountInput } from './schema'

/**
 * Closes an account: the person's data go, their sessions end, and what they made in brands that
 * others are of stays under "a former member". A brand that nobody else is of goes with all that is
 * in it, if its name was typed; its photographs' objects are swept (lib/photographs/sweep.ts).
 * @throws ConflictError while a brand with others in it would be left without an owner,
 *   InvalidError when the password or a brand's name is not right, TooManyError
 */
export async function closeAccount(
  person: SignedInPerson,
  { password, brandNames }: CloseAccountInput,
): Promise<void> {
  await requirePassword(person, password)
  const { id, email } = person
  await inTransaction(async (transaction) => {
    const removed: { brandId: string; brandName: string }[] = []
    for (const { brandId } of person.memberships) {
      await speakFor({ brandId, personId: id }, transaction)
      // Held until the end, so that the other owner cannot go at the same moment.
      const brand = await Brand.findByPk(brandId, { lock: transaction.LOCK.UPDATE, transaction })
      const members = await lockMembers(brandId, transaction)
      // It was removed, or they left it, since the page was asked for.
      if (!brand || members.every(({ personId }) => personId !== id)) continue
      const fate = fateOf(id, members)
      if (fate === 'ownerless') {
        throw new ConflictError(
          `You are the last owner of ${brand.name}, and others are of it. Make one of them an owner, or remove them, on its team page; then close your account.`,
        )
      }
      if (fate === 'removed') removed.push({ brandId, brandName: brand.name })
    }
    const untyped = removed.find(({ brandName }) => !brandNames.includes(brandName))
    if (untyped) {
      const message = `Type the name of the brand that goes with your account: ${untyped.brandName}.`
      throw new InvalidError(message, { brandNames: [message] })
    }
    await recordInBrands(id, { action: 'person.account-closed' }, transaction)
    for (const { brandId } of removed) {
      await speakFor({ brandId, personId: id }, transaction)
      // A shade that a combination holds cannot go before it.
      await Combination.destroy({ where: { brandId }, force: true, transaction })
      await Brand.destroy({ where: { id: brandId }, transaction })
    }
    await speakFor({ personId: id }, transaction)
    await sequelize().query('SELECT forget_person()', { type: QueryTypes.SELECT, transaction })
    await SignUp.destroy({ where: { email }, transaction })
    await Person.destroy({ where: { id }, transaction })
    await postLetter(
      email,
      accountClosedLetter(removed.map(({ brandName }) => brandName)),
      transaction,
    )
  })
}
