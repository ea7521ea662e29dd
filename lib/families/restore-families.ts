import { lineObject } from '@/lib/activity/objects'
import type { Actor } from '@/lib/auth/actor'
import { InvalidError } from '@/lib/errors'

import { changeFamilies, findArranged, type FamiliesAnswer } from './change-families'
import { familyKey } from './constants'
import { canEditFamilies } from './policy'
import type { RestoreFamiliesInput } from './schema'

/**
 * Takes an edit of families back: the families as they were, and the shades that stood elsewhere.
 * What the edit answered says both; it holds as long as nobody has edited since.
 * @throws NotFoundError, ConflictError
 * @throws InvalidError when a shade would be left in no family, or two families in one name
 */
export async function restoreFamilies(
  actor: Actor,
  { former, ...edit }: RestoreFamiliesInput,
): Promise<FamiliesAnswer> {
  return changeFamilies(actor, canEditFamilies, edit, (before, line) => {
    findArranged(
      before,
      former.shades.map(({ id }) => id),
    )
    const back = new Map(former.shades.map(({ id, ...place }) => [id, place]))
    const shades = before.shades.map((shade) => ({ ...shade, ...back.get(shade.id) }))
    const ids = new Set(former.families.map(({ id }) => id))
    const names = new Set(former.families.map(({ name }) => familyKey(name)))
    const fits =
      ids.size === former.families.length &&
      names.size === former.families.length &&
      shades.every(({ familyId }) => familyId === null || ids.has(familyId))
    if (!fits) {
      throw new InvalidError(
        'This does not put the families back as they were. Nothing was changed.',
      )
    }
    return {
      after: { families: former.families, shades },
      count: former.count,
      entry: {
        action: 'family.put-back',
        object: lineObject(line),
        after: { named: former.families.map(({ name }) => name) },
      },
    }
  })
}
