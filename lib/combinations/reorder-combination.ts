import { authorize, type Actor } from '@/lib/auth/actor'
import { NotFoundError } from '@/lib/errors'
import { Combination, CombinationPlace, inTransaction, updateVersioned } from '@/models'

import { canReorderCombination } from './policy'
import { loadCombination } from './queries'
import type { ReorderCombinationInput } from './schema'

/**
 * Puts a combination's five shades in a new order; each keeps its share.
 * @throws NotFoundError when one of the shades is not in it; ConflictError when somebody saved in
 * between
 */
export async function reorderCombination(
  actor: Actor,
  { combinationId, version, shadeIds }: ReorderCombinationInput,
): Promise<Combination> {
  authorize(actor, canReorderCombination)
  const { brandId } = actor
  return inTransaction(async (transaction) => {
    const combination = await loadCombination(actor, combinationId, { transaction })
    await updateVersioned(Combination, { id: combination.id, brandId, version }, {}, transaction)
    for (const [at, shadeId] of shadeIds.entries()) {
      const [moved] = await CombinationPlace.update(
        { place: at + 1 },
        { where: { brandId, combinationId, shadeId }, transaction },
      )
      if (moved !== 1) throw new NotFoundError('One of these shades is not in the combination.')
    }
    return combination.reload({ transaction })
  })
}
