import { z } from 'zod'

import {
  LICENCES,
  type Licence,
  PHOTOGRAPH_LIMITS,
  GALLERY_STATES,
  GALLERY_MISSING,
} from './constants'
import { ACTIVE_ENDING, FORMATS_TAKEN, MAX_BYTES, UPLOAD_MIMES } from './formats'
import { readWishes } from './wishes'

const text = (most: number, what: string) =>
  z.string().trim().max(most, `Keep ${what} to ${most} characters.`)

const link = (what: string) =>
  text(PHOTOGRAPH_LIMITS.url, what).refine(
    (value) => value === '' || /^https?:\/\/[^\s/]+\.[^\s]+$/i.test(value),
    `Give ${what} in full, like https://…`,
  )

/** What a browser tells of a file before it sends it. */
export const requestUploadSchema = z.strictObject({
  lineSlug: z.string().max(100),
  fileName: z
    .string()
    .min(1)
    .max(PHOTOGRAPH_LIMITS.fileName, 'The file’s name is too long.')
    .refine(
      (name) => !ACTIVE_ENDING.test(name),
      'The file’s name ends like a page or a program. Name it as a photograph, like hillside.jpg.',
    ),
  contentType: z.enum(UPLOAD_MIMES, `Photographs are taken as ${FORMATS_TAKEN}.`),
  byteLength: z
    .number()
    .int()
    .min(1, 'The file is empty.')
    .max(MAX_BYTES, `A photograph may be up to ${MAX_BYTES / 1e6} MB.`),
  sha256: z.string().regex(/^[0-9a-f]{64}$/),
})
/** A parsed request to upload. */
export type RequestUploadInput = z.output<typeof requestUploadSchema>

/** Names one photograph of the brand. */
export const photographIdSchema = z.strictObject({ photographId: z.uuid() })
/** A parsed id. */
export type PhotographIdInput = z.output<typeof photographIdSchema>

/** A photograph in an address: what is no uuid names nothing, as does an unknown one. */
export const photographParamSchema = z
  .strictObject({ photograph: z.string() })
  .transform(({ photograph }) => ({ photographId: photograph }))

/** A photograph's copy in an address. */
export const derivativeParamsSchema = z
  .strictObject({ photograph: z.string(), name: z.string() })
  .transform(({ photograph, name }) => ({ photographId: photograph, name }))

/** Names some photographs of the brand. */
export const photographIdsSchema = z.strictObject({
  photographIds: z.array(z.uuid()).min(1).max(PHOTOGRAPH_LIMITS.atOnce),
})
/** Parsed ids. */
export type PhotographIdsInput = z.output<typeof photographIdsSchema>

const detailFields = {
  title: text(PHOTOGRAPH_LIMITS.title, 'the title').min(1, 'Give the photograph a title.'),
  photographer: text(PHOTOGRAPH_LIMITS.photographer, 'the name'),
  licence: z.union([z.enum(LICENCES), z.literal('').transform(() => null)]),
  licenceNote: text(PHOTOGRAPH_LIMITS.licenceNote, 'the note'),
  licenceUrl: link('the link to the licence'),
  sourceUrl: link('the link to the source'),
  altText: text(PHOTOGRAPH_LIMITS.altText, 'the description'),
}

/** What a licence asks for beside its name: [field, message] where that is missing. */
function missingForLicence(details: {
  licence: Licence | null
  photographer: string
  licenceNote: string
  licenceUrl: string
}): ['photographer' | 'licenceNote' | 'licenceUrl', string][] {
  const { licence, photographer, licenceNote, licenceUrl } = details
  const missing: ReturnType<typeof missingForLicence> = []
  if (licence === 'permission' && !licenceNote)
    missing.push(['licenceNote', 'Say who gave permission, when, and for what.'])
  if (licence === 'other' && !licenceNote)
    missing.push(['licenceNote', 'Say which licence it is and what it allows.'])
  if (licence === 'cc-by' && !photographer)
    missing.push(['photographer', 'CC BY asks you to name the photographer.'])
  if (licence === 'cc-by' && !licenceUrl)
    missing.push(['licenceUrl', 'Link to the version of CC BY it is under.'])
  return missing
}

/** The form with what is said about a photograph. */
export const updatePhotographSchema = z
  .strictObject({ ...detailFields, photographId: z.uuid(), version: z.number().int() })
  .superRefine((details, context) => {
    for (const [field, message] of missingForLicence(details))
      context.addIssue({ code: 'custom', path: [field], message })
  })
/** What the form holds before parsing. */
export type UpdatePhotographValues = z.input<typeof updatePhotographSchema>
/** A parsed change of what is said. */
export type UpdatePhotographInput = z.output<typeof updatePhotographSchema>

/** The gallery's filter as it stands in the address; what does not fit is left out. */
export const galleryFilterSchema = z.object({
  q: z.string().trim().max(PHOTOGRAPH_LIMITS.search).catch('').default(''),
  state: z.enum(GALLERY_STATES).nullable().catch(null).default(null),
  missing: z.enum(GALLERY_MISSING).nullable().catch(null).default(null),
  page: z.coerce.number().int().min(1).max(10_000).catch(1).default(1),
})
/** A parsed filter. */
export type GalleryFilter = z.output<typeof galleryFilterSchema>

/** Which photographs a page follows. */
export const photographStatesSchema = z.strictObject({
  ids: z
    .string()
    .transform((ids) => ids.split(','))
    .pipe(z.array(z.uuid()).min(1).max(PHOTOGRAPH_LIMITS.atOnce)),
})

/** A photograph in an address, with wishes for its match. */
export const matchParamsSchema = z
  .strictObject({
    photograph: z.string(),
    reading: z.string().optional(),
    lock: z.string().optional(),
    exclude: z.string().optional(),
    apart: z.string().optional(),
  })
  .transform(({ photograph, ...address }, context) => {
    const wishes = readWishes(address)
    if (wishes) return { photographId: photograph, ...wishes }
    context.addIssue({ code: 'custom', message: 'These wishes make no sense together.' })
    return z.NEVER
  })
