import { authorize, type Actor } from '@/lib/auth/actor'
import { readTextsOnShades } from '@/lib/names/write-drafts'

import { guessMapping, mappingProblems, readRows } from './csv'
import { badRowsCsv, parseSheet } from './csv-text'
import { countPlan, planImport } from './plan-import'
import { canEditShades } from './policy'
import { presentPlannedRow, type ImportPreview } from './present'
import { listAllShades } from './queries'
import { SHADE_LIMITS } from './constants'
import type { PreviewImportInput } from './schema'

/** Rows of the file that stand beside the choice of columns. */
const EXAMPLES = 3

/**
 * Says what importing a CSV file would do, and saves nothing. Three queries; some tenths of a second
 * for 5,000 rows.
 * @throws NotFoundError, ForbiddenError
 * @throws InvalidError when the text is no CSV file of shades
 */
export async function previewImport(
  actor: Actor,
  { lineSlug, text, mapping: chosen, terms }: PreviewImportInput,
): Promise<ImportPreview> {
  authorize(actor, canEditShades)
  const { line, shades } = await listAllShades(actor, lineSlug)
  const sheet = parseSheet(text)
  const mapping = chosen ?? guessMapping(sheet.header)
  const problems = mappingProblems(mapping, terms)
  const plan =
    problems.length > 0
      ? []
      : planImport(readRows(sheet, mapping, terms), shades, await readTextsOnShades(line))
  const counts = countPlan(plan)
  if (shades.length + counts.new > SHADE_LIMITS.perLine) {
    problems.push(
      `With these the line would hold ${shades.length + counts.new} shades; it holds at most ${SHADE_LIMITS.perLine}.`,
    )
  }
  const bad = plan.filter(({ outcome }) => outcome === 'bad').map(({ row }) => row)
  return {
    header: sheet.header,
    examples: sheet.rows.slice(0, EXAMPLES).map(({ cells }) => cells),
    rowCount: sheet.rows.length,
    mapping,
    problems,
    counts,
    rows: plan.map(presentPlannedRow),
    badCsv: bad.length > 0 ? badRowsCsv(sheet.header, bad) : null,
    shadesRevision: line.shadesRevision,
  }
}
