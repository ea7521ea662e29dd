import { combinationObject } from '@/lib/activity/objects'
import { recordActivity } from '@/lib/activity/record'
import { authorize, type Actor } from '@/lib/auth/actor'
import { inTransaction } from '@/models'

import { canDeleteCombination } from './policy'
import { loadCombination } from './queries'
import type { CombinationIdInput } from './schema'
import { touchBoard } from './touch-board'

/**
 * Takes a combination out of every list; `restoreCombination` brings it back.
 * @throws NotFoundError
 */
export async function deleteCombination(
  actor: Actor,
  { combinationId }: CombinationIdInput,
): Promise<void> {
  authorize(actor, canDeleteCombination)
  await inTransaction(async (transaction) => {
    const combination = await loadCombination(actor, combinationId, { transaction })
    await touchBoard(actor, combination.lineId, transaction)
    await combination.destroy({ transaction })
    const object = combinationObject(combination)
    await recordActivity(actor, { action: 'combination.deleted', object }, transaction)
  })
}
