import { lineObject } from '@/lib/activity/objects'
import { recordActivity } from '@/lib/activity/record'
import type { Actor } from '@/lib/auth/actor'

import { inTransaction } from '@/models'

import { shadesToCsv } from './csv'
import { listAllShades } from './queries'

/**
 * All shades of a line as a CSV file that imports again unchanged; taking it away is recorded.
 * @throws NotFoundError
 */
export async function exportShades(
  actor: Actor,
  lineSlug: string,
): Promise<{ fileName: string; text: string }> {
  const { line, shades } = await listAllShades(actor, lineSlug)
  await inTransaction((transaction) =>
    recordActivity(
      actor,
      { action: 'shade.exported', object: lineObject(line), after: { count: shades.length } },
      transaction,
    ),
  )
  return { fileName: `${line.slug}-shades.csv`, text: shadesToCsv(shades) }
}
