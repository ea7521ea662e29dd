import { photographObject } from '@/lib/activity/objects'
import { recordActivity } from '@/lib/activity/record'
import { authorize, type Actor } from '@/lib/auth/actor'
import { NotFoundError } from '@/lib/errors'
import { enqueue } from '@/lib/jobs/queue'
import { inTransaction, Photograph } from '@/models'

import { canRereadPhotograph } from './policy'
import type { PhotographIdInput } from './schema'

/**
 * Has a photograph read again: after a failure, or since the line's shades have changed. One that
 * is being read is left to it.
 * @throws NotFoundError
 */
export async function rereadPhotograph(
  actor: Actor,
  { photographId }: PhotographIdInput,
): Promise<void> {
  authorize(actor, canRereadPhotograph)
  const mine = { id: photographId, brandId: actor.brandId }
  await inTransaction(async (transaction) => {
    const [changed] = await Photograph.update(
      { state: 'waiting', failure: null },
      { where: { ...mine, state: ['ready', 'failed'] }, transaction },
    )
    const photograph = await Photograph.findOne({
      where: { ...mine, state: ['waiting', 'reading'] },
      attributes: ['id', 'title'],
      transaction,
    })
    if (!photograph) throw new NotFoundError()
    if (changed === 0) return
    await enqueue('read-photograph', { photographId }, transaction)
    const object = photographObject(photograph)
    await recordActivity(actor, { action: 'photograph.reread', object }, transaction)
  })
}
