import { photographObject } from '@/lib/activity/objects'
import { recordChanges } from '@/lib/activity/record'
import { authorize, type Actor } from '@/lib/auth/actor'
import { NotFoundError } from '@/lib/errors'
import { inTransaction, Photograph, updateVersioned } from '@/models'

import { canEditPhotograph } from './policy'
import type { UpdatePhotographInput } from './schema'

/**
 * Changes what is said about a photograph.
 * @throws NotFoundError, ConflictError when somebody saved in between
 */
export async function updatePhotograph(
  actor: Actor,
  { photographId: id, version, ...details }: UpdatePhotographInput,
): Promise<Photograph> {
  authorize(actor, canEditPhotograph)
  const { brandId } = actor
  return inTransaction(async (transaction) => {
    const photograph = await Photograph.findOne({ where: { id, brandId }, transaction })
    if (!photograph) throw new NotFoundError()
    await updateVersioned(Photograph, { id, brandId, version }, details, transaction)
    await recordChanges(
      actor,
      { action: 'photograph.updated', object: photographObject(photograph) },
      { before: photograph, after: details },
      transaction,
    )
    return photograph.reload({ transaction })
  })
}
