import type { Transaction } from 'sequelize'

import { changesOf } from '@/lib/activity/changes-of'
import { combinationObject } from '@/lib/activity/objects'
import { recordActivity } from '@/lib/activity/record'
import { authorize, type Actor } from '@/lib/auth/actor'
import { NotFoundError } from '@/lib/errors'
import { shadeLabel } from '@/lib/shades/present'
import {
  Combination,
  CombinationPlace,
  inTransaction,
  Photograph,
  Shade,
  updateVersioned,
} from '@/models'

import { canEditCombination, canRenameCombination } from './policy'
import { loadCombination } from './queries'
import type { SaveCombinationInput } from './schema'
import { touchBoard } from './touch-board'

/**
 * Saves an open combination. A title alone needs less than the whole. A shade that was deleted from
 * the line since may be put back to where it was, so that undoing is never refused.
 * @throws NotFoundError when the photograph or a shade is not of the line; ConflictError when
 * somebody saved in between
 */
export async function saveCombination(
  actor: Actor,
  { combinationId, version, title, story, photographId, places }: SaveCombinationInput,
): Promise<Combination> {
  authorize(actor, canRenameCombination)
  if (story !== undefined || photographId !== undefined || places) {
    authorize(actor, canEditCombination)
  }
  const { brandId } = actor
  return inTransaction(async (transaction) => {
    const combination = await loadCombination(actor, combinationId, { transaction })
    await touchBoard(actor, combination.lineId, transaction)
    if (photographId && photographId !== combination.photographId) {
      await requirePhotograph(combination, photographId, transaction)
    }
    const row = { id: combination.id, brandId, version }
    await updateVersioned(Combination, row, { title, story, photographId }, transaction)
    const before = await inWords(combination, transaction)
    const object = combinationObject(combination)
    if (places) await putPlaces(combination, places, transaction)

    const saved = await combination.reload({ transaction })
    const changed = changesOf(before, await inWords(saved, transaction))
    if (changed) {
      const action =
        Object.keys(changed.after).join() === 'title' ? 'combination.renamed' : 'combination.edited'
      await recordActivity(actor, { action, object, ...changed }, transaction)
    }
    return saved
  })
}

async function requirePhotograph(
  { brandId, lineId }: Combination,
  id: string,
  transaction: Transaction,
): Promise<void> {
  const found = await Photograph.count({ where: { brandId, lineId, id }, transaction })
  if (!found) throw new NotFoundError('This photograph is not in the line any more.')
}

async function putPlaces(
  { id: combinationId, brandId, lineId }: Combination,
  places: NonNullable<SaveCombinationInput['places']>,
  transaction: Transaction,
): Promise<void> {
  const ids = places.flatMap(({ shadeId }) => shadeId ?? [])
  const found = await Shade.count({
    where: { brandId, lineId, id: ids },
    paranoid: false,
    transaction,
  })
  if (found !== ids.length) throw new NotFoundError('One of these shades is not of the line.')
  for (const [at, { shadeId, share, role, locked }] of places.entries()) {
    await CombinationPlace.update(
      { shadeId, share, role, locked },
      { where: { brandId, combinationId, place: at + 1 }, transaction },
    )
  }
}

/** What the record compares: the shades by name, since their ids say nothing to a reader. */
async function inWords(
  { id: combinationId, brandId, title, story, photographId }: Combination,
  transaction: Transaction,
) {
  const places = await CombinationPlace.findAll({
    where: { brandId, combinationId },
    include: [{ model: Shade, as: 'shade', attributes: ['number', 'name'], paranoid: false }],
    order: [['place', 'ASC']],
    transaction,
  })
  const photograph = photographId
    ? await Photograph.findOne({
        attributes: ['title'],
        where: { brandId, id: photographId },
        paranoid: false,
        transaction,
      })
    : null
  return {
    title,
    story,
    photograph: photograph?.title ?? null,
    order: places.map(({ shade }) => (shade ? shadeLabel(shade) : 'empty')),
    shares: places.map(({ share }) => `${Math.round(share * 100)} %`),
    roles: places.map(({ role }) => role),
    locked: places.flatMap(({ locked, place }) => (locked ? [place] : [])),
  }
}
