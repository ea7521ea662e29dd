import { lineObject } from '@/lib/activity/objects'
import { recordActivity } from '@/lib/activity/record'
import { authorize, type Actor } from '@/lib/auth/actor'
import { spend } from '@/lib/auth/rate-limits'
import { InvalidError, NotFoundError } from '@/lib/errors'
import { enqueue } from '@/lib/jobs/queue'
import { getLine } from '@/lib/lines/queries'
import { createOnce, inTransaction, Kit } from '@/models'

import { findCandidates } from './candidates'
import { reasonsAgainst } from './fitness'
import { canBuildKits } from './policy'
import type { RequestKitInput } from './schema'

/**
 * Has a kit built of combinations of a line, in the order given. The same `requestKey` again gives
 * the kit that was asked for the first time.
 * @throws NotFoundError when one of them is not a combination of the line (any more), InvalidError
 * when none of them can go in, TooManyError
 */
export async function requestKit(
  actor: Actor,
  { lineSlug, combinationIds, requestKey }: RequestKitInput,
): Promise<Kit> {
  authorize(actor, canBuildKits)
  await spend('kit', actor.brandId, 'Building kits')
  const { brandId } = actor
  return inTransaction(async (transaction) => {
    const line = await getLine(actor, lineSlug, transaction)
    const inLine = { brandId, lineId: line.id }
    const found = await findCandidates({ ...inLine, id: combinationIds }, transaction)
    if (found.length !== combinationIds.length) {
      throw new NotFoundError(
        'One of these combinations is not in the line any more. Nothing was begun: reload the page and choose again.',
      )
    }
    if (!found.some((combination) => reasonsAgainst(combination).length === 0)) {
      throw new InvalidError(
        'None of these combinations can go into a kit yet. See beside each what it is missing.',
      )
    }
    const made = await createOnce(
      Kit,
      { ...inLine, selection: combinationIds, createdById: actor.personId, requestKey },
      transaction,
    )
    const { row: kit, created } = made!
    if (created) {
      await enqueue('build-kit', { kitId: kit.id }, transaction)
      const after = { kit: kit.id, count: combinationIds.length }
      await recordActivity(
        actor,
        { action: 'kit.requested', object: lineObject(line), after },
        transaction,
      )
    }
    return kit
  })
}
