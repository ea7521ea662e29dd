import { authorize, type Actor } from '@/lib/auth/actor'
import { NotFoundError } from '@/lib/errors'
import { getLine } from '@/lib/lines/queries'
import { Shade } from '@/models'

import { checkName, readCheckGround } from './check-name'
import { canReadNames } from './policy'
import type { CheckedName } from './present'
import type { CheckNameInput } from './schema'

/**
 * All checks of a name that is being written, against what stands now; nothing is stored. Six
 * queries, however many names there are.
 * @throws NotFoundError when the shade is not of the line
 */
export async function checkOne(
  actor: Actor,
  { lineSlug, ...name }: CheckNameInput,
): Promise<CheckedName> {
  authorize(actor, canReadNames)
  const line = await getLine(actor, lineSlug)
  if (name.shadeId !== null) {
    const where = { brandId: actor.brandId, lineId: line.id, id: name.shadeId }
    if ((await Shade.count({ where })) === 0) throw new NotFoundError()
  }
  return checkName(await readCheckGround(line), name)
}
