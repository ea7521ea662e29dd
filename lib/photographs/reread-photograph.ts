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
    if (changed === 1) return enqueue('read-photograph', { photographId }, transaction)
    const being = { ...mine, state: ['waiting', 'reading'] }
    if ((await Photograph.count({ where: being, transaction })) === 0) throw new NotFoundError()
  })
}
