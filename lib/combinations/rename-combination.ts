import { combinationObject } from '@/lib/activity/objects'
import { recordChanges } from '@/lib/activity/record'
import { authorize, type Actor } from '@/lib/auth/actor'
import { Combination, inTransaction, updateVersioned } from '@/models'

import { canRenameCombination } from './policy'
import { loadCombination } from './queries'
import type { RenameCombinationInput } from './schema'
import { touchBoard } from './touch-board'

/**
 * Changes a combination's title.
 * @throws NotFoundError, ConflictError when somebody saved in between
 */
export async function renameCombination(
  actor: Actor,
  { combinationId, version, title }: RenameCombinationInput,
): Promise<Combination> {
  authorize(actor, canRenameCombination)
  return inTransaction(async (transaction) => {
    const combination = await loadCombination(actor, combinationId, { transaction })
    await touchBoard(actor, combination.lineId, transaction)
    const row = { id: combination.id, brandId: actor.brandId, version }
    await updateVersioned(Combination, row, { title }, transaction)
    await recordChanges(
      actor,
      { action: 'combination.renamed', object: combinationObject(combination) },
      { before: combination, after: { title } },
      transaction,
    )
    return combination.reload({ transaction })
  })
}
