import { ChevronRight } from 'lucide-react'

import { DayLedger } from '@/components/ui/day-ledger'
import type { ActivityDay, ActivityView, FieldChange } from '@/lib/activity/present'

/** The record day by day, newest first; what was different in an entry is opened on demand. */
export function ActivityDays({ days }: { days: readonly ActivityDay[] }) {
  return <DayLedger days={days}>{(entry) => <Entry key={entry.id} entry={entry} />}</DayLedger>
}

function Entry({ entry }: { entry: ActivityView }) {
  return (
    <li className="flex gap-4 py-2.5">
      <time dateTime={entry.at} className="shrink-0 text-ink-faint tabular-nums">
        {entry.time}
      </time>
      <div className="min-w-0 grow">
        <p className="max-w-measure break-words">
          <span className="font-semibold">{entry.person}</span> {entry.sentence}
        </p>
        {entry.changes.length > 0 ? (
          <details className="group mt-1">
            <summary className="inline-flex min-h-8 cursor-pointer list-none items-center gap-1 text-sm text-ink-soft hover:text-ink pointer-coarse:min-h-11 [&::-webkit-details-marker]:hidden">
              <ChevronRight
                aria-hidden="true"
                className="size-4 transition-transform group-open:rotate-90 motion-reduce:transition-none"
              />
              In detail<span className="sr-only">: {entry.sentence}</span>
            </summary>
            <dl className="mt-1 mb-2 max-w-measure divide-y divide-hairline text-sm">
              {entry.changes.map((change) => (
                <Change key={change.field} change={change} />
              ))}
            </dl>
          </details>
        ) : null}
      </div>
    </li>
  )
}

function Change({ change: { field, before, after } }: { change: FieldChange }) {
  return (
    <div className="flex flex-wrap gap-x-4 py-1.5">
      <dt className="w-32 shrink-0 text-ink-faint">{field}</dt>
      <dd className="min-w-0 grow basis-48 break-words">
        {before === null ? null : (
          <del className="text-ink-faint no-underline">
            {after === null ? '' : 'was '}
            {before}
          </del>
        )}
        {before !== null && after !== null ? '; now ' : null}
        {after}
      </dd>
    </div>
  )
}
