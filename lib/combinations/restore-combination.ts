import { combinationObject } from '@/lib/activity/objects'
import { recordActivity } from '@/lib/activity/record'
import { authorize, type Actor } from '@/lib/auth/actor'
import { inTransaction } from '@/models'

import { canDeleteCombination } from './policy'
import { loadCombination } from './queries'
import type { CombinationIdInput } from './schema'
import { touchBoard } from './touch-board'

/**
 * Brings a deleted combination back as it was; one that is not deleted stays as it is.
 * @throws NotFoundError
 */
export async function restoreCombination(
  actor: Actor,
  { combinationId }: CombinationIdInput,
): Promise<void> {
  authorize(actor, canDeleteCombination)
  await inTransaction(async (transaction) => {
    const combination = await loadCombination(actor, combinationId, { transaction, deleted: true })
    if (!combination.deletedAt) return
    await touchBoard(actor, combination.lineId, transaction)
    await combination.restore({ transaction })
    const object = combinationObject(combination)
    await recordActivity(actor, { action: 'combination.restored', object }, transaction)
  })
}
