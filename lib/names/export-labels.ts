import { lineObject } from '@/lib/activity/objects'
import { recordActivity } from '@/lib/activity/record'
import type { Actor } from '@/lib/auth/actor'
import { neutraliseCell, writeCsv } from '@/lib/shades/csv-text'
import { inTransaction } from '@/models'

import { listLabels } from './list-labels'
import type { LabelView } from './present'

/** The label printer's columns. */
const HEADER = ['number', 'name', 'line 1', 'line 2', 'fibre', 'care', 'dye lot'] as const

/**
 * The approved names of a line for the label printer as a CSV file: the name exactly as it is set
 * and as it breaks, and a blank for the dye lot. Taking it away is recorded.
 * @throws NotFoundError
 */
export async function exportLabels(
  actor: Actor,
  lineSlug: string,
): Promise<{ fileName: string; text: string }> {
  const { line, labels, fibre, settings } = await listLabels(actor, lineSlug)
  await inTransaction((transaction) =>
    recordActivity(
      actor,
      {
        action: 'name.labels-exported',
        object: lineObject(line),
        after: { count: labels.length },
      },
      transaction,
    ),
  )
  const cells = ({ number, name, set }: LabelView) => {
    const [first, second] = set.lines.map(({ text }) => text)
    return [number, name, first ?? '', second ?? '', fibre, settings.care, ''].map(neutraliseCell)
  }
  return { fileName: `${line.slug}-labels.csv`, text: writeCsv([HEADER, ...labels.map(cells)]) }
}
