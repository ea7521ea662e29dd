import { isSameColor, type ColorColumns } from './color'
import { numberKey, type CsvRow, type CsvShade } from './csv'
import type { ShadeRow } from './present'
import { SHADE_STATUSES, type CsvField } from './constants'

/** A shade as an import would leave it. */
export type PlannedShade = Pick<ShadeRow, 'number' | 'status' | 'position'> & ColorColumns

/** What an import would do with one row. */
export type PlannedRow = { row: CsvRow } & (
  | { outcome: 'bad' }
  | { outcome: 'new'; shade: PlannedShade; draft: string | null }
  | {
      outcome: 'changed'
      shade: PlannedShade
      before: ShadeRow
      /** None when there is a draft only. */
      fields: PlannedField[]
      draft: string | null
    }
  | { outcome: 'unchanged'; before: ShadeRow }
)

/** What may change in a shade. */
export type PlannedField = Extract<CsvField, 'number' | 'status' | 'order'> | 'color'

/**
 * Sets the rows of a file against the shades of a line, by number in any case. What a file does not
 * say stays; a new shade without status is a target, and without order comes last. A name becomes a
 * draft, unless the shade is called so or has that idea already. A row whose new shade would have no
 * colour turns bad.
 * @param texts what the ideas on each shade say, by its id
 */
export function planImport(
  rows: readonly CsvRow[],
  existing: readonly ShadeRow[],
  texts: ReadonlyMap<string, ReadonlySet<string>>,
): PlannedRow[] {
  const byNumber = new Map(existing.map((shade) => [numberKey(shade.number), shade]))
  let last = existing.reduce((most, { position }) => Math.max(most, position), -1)
  return rows.map((row): PlannedRow => {
    if (!row.shade) return { row, outcome: 'bad' }
    const before = byNumber.get(numberKey(row.shade.number))
    if (before) return planChange(row, row.shade, before, texts.get(before.id))
    const { number, name: draft = null, status = SHADE_STATUSES[0], color, position } = row.shade
    if (!color) {
      const message = 'a new shade needs a colour: choose columns for L, a and b, or for hex'
      return { row: { ...row, shade: null, errors: [{ field: 'L', message }] }, outcome: 'bad' }
    }
    const shade = { number, status, ...color, position: position ?? last + 1 }
    last = Math.max(last, shade.position)
    return { row, outcome: 'new', shade, draft }
  })
}

function planChange(
  row: CsvRow,
  csv: CsvShade,
  before: ShadeRow,
  texts: ReadonlySet<string> | undefined,
): PlannedRow {
  const fields: PlannedField[] = []
  if (csv.number !== before.number) fields.push('number')
  if (csv.status !== undefined && csv.status !== before.status) fields.push('status')
  if (csv.color && !isSameColor(csv.color, before)) fields.push('color')
  if (csv.position !== undefined && csv.position !== before.position) fields.push('order')
  const { name } = csv
  const draft = name && name !== before.name && !texts?.has(name) ? name : null
  if (fields.length === 0 && draft === null) return { row, outcome: 'unchanged', before }
  const color = fields.includes('color') && csv.color ? csv.color : before
  const shade = {
    number: csv.number,
    status: csv.status ?? before.status,
    position: csv.position ?? before.position,
    labL: color.labL,
    labA: color.labA,
    labB: color.labB,
    illuminant: color.illuminant,
    observer: color.observer,
    hex: color.hex,
  }
  return { row, outcome: 'changed', shade, before, fields, draft }
}

/** How many rows an import would treat how. */
export type ImportCounts = Record<PlannedRow['outcome'], number>

/** Counts the rows of a plan by outcome. */
export function countPlan(plan: readonly PlannedRow[]): ImportCounts {
  const counts: ImportCounts = { new: 0, changed: 0, unchanged: 0, bad: 0 }
  for (const { outcome } of plan) counts[outcome] += 1
  return counts
}
