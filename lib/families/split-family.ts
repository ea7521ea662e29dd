import { countAndName, familyObject } from '@/lib/activity/objects'
import type { Actor } from '@/lib/auth/actor'
import { ConflictError } from '@/lib/errors'
import { shadeLabel } from '@/lib/shades/present'

import { partOf } from './arrangement'
import { changeFamilies, findFamily, type FamiliesAnswer } from './change-families'
import { moveToNew } from './move-to-new'
import { canEditFamilies } from './policy'
import type { SplitFamilyInput } from './schema'

/**
 * Parts a family in two where its hues, or of neutrals its lightness, lie farthest apart. The larger
 * part keeps the family; the other becomes one of its own, named by its colours and pinned.
 * @throws NotFoundError
 * @throws ConflictError when fewer than two shades stand there, or all of them are pinned
 */
export async function splitFamily(
  actor: Actor,
  { familyId, ...edit }: SplitFamilyInput,
): Promise<FamiliesAnswer> {
  return changeFamilies(actor, canEditFamilies, edit, (before, line) => {
    const family = findFamily(before, familyId)
    const parting = partOf(before, family)
    if (parting.length === 0) {
      throw new ConflictError(
        `${family.name} cannot be split: that takes two shades, and one that is not pinned. Nothing was changed.`,
      )
    }
    const { after, made } = moveToNew(before, parting, family)
    return {
      after,
      entry: {
        action: 'family.split',
        object: familyObject(family, line),
        after: { name: made.name, ...countAndName(parting.map(shadeLabel)) },
      },
    }
  })
}
