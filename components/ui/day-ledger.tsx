import type { ReactNode } from 'react'

import { LedgerList } from './ledger'

/** A day and what happened on it. */
interface Day<Entry> {
  /** yyyy-mm-dd */
  date: string
  heading: string
  entries: readonly Entry[]
}

/** What happened, day by day; an entry is a list item. */
export function DayLedger<Entry>({
  days,
  children,
}: {
  days: readonly Day<Entry>[]
  children: (entry: Entry) => ReactNode
}) {
  return (
    <div className="space-y-8">
      {days.map((day) => (
        <section key={day.date} aria-labelledby={`day-${day.date}`}>
          <h2 id={`day-${day.date}`} className="mb-2 text-lg">
            <time dateTime={day.date}>{day.heading}</time>
          </h2>
          <LedgerList>{day.entries.map(children)}</LedgerList>
        </section>
      ))}
    </div>
  )
}
