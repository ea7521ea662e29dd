import { recordedIdeas } from '@/lib/activity/objects'
import { recordActivity } from '@/lib/activity/record'
import type { Actor } from '@/lib/auth/actor'
import { ConflictError } from '@/lib/errors'

import { changeNames, findIdeas, findNameable, recordMoves } from './change-names'
import { STATE_WORDS } from './constants'
import { canDraftNames } from './policy'
import type { PlaceIdeasInput } from './schema'

/** Where ideas lay before: what `placeIdeas` takes to put them back. */
export interface PlacedIdeas {
  former: PlaceIdeasInput['placements']
}

/**
 * Lays ideas on shades, or back on the heap, all or none. Only drafts and what was returned move.
 * @throws NotFoundError, ConflictError when one is in another state
 */
export async function placeIdeas(
  actor: Actor,
  { lineSlug, placements }: PlaceIdeasInput,
): Promise<PlacedIdeas> {
  return changeNames(actor, canDraftNames, lineSlug, async (at) => {
    const wished = new Map(placements.map(({ ideaId, shadeId }) => [ideaId, shadeId]))
    const ideas = await findIdeas(at, [...wished.keys()])
    await findNameable(
      at,
      [...wished.values()].flatMap((shadeId) => shadeId ?? []),
    )
    const moving = ideas.filter(({ id, shadeId }) => wished.get(id) !== shadeId)
    const former = moving.map(({ id, shadeId }) => ({ ideaId: id, shadeId }))
    if (moving.length === 0) return { former }
    for (const idea of moving) {
      if (idea.state !== 'draft' && idea.state !== 'returned')
        throw new ConflictError(
          `“${idea.text}” is ${STATE_WORDS[idea.state].toLowerCase()} and stays where it is. Nothing was changed.`,
        )
      await idea.update(
        {
          shadeId: wished.get(idea.id) ?? null,
          // They were found for the shade it lay on.
          findings: null,
          checkedAt: null,
          version: idea.version + 1,
        },
        { transaction: at.transaction },
      )
    }
    await recordMoves(
      at,
      moving.map((idea) => ({ idea, move: 'place', from: idea.state })),
    )
    await recordActivity(
      actor,
      { action: 'name.placed', ...recordedIdeas(moving, at.line) },
      at.transaction,
    )
    return { former }
  })
}
