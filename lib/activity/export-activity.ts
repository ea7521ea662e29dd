import type { Actor } from '@/lib/auth/actor'
import { neutraliseCell, writeCsv } from '@/lib/shades/csv-text'
import { inTransaction } from '@/models'

import { presentActivity, type FieldChange } from './present'
import { listActivityForCsv } from './queries'
import { recordActivity } from './record'
import type { ActivityFilter } from './schema'

const HEADER = ['time (UTC)', 'person', 'action', 'what', 'before', 'after', 'request']

/**
 * The newest entries that fit a filter as a CSV file; taking it away is itself recorded. A cell
 * that a spreadsheet would run as a formula (it begins with = + - @, a tab or a line end) begins
 * with an apostrophe instead.
 * @source OWASP, CSV Injection
 */
export async function exportActivity(
  actor: Actor,
  filter: ActivityFilter,
): Promise<{ fileName: string; text: string }> {
  const entries = await listActivityForCsv(actor, filter)
  const asked = Object.entries(filter).filter(([, value]) => value !== null)
  await inTransaction((transaction) =>
    recordActivity(
      actor,
      {
        action: 'activity.exported',
        after: { count: entries.length, ...Object.fromEntries(asked) },
      },
      transaction,
    ),
  )
  const rows = entries
    .map(presentActivity)
    .map((entry) => [
      entry.at,
      entry.person,
      entry.action,
      entry.sentence,
      sideOf(entry.changes, 'before'),
      sideOf(entry.changes, 'after'),
      entry.requestId ?? '',
    ])
  return {
    fileName: `${actor.brandSlug}-activity.csv`,
    text: writeCsv([HEADER, ...rows.map((row) => row.map(neutraliseCell))]),
  }
}

const sideOf = (changes: readonly FieldChange[], side: 'before' | 'after') =>
  changes
    .flatMap((change) => (change[side] === null ? [] : `${change.field}: ${change[side]}`))
    .join('; ')
