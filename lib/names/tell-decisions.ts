import { QueryTypes } from 'sequelize'

import { postLetter } from '@/lib/mail/post-letter'
import { Brand, inTransaction, Line, Membership, NameMove, sequelize } from '@/models'

import { decisionLetter, type Decision, type DecidingMove } from './letters'
import { namesOf } from './queries'

/** Whoever decides on many names is done when they have been still for so long … */
const STILL = 60_000
/** … and an author waits no longer than this for the first of them. */
const PATIENCE = 10 * 60_000
/** Letters of one round. */
const ROUND = 100

const DECIDING: readonly DecidingMove[] = ['approve', 'return', 'put-by', 'displace', 'reopen']

const DUE = /* sql */ `
SELECT i.author_id AS "authorId", m.line_id AS "lineId", m.brand_id AS "brandId"
FROM name_moves m JOIN name_ideas i ON i.brand_id = m.brand_id AND i.id = m.idea_id
WHERE m.told_at IS NULL AND m.move IN ('approve', 'return', 'put-by', 'displace', 'reopen')
GROUP BY i.author_id, m.line_id, m.brand_id
HAVING max(m.created_at) <= $still OR min(m.created_at) <= $patience
ORDER BY min(m.created_at) LIMIT $round`

/** Whose names of which line. */
interface Due {
  authorId: string | null
  lineId: string
  brandId: string
}

/**
 * The work of the job `tell-decisions`: posts to every author one letter of what was decided about
 * their names of a line, once the deciders have been still for a minute or ten have passed.
 * @param now for tests
 */
export async function tellDecisions(now = Date.now()): Promise<{ letters: number }> {
  const due = await sequelize().query<Due>(DUE, {
    bind: {
      still: new Date(now - STILL).toISOString(),
      patience: new Date(now - PATIENCE).toISOString(),
      round: ROUND,
    },
    type: QueryTypes.SELECT,
  })
  let letters = 0
  for (const one of due) letters += await tellAuthor(one, new Date(now))
  return { letters }
}

/** Notes that the author was told, and posts the letter in the same transaction, if there is one. */
function tellAuthor({ authorId, lineId, brandId }: Due, now: Date): Promise<0 | 1> {
  return inTransaction(async (transaction) => {
    // Held until the end: of two processes the second finds them told.
    const moves = await NameMove.findAll({
      where: { brandId, lineId, toldAt: null, move: [...DECIDING] },
      include: [
        {
          association: 'idea',
          attributes: [],
          required: true,
          paranoid: false,
          where: { authorId },
        },
      ],
      order: [['createdAt', 'ASC']],
      lock: { level: transaction.LOCK.UPDATE, of: NameMove },
      transaction,
    })
    await NameMove.update(
      { toldAt: now },
      { where: { brandId, id: moves.map(({ id }) => id) }, transaction },
    )
    if (authorId === null) return 0
    const decisions = decisionsFor(authorId, moves)
    if (decisions.length === 0) return 0
    const member = await Membership.findOne({
      where: { brandId, personId: authorId },
      include: [{ association: 'person', attributes: ['name', 'email'], required: true }],
      transaction,
    })
    // Whoever has left the brand or gone to the dye house sees ideas no more.
    if (!member || member.role === 'dyer') return 0
    const [brand, line] = await Promise.all([
      Brand.findByPk(brandId, { rejectOnEmpty: true, transaction }),
      Line.findOne({ where: { brandId, id: lineId }, rejectOnEmpty: true, transaction }),
    ])
    const people = await namesOf(decisions.map(({ personId }) => personId))
    const told = decisions.map((move): Decision => ({
      ideaId: move.ideaId,
      text: move.text,
      move: move.move as DecidingMove,
      // That of `displace` is the other name, which the author may not have seen.
      reason: move.move === 'displace' ? '' : move.reason,
      by: people.get(move.personId ?? '') ?? null,
    }))
    const { name, email } = member.person!
    const brandWords = { brandName: brand.name, brandSlug: brand.slug }
    await postLetter(
      email,
      decisionLetter(brandWords, { name, line, decisions: told }),
      transaction,
    )
    return 1
  })
}

/** What was last decided of each idea, unless the author decided it; what was no review is none. */
function decisionsFor(authorId: string, moves: readonly NameMove[]): NameMove[] {
  const decided = moves.filter(
    ({ move, fromState }) => move !== 'put-by' || fromState === 'in-review',
  )
  const last = new Map(decided.map((move) => [move.ideaId, move]))
  return [...last.values()].filter(({ personId }) => personId !== authorId)
}
