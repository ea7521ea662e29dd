import { authorize, type Actor } from '@/lib/auth/actor'
import { getLine } from '@/lib/lines/queries'
import type { NameIdea } from '@/models'
import { NameVote, Person, type Line, type NamingSettings } from '@/models'

import { findSettings, readAsker } from './change-names'
import { isFrozen } from './freeze'
import type { Asker } from './moves'
import { canReadNames } from './policy'
import { presentIdea, type IdeaView, type Reader } from './present'

/** A line with what holds for its names, and who asks. */
export interface Naming {
  line: Line
  settings: NamingSettings | null
  frozen: boolean
  asker: Asker
}

/** What every page of a line's names begins with. Four queries. @throws NotFoundError */
export async function readNaming(actor: Actor, lineSlug: string): Promise<Naming> {
  authorize(actor, canReadNames)
  const line = await getLine(actor, lineSlug)
  const [settings, asker] = await Promise.all([findSettings(line), readAsker(actor, line.id)])
  return { line, settings, frozen: isFrozen(settings), asker }
}

/** The names of people by id; of whoever has no account any more there is none. One query. */
export async function namesOf(ids: Iterable<string | null>): Promise<Map<string, string>> {
  const wanted = [...new Set([...ids].flatMap((id) => id ?? []))]
  if (wanted.length === 0) return new Map()
  const people = await Person.findAll({
    where: { id: wanted },
    attributes: ['id', 'name'],
    raw: true,
  })
  return new Map(people.map(({ id, name }) => [id, name]))
}

/** Ideas as their reader sees them, with the votes of their rounds. Two queries. */
export async function presentIdeas(
  ideas: readonly NameIdea[],
  { asker, frozen }: Pick<Reader, 'asker' | 'frozen'>,
): Promise<IdeaView[]> {
  const voted = ideas.filter(({ round }) => round > 0).map(({ id }) => id)
  const votes =
    voted.length > 0
      ? await NameVote.findAll({
          where: { brandId: ideas[0]!.brandId, ideaId: voted },
          order: [['updatedAt', 'ASC']],
        })
      : []
  const people = await namesOf([
    ...ideas.flatMap(({ authorId, wordedById }) => [authorId, wordedById]),
    ...votes.map(({ personId }) => personId),
  ])
  return ideas.map((idea) => presentIdea(idea, votes, { asker, frozen, people }))
}
