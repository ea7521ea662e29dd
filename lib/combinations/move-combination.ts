import { generateKeyBetween } from 'fractional-indexing'
import { Op, type Transaction } from 'sequelize'

import { combinationObject } from '@/lib/activity/objects'
import { recordActivity } from '@/lib/activity/record'
import { authorize, type Actor } from '@/lib/auth/actor'
import { ConflictError } from '@/lib/errors'
import { Combination, inTransaction, Line } from '@/models'

import { LANE_WORDS, type Lane } from './constants'
import { topRank } from './lane-rank'
import { canMoveCombination } from './policy'
import { loadCombination } from './queries'
import type { MoveCombinationInput } from './schema'
import { touchBoard } from './touch-board'

/**
 * Puts a combination between two others of a lane, as the board showed them: `after` right above
 * it, `before` right below, null at an end of the lane. One that stands there already stays, so
 * that a move may be sent again.
 * @returns the revision of the board that has the move
 * @throws NotFoundError; ConflictError when somebody has moved the combination to another lane, or
 * one of the two away, meanwhile
 */
export async function moveCombination(
  actor: Actor,
  input: MoveCombinationInput,
): Promise<{ revision: number }> {
  authorize(actor, canMoveCombination)
  const { combinationId, lane } = input
  return inTransaction(async (transaction) => {
    const { lineId } = await loadCombination(actor, combinationId, { transaction })
    await touchBoard(actor, lineId, transaction)
    // From here on nobody else moves: what is read now is what was asked about, or is refused.
    const combination = await loadCombination(actor, combinationId, { transaction })
    if (!(await standsThere(combination, input, transaction))) {
      if (combination.lane !== input.from) {
        throw new ConflictError(
          `“${combination.title}” was not moved: somebody else has moved it to ${LANE_WORDS[combination.lane as Lane]} meanwhile. It stays there.`,
        )
      }
      const rank = await rankBetween(combination, input, transaction)
      await combination.update({ lane, rank }, { transaction })
      await recordActivity(
        actor,
        {
          action: 'combination.moved',
          object: combinationObject(combination),
          before: { lane: input.from },
          after: { lane },
        },
        transaction,
      )
    }
    const line = await Line.findByPk(lineId, {
      attributes: ['boardRevision'],
      rejectOnEmpty: true,
      transaction,
    })
    return { revision: line.boardRevision }
  })
}

type Neighbours = Pick<MoveCombinationInput, 'lane' | 'after' | 'before'>

/** The next one up or down from a rank in a lane; deleted ones too, where they keep their rank. */
function nextTo(
  { brandId, lineId, id }: Combination,
  {
    lane,
    rank,
    side,
    deleted = false,
  }: Pick<Combination, 'lane' | 'rank'> & {
    side: 'above' | 'below'
    deleted?: boolean
  },
  transaction: Transaction,
) {
  const below = side === 'below'
  return Combination.findOne({
    attributes: ['id', 'rank'],
    where: {
      brandId,
      lineId,
      lane,
      id: { [Op.ne]: id },
      rank: { [below ? Op.gt : Op.lt]: rank },
    },
    order: [['rank', below ? 'ASC' : 'DESC']],
    paranoid: !deleted,
    transaction,
  })
}

/** Whether the combination stands between the two already. */
async function standsThere(
  combination: Combination,
  { lane, after, before }: Neighbours,
  transaction: Transaction,
): Promise<boolean> {
  if (combination.lane !== lane) return false
  const { rank } = combination
  const above = await nextTo(combination, { lane, rank, side: 'above' }, transaction)
  const below = await nextTo(combination, { lane, rank, side: 'below' }, transaction)
  return (above?.id ?? null) === after && (below?.id ?? null) === before
}

/** A rank between the two. @throws ConflictError when they no longer stand there in this order */
async function rankBetween(
  combination: Combination,
  { lane, after, before }: Neighbours,
  transaction: Transaction,
): Promise<string> {
  const { brandId, lineId, title } = combination
  const anchors = await Combination.findAll({
    attributes: ['id', 'rank'],
    where: { brandId, lineId, lane, id: [after, before].filter((id) => id !== null) },
    transaction,
  })
  const [above, below] = [after, before].map((id) => anchors.find((one) => one.id === id)?.rank)
  const gone = (after !== null && above === undefined) || (before !== null && below === undefined)
  if (gone || (above !== undefined && below !== undefined && above >= below)) {
    throw new ConflictError(
      `“${title}” was not moved: the combinations beside its new place have been moved or deleted meanwhile. Look at ${LANE_WORDS[lane]} as it is now, then move it again.`,
    )
  }
  // Others may have come between the two since: it goes right under the upper one, or, where there
  // is none, right above the lower one. Deleted ones keep their rank for when they come back.
  const next = (rank: string, side: 'above' | 'below') =>
    nextTo(combination, { lane, rank, side, deleted: true }, transaction)
  if (above !== undefined) {
    return generateKeyBetween(above, (await next(above, 'below'))?.rank ?? null)
  }
  if (below !== undefined) {
    return generateKeyBetween((await next(below, 'above'))?.rank ?? null, below)
  }
  return topRank({ brandId, lineId, lane }, transaction)
}
