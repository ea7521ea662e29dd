import type { ActionResult } from '@/lib/errors'
import type { DeleteShadesAnswer, ImportPreview, ShadeView } from '@/lib/shades/present'
import type { z } from 'zod'
import type {
  createShadeSchema,
  deleteShadesSchema,
  importShadesSchema,
  previewImportSchema,
  reorderShadesSchema,
  restoreShadesSchema,
  setShadeStatusSchema,
  updateShadeSchema,
} from '@/lib/shades/schema'

type Action<Schema extends z.ZodType, Data> = (
  brand: string,
  input: z.input<Schema>,
) => Promise<ActionResult<Data>>

/** The actions that a page hands to the components of a line's shades. */
export interface ShadesActions {
  create: Action<typeof createShadeSchema, ShadeView>
  update: Action<typeof updateShadeSchema, ShadeView>
  setStatus: Action<typeof setShadeStatusSchema, { changed: number }>
  reorder: Action<typeof reorderShadesSchema, { place: number }>
  remove: Action<typeof deleteShadesSchema, DeleteShadesAnswer>
  restore: Action<typeof restoreShadesSchema, { restored: number }>
  preview: Action<typeof previewImportSchema, ImportPreview>
  import: Action<typeof importShadesSchema, Record<'new' | 'changed' | 'unchanged' | 'bad', number>>
}

/** The line whose shades are shown, as addresses name it. */
export interface LinePlace {
  brand: string
  lineSlug: string
}

/** Where a line's shades, or a page under them, stand. */
export const shadesHref = ({ brand, lineSlug }: LinePlace, under = ''): string =>
  `/${brand}/lines/${lineSlug}/shades${under}`
