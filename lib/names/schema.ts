import { z } from 'zod'

import { oneLine, SHADE_LIMITS } from '@/lib/shades/constants'

import {
  LABEL_RANGES,
  LISTED_STATES,
  NAME_LIMITS,
  NAME_SORTS,
  NAME_STATES,
  NAME_VOTES,
  SEARCH_OUTCOMES,
} from './constants'

const printable = (text: string) => !/[^\P{Cc}\n\t]/u.test(text)
const UNPRINTABLE = 'There is a character in it that cannot be printed.'

const line = (what: string, most: number, { empty }: { empty?: string } = {}) =>
  z
    .string()
    .transform(oneLine)
    .refine(printable, UNPRINTABLE)
    .pipe(
      z
        .string()
        .min(empty ? 1 : 0, empty)
        .max(most, `Keep ${what} to ${most} characters.`),
    )

const lines = (what: string, most: number) =>
  z
    .string()
    .transform((text) => text.normalize('NFC').replace(/\r\n?/g, '\n').trim())
    .refine(printable, UNPRINTABLE)
    .pipe(z.string().max(most, `Keep ${what} to ${most.toLocaleString('en-GB')} characters.`))

/** A name as somebody thinks of it: one line, as it would be printed. */
export const nameText = line('the name', NAME_LIMITS.text, { empty: 'Write a name.' })
/** The thought behind a name; may be empty. */
export const nameNote = lines('the note', NAME_LIMITS.note)

const inLine = { lineSlug: z.string() }
const ideaIds = z.array(z.uuid()).min(1, 'Choose at least one name.').max(NAME_LIMITS.perLine)
const reason = lines('the reason', NAME_LIMITS.reason)
const given = reason.refine((text) => text !== '', 'Say why.')

/** One idea, for a shade or for the heap. */
export const addIdeaSchema = z.strictObject({
  ...inLine,
  shadeId: z.uuid().nullable(),
  text: nameText,
  note: nameNote.default(''),
  requestKey: z.uuid(),
})
/** A parsed new idea. */
export type AddIdeaInput = z.output<typeof addIdeaSchema>

/** Many ideas at once, as they stand in the preview. */
export const addIdeasSchema = z.strictObject({
  ...inLine,
  ideas: z
    .array(
      z.strictObject({ text: nameText, note: nameNote.default(''), shadeId: z.uuid().nullable() }),
    )
    .min(1, 'There is no name in it.')
    .max(NAME_LIMITS.atOnce, `Add at most ${NAME_LIMITS.atOnce} at once.`),
  requestKey: z.uuid(),
})
/** Parsed new ideas. */
export type AddIdeasInput = z.output<typeof addIdeasSchema>

/** Text to look at: names one a line, or a CSV file. */
export const previewIdeasSchema = z.strictObject({
  ...inLine,
  text: z
    .string()
    .max(NAME_LIMITS.importText, 'The text is over 500 kB. Bring it in smaller parts.'),
  kind: z.enum(['lines', 'csv']),
})
/** A parsed request for a preview. */
export type PreviewIdeasInput = z.output<typeof previewIdeasSchema>

/** A change of an idea's words; a field left out stays. */
export const editIdeaSchema = z.strictObject({
  ...inLine,
  ideaId: z.uuid(),
  version: z.number().int(),
  text: nameText.optional(),
  note: nameNote.optional(),
  wordingReason: reason.optional(),
})
/** A parsed change of words. */
export type EditIdeaInput = z.output<typeof editIdeaSchema>

/** Ideas to lay on shades, or back on the heap. */
export const placeIdeasSchema = z.strictObject({
  ...inLine,
  placements: z
    .array(z.strictObject({ ideaId: z.uuid(), shadeId: z.uuid().nullable() }))
    .min(1, 'Choose at least one name.')
    .max(NAME_LIMITS.dealt),
})
/** Parsed placements. */
export type PlaceIdeasInput = z.output<typeof placeIdeasSchema>

/** Ideas that all make one move that asks for no reason. */
export const moveIdeasSchema = z.strictObject({
  ...inLine,
  /** As they were seen: one that stands otherwise by now stays as it is. */
  from: z.enum(NAME_STATES).optional(),
  ideaIds: ideaIds.max(
    NAME_LIMITS.together,
    `Choose at most ${NAME_LIMITS.together} names at once.`,
  ),
})
/** Parsed ideas to move. */
export type MoveIdeasInput = z.output<typeof moveIdeasSchema>

/** A decision on one idea, as the decider has seen it. */
export const decideIdeaSchema = z.strictObject({
  ...inLine,
  ideaId: z.uuid(),
  version: z.number().int(),
  reason: reason.default(''),
})
/** A parsed decision. */
export type DecideIdeaInput = z.output<typeof decideIdeaSchema>

/** Ideas to delete, or to bring back. */
export const deleteIdeasSchema = z.strictObject({ ...inLine, ideaIds })
/** Parsed ideas to delete. */
export type DeleteIdeasInput = z.output<typeof deleteIdeasSchema>

/** What a reviewer says of an idea; null takes it back. */
export const voteSchema = z.strictObject({
  ...inLine,
  ideaId: z.uuid(),
  round: z.number().int(),
  vote: z.enum(NAME_VOTES).nullable(),
  comment: lines('the comment', NAME_LIMITS.comment).default(''),
})
/** A parsed vote. */
export type VoteInput = z.output<typeof voteSchema>

/** A remark on an idea. */
export const addRemarkSchema = z.strictObject({
  ...inLine,
  ideaId: z.uuid(),
  text: lines('the remark', NAME_LIMITS.remark).refine((text) => text !== '', 'Write something.'),
  requestKey: z.uuid(),
})
/** A parsed remark. */
export type AddRemarkInput = z.output<typeof addRemarkSchema>

/** A search in a register of marks that somebody made. */
export const recordSearchSchema = z.strictObject({
  ...inLine,
  ideaId: z.uuid(),
  register: line('the register', NAME_LIMITS.register, { empty: 'Say which register.' }),
  searchedBy: line('the name', NAME_LIMITS.searchedBy, { empty: 'Say who searched.' }),
  searchedOn: z.iso.date('Give the day of the search.'),
  outcome: z.enum(SEARCH_OUTCOMES),
  note: lines('the note', NAME_LIMITS.note).default(''),
  requestKey: z.uuid(),
})
/** A parsed search. */
export type RecordSearchInput = z.output<typeof recordSearchSchema>

/** A search to remove from the record. */
export const removeSearchSchema = z.strictObject({ ...inLine, searchId: z.uuid() })
/** A parsed removal. */
export type RemoveSearchInput = z.output<typeof removeSearchSchema>

const measure = (what: string, [least, most]: readonly [number, number]) =>
  z.coerce
    .number(`Give ${what} as a number.`)
    .min(least, `At least ${least}.`)
    .max(most, `At most ${most}.`)

const labelSetting = {
  labelWidth: measure('the width in millimetres', LABEL_RANGES.width),
  labelSize: measure('the size in points', LABEL_RANGES.size),
  labelLines: z.union([z.literal(1), z.literal(2)]),
}

/** Theme words as a list, or as a form has them: with commas between. */
const themes = z
  .union([
    z.string().transform((text) => text.split(/[,;\n]/).filter((word) => word.trim() !== '')),
    z.array(z.string()),
  ])
  .pipe(
    z
      .array(line('a theme word', NAME_LIMITS.theme, { empty: 'Write a word.' }))
      .max(NAME_LIMITS.themes, `At most ${NAME_LIMITS.themes} theme words.`),
  )
  .transform((words) => [...new Set(words)])

/** How names are set, dated and decided on; version 0 while nobody has set anything. */
export const namingSettingsSchema = z.strictObject({
  ...inLine,
  ...labelSetting,
  version: z.number().int(),
  care: line('the care', NAME_LIMITS.care),
  themes,
  printOn: z.union([z.iso.date('Give a date.'), z.literal('').transform(() => null), z.null()]),
  reviewerIds: z.array(z.uuid()).max(NAME_LIMITS.reviewers),
})
/** What the form holds before parsing. */
export type NamingSettingsValues = z.input<typeof namingSettingsSchema>
/** Parsed settings. */
export type NamingSettingsInput = z.output<typeof namingSettingsSchema>

/** Labels to look at as they would be set. */
export const previewLabelsSchema = z.strictObject({ ...inLine, ...labelSetting })
/** A parsed setting to look at. */
export type PreviewLabelsInput = z.output<typeof previewLabelsSchema>

/** Names to lock from now on, by somebody who has seen the settings as they are. */
export const freezeNamesSchema = z.strictObject({ ...inLine, version: z.number().int() })
/** A parsed freeze. */
export type FreezeNamesInput = z.output<typeof freezeNamesSchema>

/** A freeze to lift, and why. */
export const liftFreezeSchema = z.strictObject({
  ...inLine,
  version: z.number().int(),
  reason: given,
})
/** A parsed lifting. */
export type LiftFreezeInput = z.output<typeof liftFreezeSchema>

/** A name to check while it is being written. */
export const checkNameSchema = z.strictObject({
  ...inLine,
  text: nameText,
  shadeId: z.uuid().nullable(),
  ideaId: z.uuid().nullable().default(null),
})
/** A parsed name to check. */
export type CheckNameInput = z.output<typeof checkNameSchema>

/** A shade to make names up for. */
export const proposeNamesSchema = z.strictObject({
  ...inLine,
  shadeId: z.uuid(),
  themes: z.array(line('a theme word', NAME_LIMITS.theme)).max(NAME_LIMITS.themes).default([]),
})
/** A parsed request for names. */
export type ProposeNamesInput = z.output<typeof proposeNamesSchema>

/** A line whose heap is to be dealt; `without` are ideas that stay where they are. */
export const dealIdeasSchema = z.strictObject({
  ...inLine,
  without: z.array(z.uuid()).max(NAME_LIMITS.perLine).default([]),
})
/** A parsed request to deal. */
export type DealIdeasInput = z.output<typeof dealIdeasSchema>

/** A line whose shades are wanted, to lay a name on one. */
export const listNameableSchema = z.strictObject(inLine)
/** A parsed request for them. */
export type ListNameableInput = z.output<typeof listNameableSchema>

const several = <const T extends string>(known: readonly T[]) =>
  z
    .string()
    .transform((text) => known.filter((one) => text.split(',').includes(one)))
    .catch([])

/** The address of the list of names. Nonsense in it gives the default of that part. */
export const nameListSchema = z.object({
  q: z.string().trim().max(SHADE_LIMITS.search).catch(''),
  state: several(LISTED_STATES),
  family: z.union([z.uuid(), z.literal('none'), z.literal('')]).catch(''),
  warned: z
    .literal('1')
    .transform(() => true)
    .catch(false),
  sort: z.enum(NAME_SORTS).catch('order'),
  dir: z.enum(['asc', 'desc']).catch('asc'),
  page: z.coerce.number().int().min(1).max(10_000).catch(1),
})
/** A parsed address of the list. */
export type NameListFilter = z.output<typeof nameListSchema>

/** The heap's address. */
export const heapAddressSchema = z.object({
  q: z.string().trim().max(SHADE_LIMITS.search).catch(''),
  put: z
    .literal('by')
    .transform(() => true)
    .catch(false),
  page: z.coerce.number().int().min(1).max(10_000).catch(1),
})
/** A parsed address of the heap. */
export type HeapFilter = z.output<typeof heapAddressSchema>

/** The review's address: which idea is looked at; any other begins with the first. */
export const reviewAddressSchema = z.object({
  idea: z.uuid().nullable().catch(null),
})
