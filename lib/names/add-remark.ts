import { ideaObject } from '@/lib/activity/objects'
import { recordActivity } from '@/lib/activity/record'
import type { Actor } from '@/lib/auth/actor'
import { ConflictError } from '@/lib/errors'
import { createOnce, NameRemark, type NameIdea } from '@/models'

import { changeNames, findIdeas } from './change-names'
import { NAME_LIMITS } from './constants'
import { canReadNames } from './policy'
import type { AddRemarkInput } from './schema'

/**
 * Adds a remark to the talk about an idea, whatever its state. The same `requestKey` again gives
 * the remark it made the first time.
 * @throws NotFoundError, ConflictError when the talk is full
 */
export async function addRemark(
  actor: Actor,
  { lineSlug, ideaId, text, requestKey }: AddRemarkInput,
): Promise<NameRemark> {
  return changeNames(actor, canReadNames, lineSlug, async (at) => {
    const { line, transaction } = at
    const { brandId, personId } = actor
    const [idea] = (await findIdeas(at, [ideaId])) as [NameIdea]
    const values = { brandId, ideaId, personId, text, requestKey }
    const made = await createOnce(NameRemark, values, transaction)
    const remark = made!.row
    if (!made!.created) return remark
    const said = await NameRemark.count({ where: { brandId, ideaId }, transaction })
    if (said > NAME_LIMITS.perIdea)
      throw new ConflictError(
        `There are ${NAME_LIMITS.perIdea} remarks on “${idea.text}” already, and no more can be added. Yours was not kept.`,
      )
    await recordActivity(
      actor,
      { action: 'name.remarked', object: ideaObject(idea, line) },
      transaction,
    )
    return remark
  })
}
