import { randomUUID } from 'node:crypto'

import { literal, type Transaction } from 'sequelize'

import { authorize, type Actor, type Policy } from '@/lib/auth/actor'
import { touchBoard } from '@/lib/combinations/touch-board'
import { ConflictError, NotFoundError } from '@/lib/errors'
import { getLine } from '@/lib/lines/queries'
import {
  inTransaction,
  Membership,
  NameIdea,
  NameMove,
  NameReviewer,
  NamingSettings,
  Shade,
  type Line,
} from '@/models'

import { NAME_LIMITS, type NameMoveKind, type NameState } from './constants'
import { isFrozen } from './freeze'
import type { Asker, Movable } from './moves'

/** What a change of names works with, its line held until the transaction ends. */
export interface NamesAtWork {
  line: Line
  settings: NamingSettings | null
  asker: Asker
  frozen: boolean
  transaction: Transaction
}

/** Who asks, as far as the names of a line go. Two queries. */
export async function readAsker(
  actor: Actor,
  lineId: string,
  transaction: Transaction | null = null,
): Promise<Asker> {
  const { brandId, personId, role } = actor
  const where = { brandId, lineId, personId }
  const isReviewer = (await NameReviewer.count({ where, transaction })) > 0
  const owners = await Membership.count({ where: { brandId, role: 'owner' }, transaction })
  return { personId, role, isReviewer, isOnlyOwner: role === 'owner' && owners === 1 }
}

/** The settings of a line's names; null while nobody has set them. */
export const findSettings = (
  { id, brandId }: Pick<Line, 'id' | 'brandId'>,
  transaction: Transaction | null = null,
): Promise<NamingSettings | null> =>
  NamingSettings.findOne({ where: { brandId, lineId: id }, transaction })

/**
 * The one way to change the names of a line: authorises, opens the transaction, and takes the line's
 * row, so that of two who decide at the same moment the second sees what the first has left.
 * @throws ForbiddenError, NotFoundError
 */
export async function changeNames<T>(
  actor: Actor,
  policy: Policy,
  lineSlug: string,
  work: (at: NamesAtWork) => Promise<T>,
): Promise<T> {
  authorize(actor, policy)
  return inTransaction(async (transaction) => {
    const line = await getLine(actor, lineSlug, transaction)
    await line.reload({ transaction, lock: transaction.LOCK.NO_KEY_UPDATE })
    const settings = await findSettings(line, transaction)
    const asker = await readAsker(actor, line.id, transaction)
    return work({ line, settings, asker, frozen: isFrozen(settings), transaction })
  })
}

/** An idea as the table of moves looks at it. */
export const movable = (idea: NameIdea, frozen: boolean): Movable => ({
  state: idea.state,
  shadeId: idea.shadeId,
  authorId: idea.authorId,
  wordedById: idea.wordedById,
  locked: frozen && idea.state === 'approved' && idea.unlockedAt === null,
})

/**
 * The ideas of a line with these ids, in the order asked for.
 * @throws NotFoundError when one of them is not there (any more)
 */
export async function findIdeas(
  { line, transaction }: Pick<NamesAtWork, 'line' | 'transaction'>,
  ideaIds: readonly string[],
  { deleted = false }: { deleted?: boolean } = {},
): Promise<NameIdea[]> {
  const ids = [...new Set(ideaIds)]
  const found = await NameIdea.findAll({
    where: { brandId: line.brandId, lineId: line.id, id: ids },
    paranoid: !deleted,
    transaction,
  })
  const byId = new Map(found.map((idea) => [idea.id, idea]))
  return ids.map((id) => {
    const idea = byId.get(id)
    if (!idea) throw new NotFoundError('One of these names is not there any more.')
    return idea
  })
}

/**
 * The shades of a line with these ids, deleted ones left out.
 * @throws NotFoundError when one of them is not there (any more)
 */
export async function findNameable(
  { line, transaction }: Pick<NamesAtWork, 'line' | 'transaction'>,
  shadeIds: readonly string[],
): Promise<Map<string, Shade>> {
  const ids = [...new Set(shadeIds)]
  const shades = await Shade.findAll({
    where: { brandId: line.brandId, lineId: line.id, id: ids },
    transaction,
  })
  if (shades.length !== ids.length)
    throw new NotFoundError('A shade is not there any more. Nothing was changed.')
  return new Map(shades.map((shade) => [shade.id, shade]))
}

/** A line of the history, before it has an id. */
export interface Moved {
  idea: NameIdea
  move: NameMoveKind
  from: NameState | null
  reason?: string
}

/** Writes moves into the history of a line, in the order given. */
export async function recordMoves(
  {
    line,
    asker,
    transaction,
  }: Pick<NamesAtWork, 'line' | 'transaction'> & { asker: Pick<Asker, 'personId'> },
  moves: readonly Moved[],
): Promise<void> {
  await NameMove.bulkCreate(
    moves.map(({ idea, move, from, reason = '' }) => ({
      id: randomUUID(),
      brandId: line.brandId,
      lineId: line.id,
      ideaId: idea.id,
      move,
      fromState: from,
      toState: idea.state,
      text: idea.text,
      shadeId: idea.shadeId,
      reason,
      round: idea.round,
      personId: asker.personId,
    })),
    { transaction, returning: false },
  )
}

/**
 * Gives shades their approved names, or takes them away; matches are stale then, and boards look
 * again. This alone writes `shades.name`.
 */
export async function nameShades(
  { line, transaction }: NamesAtWork,
  names: ReadonlyMap<string, string | null>,
): Promise<void> {
  if (names.size === 0) return
  await touchBoard(line, line.id, transaction)
  for (const [id, name] of names) {
    const [named] = await Shade.update(
      { name, version: literal('version + 1') },
      { where: { brandId: line.brandId, lineId: line.id, id }, paranoid: false, transaction },
    )
    if (named !== 1) throw new NotFoundError()
  }
  await line.increment('shadesRevision', { transaction })
}

/** @throws ConflictError when the line cannot take so many more ideas */
export async function requireRoomForIdeas(
  { line, transaction }: Pick<NamesAtWork, 'line' | 'transaction'>,
  more: number,
): Promise<void> {
  const where = { brandId: line.brandId, lineId: line.id }
  const held = await NameIdea.count({ where, transaction })
  if (held + more <= NAME_LIMITS.perLine) return
  const most = NAME_LIMITS.perLine.toLocaleString('en-GB')
  throw new ConflictError(
    `A line holds at most ${most} ideas; this one has ${held.toLocaleString('en-GB')}. Nothing was added.`,
  )
}
