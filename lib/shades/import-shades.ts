import { randomUUID } from 'node:crypto'

import { countAndName, lineObject } from '@/lib/activity/objects'
import { recordActivity } from '@/lib/activity/record'
import type { Actor } from '@/lib/auth/actor'
import { ConflictError, InvalidError } from '@/lib/errors'
import { readTextsOnShades, writeDrafts, type NewDraft } from '@/lib/names/write-drafts'
import { Shade } from '@/models'

import { changeShades, requireRoom } from './change-shades'
import { mappingProblems, readRows } from './csv'
import { parseSheet } from './csv-text'
import { countPlan, planImport, type ImportCounts, type PlannedShade } from './plan-import'
import { shadeLabel, SHADE_VIEW_COLUMNS } from './present'
import { BY_POSITION } from './queries'
import type { ImportShadesInput } from './schema'

/** Rows of one INSERT; bounds its text to about half a megabyte. */
const BATCH = 1_000

/**
 * Saves the good rows of a CSV file, all or none, in a few queries whatever their number; names in
 * it become drafts. The same file again changes nothing and is no error.
 * @throws NotFoundError, ForbiddenError
 * @throws InvalidError when the text is no CSV file of shades
 * @throws ConflictError when the line's shades changed since the preview, or the line is full
 */
export async function importShades(
  actor: Actor,
  { lineSlug, text, mapping, terms, shadesRevision }: ImportShadesInput,
): Promise<ImportCounts> {
  const sheet = parseSheet(text)
  const [problem] = mappingProblems(mapping, terms)
  if (problem) throw new InvalidError(problem)
  const rows = readRows(sheet, mapping, terms)

  return changeShades(actor, lineSlug, async (line, transaction) => {
    const where = { brandId: actor.brandId, lineId: line.id }
    const existing = await Shade.findAll({
      attributes: [...SHADE_VIEW_COLUMNS],
      where,
      order: BY_POSITION,
      raw: true,
      transaction,
    })
    const plan = planImport(rows, existing, await readTextsOnShades(line, transaction))
    const counts = countPlan(plan)
    const changed = counts.new + counts.changed > 0
    if (changed && line.shadesRevision !== shadesRevision) {
      throw new ConflictError(
        'The shades of this line changed since you looked. Nothing was saved: look at what the file would do now, then import again.',
      )
    }
    requireRoom(existing.length, counts.new)
    const saves: SavedShade[] = []
    const drafts: NewDraft[] = []
    const labels: string[] = []
    for (const planned of plan) {
      if (planned.outcome !== 'new' && planned.outcome !== 'changed') continue
      const { id, version, name } =
        planned.outcome === 'changed'
          ? planned.before
          : { id: randomUUID(), version: 0, name: null }
      if (planned.outcome === 'new' || planned.fields.length > 0)
        saves.push({ ...planned.shade, ...where, id, version: version + 1 })
      if (planned.draft !== null) drafts.push({ text: planned.draft, shadeId: id })
      labels.push(shadeLabel({ number: planned.shade.number, name }))
    }
    for (let at = 0; at < saves.length; at += BATCH) {
      await Shade.bulkCreate(saves.slice(at, at + BATCH), {
        updateOnDuplicate: [...UPDATED],
        transaction,
      })
    }
    if (changed) {
      await writeDrafts(actor, { line, transaction }, drafts)
      const { named } = countAndName(labels)
      await recordActivity(
        actor,
        { action: 'shade.imported', object: lineObject(line), after: { ...counts, named } },
        transaction,
      )
    }
    return { answer: counts, changed }
  })
}

/** A new shade, or the next version of one whose line is locked. */
type SavedShade = PlannedShade & {
  id: string
  brandId: string
  lineId: string
  version: number
}

const UPDATED = [
  'number',
  'status',
  'position',
  'labL',
  'labA',
  'labB',
  'illuminant',
  'observer',
  'hex',
  'version',
  'updatedAt',
] as const
