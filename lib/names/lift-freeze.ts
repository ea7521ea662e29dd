import { Op } from 'sequelize'

import { lineObject } from '@/lib/activity/objects'
import { recordActivity } from '@/lib/activity/record'
import type { Actor } from '@/lib/auth/actor'
import { ConflictError } from '@/lib/errors'
import { NameIdea, type NamingSettings } from '@/models'

import { changeNames } from './change-names'
import { requireSeen, writeSettings } from './change-settings'
import { canRuleNames } from './policy'
import type { LiftFreezeInput } from './schema'

/**
 * Unlocks all names of a line and takes away its print date, which would lock them again. Names that
 * were unlocked alone are as the others from then on: the next lock holds them too.
 * @throws NotFoundError; ConflictError when somebody saved in between, or when nothing is locked
 */
export async function liftFreeze(
  actor: Actor,
  { lineSlug, version, reason }: LiftFreezeInput,
): Promise<NamingSettings> {
  return changeNames(actor, canRuleNames, lineSlug, async (at) => {
    const { line, transaction } = at
    requireSeen(at, version)
    if (!at.frozen) throw new ConflictError('Names are not locked. Nothing was changed.')
    const { printOn } = at.settings!
    const lifted = await writeSettings(at, { frozenAt: null, printOn: null })
    await NameIdea.update(
      { unlockedAt: null },
      {
        where: { brandId: line.brandId, lineId: line.id, unlockedAt: { [Op.ne]: null } },
        transaction,
      },
    )
    await recordActivity(
      actor,
      {
        action: 'name.freeze-lifted',
        object: lineObject(line),
        before: { printOn },
        after: { reason },
      },
      transaction,
    )
    return lifted
  })
}
