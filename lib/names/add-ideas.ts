import { createHash } from 'node:crypto'

import type { Actor } from '@/lib/auth/actor'
import { NameIdea } from '@/models'

import { changeNames, findNameable } from './change-names'
import { canDraftNames } from './policy'
import type { AddIdeaInput, AddIdeasInput } from './schema'
import { writeDrafts } from './write-drafts'

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
    await findNameable(
      at,
      ideas.flatMap(({ shadeId }) => shadeId ?? []),
    )
    const drafts = ideas.map((idea, row) => ({ ...idea, requestKey: keyOfRow(requestKey, row) }))
    const keys = drafts.map((draft) => draft.requestKey)
    // The line is held: of two same submits the second finds what the first has made.
    const made = await NameIdea.findAll({
      where: { brandId: actor.brandId, requestKey: keys },
      paranoid: false,
      transaction: at.transaction,
    })
    return made.length > 0 ? inOrder(made, keys) : writeDrafts(actor, at, drafts)
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
