import type { Actor } from '@/lib/auth/actor'
import type { FamilyView } from '@/lib/families/present'
import { listFamilies } from '@/lib/families/queries'
import { getLine } from '@/lib/lines/queries'
import { listPhotographChoices } from '@/lib/photographs/queries'
import type { ShadeView } from '@/lib/shades/present'
import { listMatchShades } from '@/lib/shades/queries'
import type { Photograph } from '@/models'

import { getCombination, type KeptCombination } from './queries'

/** A combination with everything that may be put into it. */
export interface OpenCombination extends KeptCombination {
  /** Of the line, neither deleted nor retired. */
  shades: ShadeView[]
  /** In the order of the sample book. */
  families: FamilyView[]
  /** Of the line, newest first. */
  photographs: Photograph[]
}

/**
 * One combination of a line with all that its editor chooses from. Eight queries, however many there
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
  const [shades, families, photographs] = await Promise.all([
    listMatchShades(actor, line.id),
    listFamilies(actor, line.id),
    listPhotographChoices(actor, line),
  ])
  return { ...kept, shades, families, photographs }
}
