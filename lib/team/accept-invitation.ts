import type { SignedInPerson } from '@/lib/auth/sessions'
import { ConflictError } from '@/lib/errors'
import { Brand, inTransaction, Membership } from '@/models'

import { joinBrand, lockByToken } from './join-brand'
import { requireOpen, withinInvitedBrand } from './queries'
import type { AcceptInvitationInput } from './schema'

/**
 * Makes the signed-in person a member of the brand that invited their address. Again, once joined,
 * gives the same answer.
 * @throws NotFoundError when the invitation cannot be accepted
 * @throws ConflictError when it is for another address
 */
export function acceptInvitation(
  person: SignedInPerson,
  { token }: AcceptInvitationInput,
): Promise<{ brandSlug: string }> {
  return withinInvitedBrand(token, (brandId, tokenHash) =>
    inTransaction(async (transaction) => {
      const brand = await Brand.findByPk(brandId, { rejectOnEmpty: true, transaction })
      const answer = { brandSlug: brand.slug }
      const invitation = await lockByToken(brandId, tokenHash, transaction)
      const where = { brandId, personId: person.id }
      if (invitation?.acceptedAt && (await Membership.count({ where, transaction })) > 0) {
        return answer
      }
      requireOpen(invitation)
      if (invitation.email !== person.email) {
        throw new ConflictError(
          `This invitation is for ${invitation.email}, and you are signed in as ${person.email}. Sign out, then open the invitation again.`,
        )
      }
      await joinBrand(invitation, person.id, transaction)
      return answer
    }),
  )
}
