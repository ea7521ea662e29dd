import { recordedIdeas } from '@/lib/activity/objects'
import { recordActivity } from '@/lib/activity/record'
import type { Actor } from '@/lib/auth/actor'
import { ConflictError, ForbiddenError } from '@/lib/errors'
import { NameIdea } from '@/models'

import {
  changeNames,
  findIdeas,
  recordMoves,
  requireRoomForIdeas,
  type NamesAtWork,
} from './change-names'
import { STATE_WORDS } from './constants'
import { isOwn } from './moves'
import { canDraftNames } from './policy'
import type { DeleteIdeasInput } from './schema'

const whereOf = ({ line }: Pick<NamesAtWork, 'line'>, ideas: readonly NameIdea[]) => ({
  brandId: line.brandId,
  lineId: line.id,
  id: ideas.map(({ id }) => id),
})

/**
 * Deletes ideas, all or none: one's own, or anybody's for an owner. What is in review or approved
 * stays. Deleting what is deleted already changes nothing.
 * @throws NotFoundError, ForbiddenError for somebody else's, ConflictError in another state
 */
export async function deleteIdeas(
  actor: Actor,
  { lineSlug, ideaIds }: DeleteIdeasInput,
): Promise<{ ideaIds: string[] }> {
  return changeNames(actor, canDraftNames, lineSlug, async (at) => {
    const ideas = await findIdeas(at, ideaIds, { deleted: true })
    const going = ideas.filter(({ deletedAt }) => deletedAt === null)
    for (const idea of going) {
      if (idea.state === 'in-review' || idea.state === 'approved')
        throw new ConflictError(
          `“${idea.text}” is ${STATE_WORDS[idea.state].toLowerCase()} and was not deleted. Nothing was.`,
        )
      if (actor.role !== 'owner' && !isOwn(idea, actor.personId))
        throw new ForbiddenError(
          `“${idea.text}” is somebody else’s idea. Put it by instead. Nothing was deleted.`,
        )
    }
    if (going.length === 0) return { ideaIds: [] }
    await NameIdea.destroy({ where: whereOf(at, going), transaction: at.transaction })
    await recordMoves(
      at,
      going.map((idea) => ({ idea, move: 'delete', from: idea.state })),
    )
    await recordActivity(
      actor,
      { action: 'name.deleted', ...recordedIdeas(going, at.line) },
      at.transaction,
    )
    return { ideaIds: going.map(({ id }) => id) }
  })
}

/**
 * Brings deleted ideas back as they were. What was not deleted stays as it is.
 * @throws NotFoundError, ConflictError when the line is full
 */
export async function restoreIdeas(
  actor: Actor,
  { lineSlug, ideaIds }: DeleteIdeasInput,
): Promise<{ ideaIds: string[] }> {
  return changeNames(actor, canDraftNames, lineSlug, async (at) => {
    const ideas = await findIdeas(at, ideaIds, { deleted: true })
    const coming = ideas.filter(({ deletedAt }) => deletedAt !== null)
    if (coming.length === 0) return { ideaIds: [] }
    await requireRoomForIdeas(at, coming.length)
    await NameIdea.restore({ where: whereOf(at, coming), transaction: at.transaction })
    await recordMoves(
      at,
      coming.map((idea) => ({ idea, move: 'restore', from: idea.state })),
    )
    await recordActivity(
      actor,
      { action: 'name.restored', ...recordedIdeas(coming, at.line) },
      at.transaction,
    )
    return { ideaIds: coming.map(({ id }) => id) }
  })
}
