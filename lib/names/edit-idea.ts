import { ideaObject } from '@/lib/activity/objects'
import { recordActivity } from '@/lib/activity/record'
import type { Actor } from '@/lib/auth/actor'
import { changesOf } from '@/lib/activity/changes-of'
import { ConflictError } from '@/lib/errors'
import { NameIdea, updateVersioned } from '@/models'

import { changeNames, findIdeas, recordMoves } from './change-names'
import { STATE_WORDS } from './constants'
import { canDraftNames } from './policy'
import type { EditIdeaInput } from './schema'

/**
 * Changes what an idea says, the thought behind it, or the reason its wording stands. Only a draft
 * or what was returned can be changed; who changes the words makes them their own.
 * @throws NotFoundError, ConflictError in another state or when somebody saved in between
 */
export async function editIdea(
  actor: Actor,
  { lineSlug, ideaId, version, ...fields }: EditIdeaInput,
): Promise<NameIdea> {
  return changeNames(actor, canDraftNames, lineSlug, async (at) => {
    const { line, transaction } = at
    const [idea] = (await findIdeas(at, [ideaId])) as [NameIdea]
    if (idea.state !== 'draft' && idea.state !== 'returned')
      throw new ConflictError(
        `“${idea.text}” is ${STATE_WORDS[idea.state].toLowerCase()}: take it back before you change it.`,
      )
    const { text, note, wordingReason } = idea
    const changes = changesOf({ text, note, wordingReason }, fields)
    if (!changes) return idea
    const reworded = fields.text !== undefined && fields.text !== text
    await updateVersioned(
      NameIdea,
      { ...idea.get(), version },
      {
        ...fields,
        ...(reworded && {
          wordedById: actor.personId,
          findings: null,
          checkedAt: null,
          // What excused other words excuses these no more, unless it is said again.
          wordingReason: fields.wordingReason ?? '',
        }),
      },
      transaction,
    )
    await idea.reload({ transaction })
    if (reworded) await recordMoves(at, [{ idea, move: 'reword', from: idea.state }])
    await recordActivity(
      actor,
      { action: 'name.reworded', object: ideaObject(idea, line), ...changes },
      transaction,
    )
    return idea
  })
}
