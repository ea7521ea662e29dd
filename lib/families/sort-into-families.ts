import { randomUUID } from 'node:crypto'

import { lineObject } from '@/lib/activity/objects'
import type { Actor } from '@/lib/auth/actor'

import { sortAnew } from './arrangement'
import { changeFamilies, type FamiliesAnswer } from './change-families'
import { canEditFamilies } from './policy'
import type { SortIntoFamiliesInput } from './schema'

/**
 * Sorts all shades of a line into families anew, into so many hue families or as many as suit it.
 * Pinned shades stay; families keep their ids, and names that people gave, where their shades do.
 * @throws NotFoundError, ConflictError
 */
export async function sortIntoFamilies(
  actor: Actor,
  { count, ...edit }: SortIntoFamiliesInput,
): Promise<FamiliesAnswer> {
  return changeFamilies(actor, canEditFamilies, edit, (before, line) => {
    const after = sortAnew(before, count, randomUUID)
    return {
      after,
      count,
      entry: {
        action: 'family.sorted',
        object: lineObject(line),
        before: { families: before.families.length },
        after: { families: after.families.length, named: after.families.map(({ name }) => name) },
      },
    }
  })
}
