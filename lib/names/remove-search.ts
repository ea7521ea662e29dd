import { ideaObject } from '@/lib/activity/objects'
import { recordActivity } from '@/lib/activity/record'
import type { Actor } from '@/lib/auth/actor'
import { ForbiddenError, NotFoundError } from '@/lib/errors'
import { NameIdea, NameSearch } from '@/models'

import { changeNames } from './change-names'
import { canReadNames } from './policy'
import type { RemoveSearchInput } from './schema'

/**
 * Removes a search from the record: whoever recorded it, or an owner. That it stood there stays in
 * the activity, but for who had searched, since that names nobody.
 * @throws NotFoundError, ForbiddenError for somebody else's
 */
export async function removeSearch(
  actor: Actor,
  { lineSlug, searchId }: RemoveSearchInput,
): Promise<void> {
  await changeNames(actor, canReadNames, lineSlug, async ({ line, transaction }) => {
    const { brandId, personId, role } = actor
    const search = await NameSearch.findOne({ where: { brandId, id: searchId }, transaction })
    const idea =
      search &&
      (await NameIdea.findOne({
        where: { brandId, lineId: line.id, id: search.ideaId },
        transaction,
      }))
    if (!idea) throw new NotFoundError('This search is not recorded any more.')
    if (role !== 'owner' && search.recordedById !== personId)
      throw new ForbiddenError(
        'Somebody else recorded this search. They or an owner can remove it.',
      )
    await search.destroy({ transaction })
    const { register, searchedOn, outcome } = search
    await recordActivity(
      actor,
      {
        action: 'name.search-removed',
        object: ideaObject(idea, line),
        before: { register, searchedOn, outcome },
      },
      transaction,
    )
  })
}
