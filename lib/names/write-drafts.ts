import { randomUUID } from 'node:crypto'

import { Op, type Transaction } from 'sequelize'

import { recordedIdeas } from '@/lib/activity/objects'
import { recordActivity } from '@/lib/activity/record'
import { authorize, type Actor } from '@/lib/auth/actor'
import { NameIdea, type Line } from '@/models'

import { recordMoves, requireRoomForIdeas, type NamesAtWork } from './change-names'
import { canDraftNames } from './policy'

/** Rows of one INSERT; bounds its text. */
const BATCH = 1_000

/** An idea before it is written down. */
export interface NewDraft {
  text: string
  note?: string
  /** Null lies in the heap. */
  shadeId: string | null
  requestKey?: string
}

/**
 * Writes ideas down as drafts of whoever brings them, in the transaction of something larger that
 * holds the line; the one way an idea comes to be. Nothing to write is no error.
 * @throws ForbiddenError, ConflictError when the line is full
 */
export async function writeDrafts(
  actor: Actor,
  { line, transaction }: Pick<NamesAtWork, 'line' | 'transaction'>,
  drafts: readonly NewDraft[],
): Promise<NameIdea[]> {
  if (drafts.length === 0) return []
  authorize(actor, canDraftNames)
  const { brandId, personId } = actor
  const at = { line, transaction, asker: { personId } }
  await requireRoomForIdeas(at, drafts.length)
  const now = Date.now()
  const ideas: NameIdea[] = []
  for (let from = 0; from < drafts.length; from += BATCH) {
    const rows = drafts.slice(from, from + BATCH).map((draft, row) => ({
      ...draft,
      // What was brought together is listed in its own order, newest first as ever.
      createdAt: new Date(now - from - row),
      id: randomUUID(),
      brandId,
      lineId: line.id,
      state: 'draft' as const,
      authorId: personId,
      wordedById: personId,
    }))
    const written = await NameIdea.bulkCreate(rows, { transaction })
    await recordMoves(
      at,
      written.map((idea) => ({ idea, move: 'add', from: null })),
    )
    ideas.push(...written)
  }
  await recordActivity(actor, { action: 'name.added', ...recordedIdeas(ideas, line) }, transaction)
  return ideas
}

/** What the ideas on each shade of a line say, in whatever state, by the shade's id. One query. */
export async function readTextsOnShades(
  { id: lineId, brandId }: Pick<Line, 'id' | 'brandId'>,
  transaction: Transaction | null = null,
): Promise<Map<string, Set<string>>> {
  const ideas = await NameIdea.findAll({
    attributes: ['shadeId', 'text'],
    where: { brandId, lineId, shadeId: { [Op.ne]: null } },
    raw: true,
    transaction,
  })
  const texts = new Map<string, Set<string>>()
  for (const { shadeId, text } of ideas) {
    const known = texts.get(shadeId!)
    if (known) known.add(text)
    else texts.set(shadeId!, new Set([text]))
  }
  return texts
}
