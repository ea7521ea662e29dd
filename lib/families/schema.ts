import { z } from 'zod'

import { oneLine, SHADE_LIMITS } from '@/lib/shades/constants'

import { FAMILY_LIMITS } from './constants'

const familyName = z
  .string()
  .transform(oneLine)
  .refine((text) => !/\p{Cc}/u.test(text), 'There is a character in it that cannot be printed.')
  .pipe(
    z
      .string()
      .min(1, 'Give the family a name.')
      .max(FAMILY_LIMITS.name, `Keep the name to ${FAMILY_LIMITS.name} characters.`),
  )

/** Which line, and the version of its families that the edit was made from. */
const edits = { lineSlug: z.string(), version: z.number().int() }

const shadeIds = z.array(z.uuid()).min(1, 'Choose at least one shade.').max(SHADE_LIMITS.perLine)

const count = z
  .number()
  .int('Give a whole number.')
  .min(FAMILY_LIMITS.least, `Ask for at least ${FAMILY_LIMITS.least} families.`)
  .max(FAMILY_LIMITS.most, `Ask for at most ${FAMILY_LIMITS.most} families.`)
  .nullable()

/** All shades to sort anew, into so many hue families; null lets the computation choose. */
export const sortIntoFamiliesSchema = z.strictObject({ ...edits, count })
/** A parsed request to sort. */
export type SortIntoFamiliesInput = z.output<typeof sortIntoFamiliesSchema>

/** What sorting anew would do. */
export const previewSortSchema = z.strictObject({ lineSlug: z.string(), count })
/** A parsed request to preview a sort. */
export type PreviewSortInput = z.output<typeof previewSortSchema>

/** A family to name. */
export const renameFamilySchema = z.strictObject({
  ...edits,
  familyId: z.uuid(),
  name: familyName,
})
/** A parsed new name. */
export type RenameFamilyInput = z.output<typeof renameFamilySchema>

/** A family whose shades all go into another. */
export const mergeFamiliesSchema = z.strictObject({
  ...edits,
  familyId: z.uuid(),
  intoId: z.uuid(),
})
/** A parsed merger. */
export type MergeFamiliesInput = z.output<typeof mergeFamiliesSchema>

/** A family to part in two. */
export const splitFamilySchema = z.strictObject({ ...edits, familyId: z.uuid() })
/** A parsed split. */
export type SplitFamilyInput = z.output<typeof splitFamilySchema>

/** Shades that go to another family; null makes a new one of them. */
export const moveShadesToFamilySchema = z.strictObject({
  ...edits,
  shadeIds,
  familyId: z.uuid().nullable(),
})
/** A parsed move. */
export type MoveShadesToFamilyInput = z.output<typeof moveShadesToFamilySchema>

/** Shades to pin where they are, or to let go. */
export const pinShadesSchema = z.strictObject({ ...edits, shadeIds, pinned: z.boolean() })
/** A parsed pinning. */
export type PinShadesInput = z.output<typeof pinShadesSchema>

/** All shades of a family in the order wished for; null goes back to light to dark. */
export const orderFamilyShadesSchema = z.strictObject({
  ...edits,
  familyId: z.uuid(),
  shadeIds: shadeIds.nullable(),
})
/** A parsed order of shades. */
export type OrderFamilyShadesInput = z.output<typeof orderFamilyShadesSchema>

/** All families of the line in the order wished for. */
export const orderFamiliesSchema = z.strictObject({
  ...edits,
  familyIds: z.array(z.uuid()).min(1).max(FAMILY_LIMITS.perLine),
})
/** A parsed order of families. */
export type OrderFamiliesInput = z.output<typeof orderFamiliesSchema>

/** The families as they were, and the shades that stood elsewhere: what takes an edit back. */
export const formerFamiliesSchema = z.strictObject({
  count,
  families: z
    .array(
      z.strictObject({
        id: z.uuid(),
        name: familyName,
        nameGiven: z.boolean(),
        neutral: z.boolean(),
      }),
    )
    .max(FAMILY_LIMITS.perLine),
  shades: z
    .array(
      z.strictObject({
        id: z.uuid(),
        familyId: z.uuid(),
        pinned: z.boolean(),
        position: z.number().int().min(0).max(SHADE_LIMITS.perLine).nullable(),
      }),
    )
    .max(SHADE_LIMITS.perLine),
})
/** The families as they were. */
export type FormerFamilies = z.output<typeof formerFamiliesSchema>

/** An edit to take back. */
export const restoreFamiliesSchema = z.strictObject({ ...edits, former: formerFamiliesSchema })
/** A parsed undo. */
export type RestoreFamiliesInput = z.output<typeof restoreFamiliesSchema>
