import type { Actor } from '@/lib/auth/actor'
import { getLine } from '@/lib/lines/queries'
import { listPhotographChoices } from '@/lib/photographs/queries'
import { listMatchShades } from '@/lib/shades/queries'
import type { ShadeView } from '@/lib/shades/present'
import { Family, type Photograph } from '@/models'

import { getCombination, type KeptCombination } from './queries'

/** A combination with everything that may be put into it. */
export interface OpenCombination extends KeptCombination {
  /** Of the line, neither deleted nor retired. */
  shades: ShadeView[]
  /** In the order of the sample book. */
  families: { id: string; name: string }[]
  /** Of the line, newest first. */
  photographs: Photograph[]
}

/**
 * One combination of a line with all that its editor chooses from. Ten queries, however many there
 * are.
 * @throws NotFoundError
 */
export async function openCombination(
  actor: Actor,
  lineSlug: string,
  combinationId: string,
): Promise<OpenCombination> {
  const kept = await getCombination(actor, lineSlug, combinationId)
  const line = await getLine(actor, lineSlug)
  const inLine = { brandId: actor.brandId, lineId: line.id }
  const [shades, families, photographs] = await Promise.all([
    listMatchShades(actor, line.id),
    Family.findAll({
      attributes: ['id', 'name'],
      where: inLine,
      order: [
        ['position', 'ASC'],
        ['id', 'ASC'],
      ],
    }),
    listPhotographChoices(actor, line),
  ])
  return {
    ...kept,
    shades,
    families: families.map(({ id, name }) => ({ id, name })),
    photographs,
  }
}
