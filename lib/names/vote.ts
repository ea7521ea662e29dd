import { ideaObject } from '@/lib/activity/objects'
import { recordActivity } from '@/lib/activity/record'
import type { Actor } from '@/lib/auth/actor'
import { ConflictError } from '@/lib/errors'
import { NameVote, type NameIdea } from '@/models'

import { changeNames, findIdeas, movable } from './change-names'
import { reasonAgainstVote } from './moves'
import { canReadNames } from './policy'
import type { VoteInput } from './schema'

/**
 * Keeps what a reviewer says of an idea in the round they have seen; the last word of each counts,
 * and null takes it back. The same word again changes nothing.
 * @throws NotFoundError; ForbiddenError for who may not; ConflictError when it is not in review, or
 * has been sent anew since
 */
export async function vote(
  actor: Actor,
  { lineSlug, ideaId, round, vote: said, comment }: VoteInput,
): Promise<void> {
  await changeNames(actor, canReadNames, lineSlug, async (at) => {
    const { line, asker, transaction } = at
    const { brandId, personId } = actor
    const [idea] = (await findIdeas(at, [ideaId])) as [NameIdea]
    const against = reasonAgainstVote(movable(idea, at.frozen), asker)
    if (against) throw against
    if (idea.round !== round)
      throw new ConflictError(
        `“${idea.text}” has been sent anew since you looked. What you said was not kept: look at it again.`,
      )
    const held = await NameVote.findOne({
      where: { brandId, ideaId, round, personId },
      transaction,
    })
    if (said === null ? !held : held?.vote === said && held.comment === comment) return
    if (said === null) await held!.destroy({ transaction })
    else if (held) await held.update({ vote: said, comment }, { transaction })
    else
      await NameVote.create(
        { brandId, ideaId, round, personId, vote: said, comment },
        { transaction },
      )
    await recordActivity(
      actor,
      { action: 'name.voted', object: ideaObject(idea, line), after: { vote: said } },
      transaction,
    )
  })
}
