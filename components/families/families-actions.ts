import type { z } from 'zod'

import type { ActionResult } from '@/lib/errors'
import type { FamilyWithShades, SortPreview } from '@/lib/families/present'
import type {
  FormerFamilies,
  mergeFamiliesSchema,
  moveShadesToFamilySchema,
  orderFamiliesSchema,
  orderFamilyShadesSchema,
  pinShadesSchema,
  previewSortSchema,
  renameFamilySchema,
  restoreFamiliesSchema,
  sortIntoFamiliesSchema,
  splitFamilySchema,
} from '@/lib/families/schema'

/** What an edit answers: the version to edit from next, and what takes it back. */
export interface EditAnswer {
  version: number
  former: FormerFamilies | null
}

type Action<Schema extends z.ZodType, Data = EditAnswer> = (
  brand: string,
  input: z.input<Schema>,
) => Promise<ActionResult<Data>>

/** The actions that a page hands to the components of a line's families. */
export interface FamiliesActions {
  sort: Action<typeof sortIntoFamiliesSchema>
  preview: Action<typeof previewSortSchema, SortPreview>
  rename: Action<typeof renameFamilySchema>
  merge: Action<typeof mergeFamiliesSchema>
  split: Action<typeof splitFamilySchema>
  move: Action<typeof moveShadesToFamilySchema>
  pin: Action<typeof pinShadesSchema>
  orderShades: Action<typeof orderFamilyShadesSchema>
  orderFamilies: Action<typeof orderFamiliesSchema>
  restore: Action<typeof restoreFamiliesSchema>
}

/** What this person may do with families. */
export interface FamiliesRights {
  edit: boolean
  rename: boolean
}

/** "1 shade", "7 shades". */
export const shadesInWords = (count: number): string =>
  count === 1 ? '1 shade' : `${count} shades`

/** The families with some shades in another one, at its end; an emptied family is left out. */
export function withMovedShades(
  families: readonly FamilyWithShades[],
  shadeIds: ReadonlySet<string>,
  familyId: string,
): FamilyWithShades[] {
  const moved = families.flatMap(({ shades }) => shades.filter(({ id }) => shadeIds.has(id)))
  return families
    .map((family) => {
      const staying = family.shades.filter(({ id }) => !shadeIds.has(id))
      if (family.id !== familyId) return { ...family, shades: staying }
      const arrived = moved.map((shade) => ({ ...shade, familyPinned: true }))
      const all = [...staying, ...arrived]
      if (!family.ordered) all.sort((one, other) => other.lab[0] - one.lab[0])
      return { ...family, shades: all }
    })
    .filter(({ shades }) => shades.length > 0)
}
