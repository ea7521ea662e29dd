import { lineObject } from '@/lib/activity/objects'
import type { Actor } from '@/lib/auth/actor'

import { changeFamilies, findFamily, type FamiliesAnswer } from './change-families'
import { canEditFamilies } from './policy'
import type { OrderFamiliesInput } from './schema'

/**
 * Puts the families of a line in another order; those not named follow in the order they had.
 * @throws NotFoundError, ConflictError
 */
export async function orderFamilies(
  actor: Actor,
  { familyIds, ...edit }: OrderFamiliesInput,
): Promise<FamiliesAnswer> {
  return changeFamilies(actor, canEditFamilies, edit, (before, line) => {
    const named = [...new Set(familyIds)].map((id) => findFamily(before, id))
    const families = [...named, ...before.families.filter((family) => !named.includes(family))]
    return {
      after: { ...before, families },
      entry: {
        action: 'family.ordered',
        object: lineObject(line),
        after: { named: families.map(({ name }) => name) },
      },
    }
  })
}
