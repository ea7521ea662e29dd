import { countAndName, familyObject } from '@/lib/activity/objects'
import type { Actor } from '@/lib/auth/actor'
import { InvalidError } from '@/lib/errors'
import { shadeLabel } from '@/lib/shades/present'

import { shadesOf, withMoved } from './arrangement'
import { changeFamilies, findFamily, type FamiliesAnswer } from './change-families'
import { canEditFamilies } from './policy'
import type { MergeFamiliesInput } from './schema'

/**
 * Puts all shades of one family into another, pinned, since a person wanted them there. The other
 * keeps its name; the empty family goes.
 * @throws NotFoundError, ConflictError
 * @throws InvalidError when both are the same
 */
export async function mergeFamilies(
  actor: Actor,
  { familyId, intoId, ...edit }: MergeFamiliesInput,
): Promise<FamiliesAnswer> {
  return changeFamilies(actor, canEditFamilies, edit, (before, line) => {
    const family = findFamily(before, familyId)
    const into = findFamily(before, intoId)
    if (family.id === into.id) {
      throw new InvalidError('Choose another family for these shades to go into.')
    }
    const shades = shadesOf(before, familyId)
    const ids = new Set(shades.map(({ id }) => id))
    return {
      after: withMoved(before, ids, intoId, true),
      entry: {
        action: 'family.merged',
        object: familyObject(family, line),
        after: { into: into.name, ...countAndName(shades.map(shadeLabel)) },
      },
    }
  })
}
