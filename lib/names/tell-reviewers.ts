import type { Actor } from '@/lib/auth/actor'
import { postLetter } from '@/lib/mail/post-letter'
import { Membership, NameReviewer, type NameIdea } from '@/models'

import type { NamesAtWork } from './change-names'
import { reviewLetter } from './letters'
import { isDecider } from './moves'

/**
 * Posts one letter to everybody who decides on the line's names, but for whoever sent them, however
 * many names were sent together.
 */
export async function tellReviewers(
  actor: Actor,
  { line, transaction }: NamesAtWork,
  ideas: readonly NameIdea[],
): Promise<void> {
  const where = { brandId: actor.brandId, lineId: line.id }
  const reviewers = await NameReviewer.findAll({ where, raw: true, transaction })
  const appointed = new Set(reviewers.map(({ personId }) => personId))
  const members = await Membership.findAll({
    where: { brandId: actor.brandId },
    include: [{ association: 'person', attributes: ['name', 'email'], required: true }],
    transaction,
  })
  for (const { personId, role, person } of members) {
    const decides = isDecider({ role, isReviewer: appointed.has(personId) })
    if (!decides || personId === actor.personId) continue
    const { name, email } = person!
    const names = ideas.map(({ text }) => text)
    await postLetter(email, reviewLetter(actor, { name, line, names }), transaction)
  }
}
