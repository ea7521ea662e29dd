import { combinationObject } from '@/lib/activity/objects'
import { recordActivity } from '@/lib/activity/record'
import { authorize, type Actor } from '@/lib/auth/actor'
import { getLine } from '@/lib/lines/queries'
import { Combination, CombinationPlace, createOnce, inTransaction } from '@/models'

import { PLACE_ROLES, SKETCH_TITLE } from './constants'
import { topRank } from './lane-rank'
import { canEditCombination } from './policy'
import type { SketchCombinationInput } from './schema'
import { touchBoard } from './touch-board'

/**
 * Begins a combination: five empty places of equal shares, on top of the first lane. The same
 * `requestKey` again gives the one it began the first time.
 * @throws NotFoundError
 */
export async function sketchCombination(
  actor: Actor,
  { lineSlug, requestKey }: SketchCombinationInput,
): Promise<Combination> {
  authorize(actor, canEditCombination)
  const { brandId } = actor
  return inTransaction(async (transaction) => {
    const line = await getLine(actor, lineSlug, transaction)
    await touchBoard(actor, line.id, transaction)
    const inLine = { brandId, lineId: line.id }
    const rank = await topRank({ ...inLine, lane: 'sketched' }, transaction)
    const made = await createOnce(
      Combination,
      { ...inLine, title: SKETCH_TITLE, rank, createdById: actor.personId, requestKey },
      transaction,
    )
    const { row: combination, created } = made!
    if (created) {
      await CombinationPlace.bulkCreate(
        PLACE_ROLES.map((role, at) => ({
          brandId,
          combinationId: combination.id,
          place: at + 1,
          role,
          shadeId: null,
          share: 1 / PLACE_ROLES.length,
        })),
        { transaction },
      )
      await recordActivity(
        actor,
        {
          action: 'combination.sketched',
          object: combinationObject(combination),
          after: { line: line.name },
        },
        transaction,
      )
    }
    return combination
  })
}
