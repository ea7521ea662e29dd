import { ideaObject } from '@/lib/activity/objects'
import { recordActivity } from '@/lib/activity/record'
import type { Actor } from '@/lib/auth/actor'
import { ConflictError, InvalidError } from '@/lib/errors'
import { createOnce, NameSearch, type NameIdea } from '@/models'

import { changeNames, findIdeas } from './change-names'
import { NAME_LIMITS } from './constants'
import { dayOf } from './freeze'
import { canReadNames } from './policy'
import type { RecordSearchInput } from './schema'

/** The day begins first at UTC+14, in milliseconds. */
const EARLIEST_ZONE = 14 * 3_600_000

/**
 * Records who searched which register of marks for an idea, and when: a record, not a clearance.
 * The same `requestKey` again gives the search it recorded the first time.
 * @throws NotFoundError; InvalidError for a day that has not begun anywhere; ConflictError when the
 * record of the idea is full
 */
export async function recordSearch(
  actor: Actor,
  { lineSlug, ideaId, ...search }: RecordSearchInput,
): Promise<NameSearch> {
  return changeNames(actor, canReadNames, lineSlug, async (at) => {
    const { line, transaction } = at
    const { brandId, personId } = actor
    const [idea] = (await findIdeas(at, [ideaId])) as [NameIdea]
    if (search.searchedOn > dayOf(new Date(Date.now() + EARLIEST_ZONE)))
      throw new InvalidError('The day of the search is still to come. Nothing was recorded.', {
        searchedOn: ['Give a day up to today.'],
      })
    const values = { brandId, ideaId, recordedById: personId, ...search }
    const made = await createOnce(NameSearch, values, transaction)
    if (!made!.created) return made!.row
    const held = await NameSearch.count({ where: { brandId, ideaId }, transaction })
    if (held > NAME_LIMITS.perIdea)
      throw new ConflictError(
        `There are ${NAME_LIMITS.perIdea} searches recorded for “${idea.text}” already, and no more can be added.`,
      )
    const { register, outcome } = search
    await recordActivity(
      actor,
      {
        action: 'name.search-recorded',
        object: ideaObject(idea, line),
        after: { register, outcome },
      },
      transaction,
    )
    return made!.row
  })
}
