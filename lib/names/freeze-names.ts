import { lineObject } from '@/lib/activity/objects'
import { recordActivity } from '@/lib/activity/record'
import type { Actor } from '@/lib/auth/actor'
import { ConflictError } from '@/lib/errors'
import type { NamingSettings } from '@/models'

import { changeNames } from './change-names'
import { requireSeen, writeSettings } from './change-settings'
import { canRuleNames } from './policy'
import type { FreezeNamesInput } from './schema'

/** How the record tells a lock that somebody set from one whose day had come. */
export const BY_HAND = 'by hand'

/**
 * Locks the approved names of a line from now on, whatever its print date is.
 * @throws NotFoundError; ConflictError when somebody saved in between, or when they are locked
 */
export async function freezeNames(
  actor: Actor,
  { lineSlug, version }: FreezeNamesInput,
): Promise<NamingSettings> {
  return changeNames(actor, canRuleNames, lineSlug, async (at) => {
    requireSeen(at, version)
    if (at.frozen) throw new ConflictError('Names are locked already. Nothing was changed.')
    const frozen = await writeSettings(at, { frozenAt: new Date() })
    await recordActivity(
      actor,
      { action: 'name.frozen', object: lineObject(at.line), after: { how: BY_HAND } },
      at.transaction,
    )
    return frozen
  })
}
