import { countAndName, familyObject } from '@/lib/activity/objects'
import type { Actor } from '@/lib/auth/actor'
import { shadeLabel } from '@/lib/shades/present'

import { withMoved } from './arrangement'
import { changeFamilies, findArranged, findFamily, type FamiliesAnswer } from './change-families'
import { moveToNew } from './move-to-new'
import { canEditFamilies } from './policy'
import type { MoveShadesToFamilyInput } from './schema'

/**
 * Puts shades into a family, or into a new one, and pins them there: a person's word holds.
 * @throws NotFoundError, ConflictError
 */
export async function moveShadesToFamily(
  actor: Actor,
  { shadeIds, familyId, ...edit }: MoveShadesToFamilyInput,
): Promise<FamiliesAnswer> {
  return changeFamilies(actor, canEditFamilies, edit, (before, line) => {
    const shades = findArranged(before, shadeIds)
    const said = countAndName(shades.map(shadeLabel))
    if (familyId === null) {
      const from = before.families.find(({ id }) => id === shades[0]!.familyId)
      const { after, made } = moveToNew(before, shades, from ?? before.families.at(-1)!)
      return {
        after,
        entry: {
          action: 'family.shades-moved',
          object: familyObject(made, line),
          after: said,
        },
      }
    }
    const family = findFamily(before, familyId)
    return {
      after: withMoved(before, new Set(shadeIds), familyId, true),
      entry: { action: 'family.shades-moved', object: familyObject(family, line), after: said },
    }
  })
}
