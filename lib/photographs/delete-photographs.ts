import { Op, UniqueConstraintError } from 'sequelize'

import { recordedPhotographs } from '@/lib/activity/objects'
import { recordActivity } from '@/lib/activity/record'
import { authorize, type Actor } from '@/lib/auth/actor'
import { ConflictError, NotFoundError } from '@/lib/errors'
import { enqueue } from '@/lib/jobs/queue'
import { inTransaction, Photograph } from '@/models'

import { canDeletePhotographs } from './policy'
import { UNDO_WINDOW } from './constants'
import type { PhotographIdsInput } from './schema'

const NAMED = { attributes: ['id', 'title'] }

/**
 * Deletes photographs; for UNDO_WINDOW they can be brought back. Combinations made from them stay.
 * All or none.
 * @throws NotFoundError when one of them is not there
 */
export async function deletePhotographs(
  actor: Actor,
  { photographIds }: PhotographIdsInput,
): Promise<{ count: number }> {
  authorize(actor, canDeletePhotographs)
  return inTransaction(async (transaction) => {
    const where = { id: photographIds, brandId: actor.brandId, state: { [Op.ne]: 'pending' } }
    const photographs = await Photograph.findAll({ ...NAMED, where, transaction })
    const count = await Photograph.destroy({ where, transaction })
    if (count !== new Set(photographIds).size) throw new NotFoundError()
    const recorded = recordedPhotographs(photographs)
    await recordActivity(actor, { action: 'photograph.deleted', ...recorded }, transaction)
    return { count }
  })
}

/**
 * Brings deleted photographs back. All or none; one that was not deleted counts as brought back.
 * @throws NotFoundError when one of them is swept, ConflictError when its file was added anew
 */
export async function restorePhotographs(
  actor: Actor,
  { photographIds }: PhotographIdsInput,
): Promise<{ count: number }> {
  authorize(actor, canDeletePhotographs)
  const { brandId } = actor
  const mine = { id: photographIds, brandId, state: { [Op.ne]: 'pending' } }
  try {
    return await inTransaction(async (transaction) => {
      const where = { ...mine, deletedAt: { [Op.gt]: new Date(Date.now() - UNDO_WINDOW) } }
      const deleted = await Photograph.findAll({ ...NAMED, where, paranoid: false, transaction })
      await Photograph.restore({ where, transaction })
      const count = await Photograph.count({ where: mine, transaction })
      if (count !== new Set(photographIds).size) throw new NotFoundError()
      // A job that met them deleted left them as they were: nobody else would read them.
      const unread = await Photograph.findAll({
        attributes: ['id'],
        where: { ...mine, state: ['waiting', 'reading'] },
        transaction,
      })
      for (const { id } of unread)
        await enqueue('read-photograph', { photographId: id }, transaction)
      if (deleted.length > 0) {
        const recorded = recordedPhotographs(deleted)
        await recordActivity(actor, { action: 'photograph.restored', ...recorded }, transaction)
      }
      return { count }
    })
  } catch (error) {
    if (!(error instanceof UniqueConstraintError)) throw error
    throw new ConflictError('The same file was added again meanwhile, so it is there already.')
  }
}
