import { createHash, randomUUID } from 'node:crypto'

import { recordedIdeas } from '@/lib/activity/objects'
import { recordActivity } from '@/lib/activity/record'
import type { Actor } from '@/lib/auth/actor'
import { NameIdea } from '@/models'

import { changeNames, findNameable, recordMoves, requireRoomForIdeas } from './change-names'
import { canDraftNames } from './policy'
import type { AddIdeaInput, AddIdeasInput } from './schema'

/** A uuid of its own for each row of one submit, the same whenever it is sent again. */
function keyOfRow(requestKey: string, row: number): string {
  const hex = createHash('sha256').update(`${requestKey}/${row}`).digest('hex')
  return hex.replace(/^(.{8})(.{4})(.{4})(.{4})(.{12}).*$/, '$1-$2-$3-$4-$5')
}

/**
 * Writes ideas down, all or none, as drafts of whoever brings them. The same `requestKey` again
 * gives the ideas it made the first time.
 * @throws NotFoundError when a shade is not of the line, ConflictError when the line is full
 */
export async function addIdeas(
  actor: Actor,
  { lineSlug, ideas, requestKey }: AddIdeasInput,
): Promise<NameIdea[]> {
  return changeNames(actor, canDraftNames, lineSlug, async (at) => {
    const { line, transaction } = at
    const { brandId, personId } = actor
    await findNameable(
      at,
      ideas.flatMap(({ shadeId }) => shadeId ?? []),
    )
    const rows = ideas.map((idea, row) => ({
      ...idea,
      id: randomUUID(),
      brandId,
      lineId: line.id,
      state: 'draft' as const,
      authorId: personId,
      wordedById: personId,
      requestKey: keyOfRow(requestKey, row),
    }))
    const asked = { brandId, requestKey: rows.map((row) => row.requestKey) }
    // The line is held: of two same submits the second finds what the first has made.
    const made = await NameIdea.findAll({ where: asked, paranoid: false, transaction })
    if (made.length > 0) return inOrder(made, asked.requestKey)
    await requireRoomForIdeas(at, rows.length)
    const created = await NameIdea.bulkCreate(rows, { transaction })
    await recordMoves(
      at,
      created.map((idea) => ({ idea, move: 'add', from: null })),
    )
    await recordActivity(
      actor,
      { action: 'name.added', ...recordedIdeas(created, line) },
      transaction,
    )
    return created
  })
}

function inOrder(ideas: readonly NameIdea[], keys: readonly string[]): NameIdea[] {
  return [...ideas].sort((a, b) => keys.indexOf(a.requestKey!) - keys.indexOf(b.requestKey!))
}

/** Writes one idea down, as {@link addIdeas} does. */
export async function addIdea(
  actor: Actor,
  { lineSlug, requestKey, ...idea }: AddIdeaInput,
): Promise<NameIdea> {
  const [made] = await addIdeas(actor, { lineSlug, ideas: [idea], requestKey })
  return made!
}
