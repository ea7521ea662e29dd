import { familyObject } from '@/lib/activity/objects'
import type { Actor } from '@/lib/auth/actor'
import { InvalidError } from '@/lib/errors'

import { shadesOf } from './arrangement'
import { changeFamilies, findFamily, type FamiliesAnswer } from './change-families'
import { canEditFamilies } from './policy'
import type { OrderFamilyShadesInput } from './schema'

/**
 * Puts the shades of a family in an order of people's own, or back in that from light to dark.
 * @throws NotFoundError, ConflictError
 * @throws InvalidError when the order does not name each shade of the family once
 */
export async function orderFamilyShades(
  actor: Actor,
  { familyId, shadeIds, ...edit }: OrderFamilyShadesInput,
): Promise<FamiliesAnswer> {
  return changeFamilies(actor, canEditFamilies, edit, (before, line) => {
    const family = findFamily(before, familyId)
    const held = shadesOf(before, familyId)
    const place = new Map(shadeIds?.map((id, at) => [id, at]))
    const fits =
      shadeIds === null || (place.size === held.length && held.every(({ id }) => place.has(id)))
    if (!fits) {
      throw new InvalidError(
        `The order names other shades than stand in ${family.name}. Nothing was changed: look at the family as it is now.`,
      )
    }
    return {
      after: {
        ...before,
        shades: before.shades.map((shade) =>
          shade.familyId === familyId ? { ...shade, position: place.get(shade.id) ?? null } : shade,
        ),
      },
      entry: {
        action: 'family.shades-ordered',
        object: familyObject(family, line),
        after: { order: shadeIds ? 'by hand' : 'light to dark' },
      },
    }
  })
}
