import { countAndName, lineObject } from '@/lib/activity/objects'
import type { Actor } from '@/lib/auth/actor'
import { shadeLabel } from '@/lib/shades/present'

import { changeFamilies, findArranged, type FamiliesAnswer } from './change-families'
import { canEditFamilies } from './policy'
import type { PinShadesInput } from './schema'

/**
 * Pins shades in the family they stand in, so that sorting anew leaves them there, or lets them go.
 * @throws NotFoundError, ConflictError
 */
export async function pinShades(
  actor: Actor,
  { shadeIds, pinned, ...edit }: PinShadesInput,
): Promise<FamiliesAnswer> {
  return changeFamilies(actor, canEditFamilies, edit, (before, line) => {
    const shades = findArranged(before, shadeIds).filter(
      (shade) => shade.pinned !== pinned && shade.familyId !== null,
    )
    const ids = new Set(shades.map(({ id }) => id))
    return {
      after: {
        ...before,
        shades: before.shades.map((shade) => (ids.has(shade.id) ? { ...shade, pinned } : shade)),
      },
      entry: {
        action: pinned ? 'family.shades-pinned' : 'family.shades-unpinned',
        object: lineObject(line),
        after: countAndName(shades.map(shadeLabel)),
      },
    }
  })
}
