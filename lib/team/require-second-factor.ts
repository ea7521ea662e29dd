import { z } from 'zod'

import { recordActivity } from '@/lib/activity/record'
import { allow, authorize, type Actor } from '@/lib/auth/actor'
import { ConflictError, NotFoundError } from '@/lib/errors'
import { Brand, inTransaction, Person } from '@/models'

/** Decides whether the brand asks everybody for a second factor. */
export const canRequireSecondFactor = allow('owner')

/** Asks everybody of the brand for a second factor, or no longer. */
export const requireSecondFactorSchema = z.strictObject({ required: z.boolean() })

/**
 * Asks everybody of the brand for a second factor, or no longer. From the next request on, who has
 * none is led to set one up and sees nothing of the brand before.
 * @throws ForbiddenError, ConflictError when the owner who asks has none themselves
 */
export async function requireSecondFactor(
  actor: Actor,
  { required }: z.output<typeof requireSecondFactorSchema>,
): Promise<{ required: boolean }> {
  authorize(actor, canRequireSecondFactor)
  return inTransaction(async (transaction) => {
    const lock = transaction.LOCK.UPDATE
    const brand = await Brand.findByPk(actor.brandId, { lock, transaction })
    if (!brand) throw new NotFoundError()
    const person = await Person.findByPk(actor.personId, { transaction })
    if (required && !person?.totpConfirmedAt) {
      throw new ConflictError(
        'Set up a second factor of your own first: otherwise you would be the first to be shut out.',
      )
    }
    const before = brand.secondFactorRequired
    if (before === required) return { required }
    await brand.update({ secondFactorRequired: required }, { transaction })
    await recordActivity(
      actor,
      {
        action: 'brand.second-factor-requirement-changed',
        object: { kind: 'brand', id: brand.id, label: brand.name },
        before: { required: before },
        after: { required },
      },
      transaction,
    )
    return { required }
  })
}
