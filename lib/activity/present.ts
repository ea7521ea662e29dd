import type { Activity } from '@/models'

import { ACTIONS, FIELD_WORDS, type ActionWords, type ActivityAction, type Told } from './constants'
import type { ActivityRow } from './queries'

/** One field of an entry: as it was, and as it is. */
export interface FieldChange {
  field: string
  /** Null where the entry does not say. */
  before: string | null
  after: string | null
}

/** An entry of the record as the studio shows it. */
export interface ActivityView {
  id: string
  /** ISO 8601. */
  at: string
  /** "14:05", in UTC. */
  time: string
  /** Null once the account is closed. */
  personId: string | null
  person: string
  /** "Combination renamed". */
  action: string
  /** What follows the person's name: "renamed the combination Low Sun to Evening Sun". */
  sentence: string
  changes: FieldChange[]
  requestId: string | null
}

/** The entries of one day. */
export interface ActivityDay {
  /** ISO 8601, in UTC. */
  date: string
  /** "Tuesday 1 December 2026". */
  heading: string
  entries: ActivityView[]
}

const A_FORMER_MEMBER = 'a former member'

const fullDate = new Intl.DateTimeFormat('en-GB', { dateStyle: 'full', timeZone: 'UTC' })

/** An entry as its view. */
export function presentActivity({ entry, about }: ActivityRow): ActivityView {
  const at = entry.createdAt.toISOString()
  const told: Told = {
    label: entry.objectKind === 'person' ? (about ?? A_FORMER_MEMBER) : (entry.objectLabel ?? ''),
    before: entry.before ?? {},
    after: entry.after ?? {},
  }
  const words: ActionWords = ACTIONS[entry.action as ActivityAction] ?? unknownAction(entry.action)
  return {
    id: entry.id,
    at,
    time: at.slice(11, 16),
    personId: entry.personId,
    person: entry.person?.name ?? 'A former member',
    action: words.label,
    sentence: words.says(told),
    changes: words.saysAll ? [] : changesIn(entry),
    requestId: entry.requestId,
  }
}

// The record is kept for longer than the names of what the product does.
const unknownAction = (action: string) => ({
  label: action,
  says: ({ label }: Told) => `${action} ${label}`.trim(),
})

function changesIn({ before, after }: Activity): FieldChange[] {
  const fields = new Set([...Object.keys(before ?? {}), ...Object.keys(after ?? {})])
  return [...fields].map((field) => ({
    field: FIELD_WORDS[field] ?? field.replace(/[A-Z]/g, (letter) => ` ${letter.toLowerCase()}`),
    before: before && field in before ? valueInWords(before[field]) : null,
    after: after && field in after ? valueInWords(after[field]) : null,
  }))
}

/** A value of any field: "none", "yes", "Moss, Fern", "70 % …" as the field holds it. */
function valueInWords(value: unknown): string {
  if (value === null || value === '') return 'none'
  if (typeof value === 'boolean') return value ? 'yes' : 'no'
  if (Array.isArray(value)) return value.map(valueInWords).join(', ') || 'none'
  if (typeof value === 'object') return Object.values(value).map(valueInWords).join(' ')
  return String(value)
}

/** Entries, newest first, put together by day. */
export function presentDays(entries: readonly ActivityRow[]): ActivityDay[] {
  const days: ActivityDay[] = []
  for (const view of entries.map(presentActivity)) {
    const date = view.at.slice(0, 10)
    const last = days.at(-1)
    if (last?.date === date) last.entries.push(view)
    else days.push({ date, heading: fullDate.format(new Date(view.at)), entries: [view] })
  }
  return days
}
