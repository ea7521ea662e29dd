import { combinationObject } from '@/lib/activity/objects'
import { recordActivity } from '@/lib/activity/record'
import { authorize, type Actor } from '@/lib/auth/actor'
import { NotFoundError } from '@/lib/errors'
import { getLine } from '@/lib/lines/queries'
import { shadeLabel } from '@/lib/shades/present'
import {
  Combination,
  CombinationPlace,
  createOnce,
  inTransaction,
  Photograph,
  Shade,
} from '@/models'

import { PLACE_ROLES } from './constants'
import { topRank } from './lane-rank'
import { canKeepCombination } from './policy'
import type { KeepCombinationInput } from './schema'
import { touchBoard } from './touch-board'

/**
 * Keeps five shades of a line, in the order given, as they were matched to a photograph. The same
 * `requestKey` again gives the combination it made the first time.
 * @throws NotFoundError when the photograph or one of the shades is not in the line (any more)
 */
export async function keepCombination(
  actor: Actor,
  { lineSlug, photographId, reading, title, places, requestKey }: KeepCombinationInput,
): Promise<Combination> {
  authorize(actor, canKeepCombination)
  const { brandId } = actor
  return inTransaction(async (transaction) => {
    const line = await getLine(actor, lineSlug, transaction)
    const inLine = { brandId, lineId: line.id }
    const photograph = await Photograph.findOne({
      where: { ...inLine, id: photographId },
      attributes: ['id', 'title'],
      transaction,
    })
    if (!photograph) throw new NotFoundError()
    const shadeIds = places.map(({ shadeId }) => shadeId)
    const shades = await Shade.findAll({
      attributes: ['id', 'number', 'name'],
      where: { ...inLine, id: shadeIds },
      transaction,
    })
    if (shades.length !== places.length) {
      throw new NotFoundError(
        'One of these five is not a shade of the line any more. Nothing was kept: read the photograph again, then keep the five it finds.',
      )
    }
    await touchBoard(actor, line.id, transaction)
    const rank = await topRank({ ...inLine, lane: 'sketched' }, transaction)
    const made = await createOnce(
      Combination,
      {
        ...inLine,
        title,
        photographId,
        reading,
        rank,
        createdById: actor.personId,
        requestKey,
      },
      transaction,
    )
    const { row: combination, created } = made!
    if (created) {
      await CombinationPlace.bulkCreate(
        places.map(({ shadeId, share }, at) => ({
          brandId,
          combinationId: combination.id,
          place: at + 1,
          shadeId,
          share,
          role: PLACE_ROLES[at]!,
        })),
        { transaction },
      )
      const labels = new Map(shades.map((shade) => [shade.id, shadeLabel(shade)]))
      const order = shadeIds.map((id) => labels.get(id))
      await recordActivity(
        actor,
        {
          action: 'combination.kept',
          object: combinationObject(combination),
          after: { line: line.name, photograph: photograph.title, reading, order },
        },
        transaction,
      )
    }
    return combination
  })
}
