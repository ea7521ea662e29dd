import type { Transaction } from 'sequelize'

import { combinationObject } from '@/lib/activity/objects'
import { recordChanges } from '@/lib/activity/record'
import { authorize, type Actor } from '@/lib/auth/actor'
import { NotFoundError } from '@/lib/errors'
import { shadeLabel } from '@/lib/shades/present'
import { Combination, CombinationPlace, inTransaction, Shade, updateVersioned } from '@/models'

import { canReorderCombination } from './policy'
import { loadCombination } from './queries'
import type { ReorderCombinationInput } from './schema'
import { touchBoard } from './touch-board'

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
    await touchBoard(actor, combination.lineId, transaction)
    await updateVersioned(Combination, { id: combination.id, brandId, version }, {}, transaction)
    const before = await listPlaces(actor, combinationId, transaction)
    for (const [at, shadeId] of shadeIds.entries()) {
      const [moved] = await CombinationPlace.update(
        { place: at + 1 },
        { where: { brandId, combinationId, shadeId }, transaction },
      )
      if (moved !== 1) throw new NotFoundError('One of these shades is not in the combination.')
    }
    const after = await listPlaces(actor, combinationId, transaction)
    await recordChanges(
      actor,
      { action: 'combination.reordered', object: combinationObject(combination) },
      { before: { order: before }, after: { order: after } },
      transaction,
    )
    return combination.reload({ transaction })
  })
}

/** What the five are called, in order. */
async function listPlaces(
  { brandId }: Actor,
  combinationId: string,
  transaction: Transaction,
): Promise<string[]> {
  const places = await CombinationPlace.findAll({
    where: { brandId, combinationId },
    include: [{ model: Shade, as: 'shade', attributes: ['number', 'name'], paranoid: false }],
    order: [['place', 'ASC']],
    transaction,
  })
  return places.map(({ shade }) => shadeLabel(shade!))
}
