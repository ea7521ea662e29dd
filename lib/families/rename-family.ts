import { familyObject } from '@/lib/activity/objects'
import type { Actor } from '@/lib/auth/actor'
import { ConflictError } from '@/lib/errors'

import { changeFamilies, findFamily, type FamiliesAnswer } from './change-families'
import { familyKey } from './constants'
import { canRenameFamily } from './policy'
import type { RenameFamilyInput } from './schema'

/**
 * Gives a family a name, which no computation changes any more.
 * @throws NotFoundError
 * @throws ConflictError when another family of the line is called so, or somebody edited first
 */
export async function renameFamily(
  actor: Actor,
  { familyId, name, ...edit }: RenameFamilyInput,
): Promise<FamiliesAnswer> {
  return changeFamilies(actor, canRenameFamily, edit, (before, line) => {
    const family = findFamily(before, familyId)
    const holder = before.families.find(
      (other) => other.id !== familyId && familyKey(other.name) === familyKey(name),
    )
    if (holder) {
      const message = `Another family is called ${holder.name} already. Choose another name.`
      throw new ConflictError(message, { name: [message] })
    }
    const named = { ...family, name, nameGiven: true }
    return {
      after: {
        ...before,
        families: before.families.map((other) => (other.id === familyId ? named : other)),
      },
      entry: {
        action: 'family.renamed',
        object: familyObject(family, line),
        before: { name: family.name },
        after: { name },
      },
    }
  })
}
