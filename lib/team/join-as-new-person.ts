import { UniqueConstraintError } from 'sequelize'

import { hashPassword } from '@/lib/auth/password'
import { ConflictError, InvalidError } from '@/lib/errors'
import { checkPassword } from '@/lib/people/password-rules'
import { Brand, inTransaction, Invitation, Person } from '@/models'

import { joinBrand, lockByToken } from './join-brand'
import { requireOpen, withinInvitedBrand } from './queries'
import type { JoinAsNewPersonInput } from './schema'

/**
 * Makes an account for the invited address, which the letter has proved, and a member of it. It
 * signs nobody in: that is done with the new password, as ever.
 * @throws NotFoundError when the invitation cannot be accepted
 * @throws InvalidError when the password will not do
 * @throws ConflictError when the address has an account
 */
export function joinAsNewPerson({
  token,
  name,
  password,
}: JoinAsNewPersonInput): Promise<{ email: string; brandSlug: string }> {
  return withinInvitedBrand(token, async (brandId, tokenHash) => {
    const offered = await Invitation.findOne({ where: { brandId, tokenHash } })
    if (offered?.acceptedAt) {
      throw new ConflictError('This invitation has been used. If that was you, sign in.')
    }
    requireOpen(offered)
    const { email } = offered
    const problem = await checkPassword(password, { email, name })
    if (problem) throw new InvalidError(problem, { password: [problem] })
    const passwordHash = await hashPassword(password)
    const work = inTransaction(async (transaction) => {
      const invitation = await lockByToken(brandId, tokenHash, transaction)
      requireOpen(invitation)
      const person = await Person.create({ email, name, passwordHash }, { transaction })
      await joinBrand(invitation, person.id, transaction)
      const brand = await Brand.findByPk(brandId, { rejectOnEmpty: true, transaction })
      return { email, brandSlug: brand.slug }
    })
    return work.catch((error: unknown) => {
      if (!(error instanceof UniqueConstraintError)) throw error
      throw new ConflictError('This address has an account. Sign in with it to join.')
    })
  })
}
