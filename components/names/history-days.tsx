import { DayLedger } from '@/components/ui/day-ledger'
import { TextLink } from '@/components/ui/text-link'
import { MOVE_WORDS, STATE_WORDS } from '@/lib/names/constants'
import type { MoveView, NameHistoryDay, NameHistoryEntry } from '@/lib/names/present'

import { namesHref, type NamesPlace } from './names-place'
import { nameOf } from './said-when'

/** What happened to a line's names day by day, newest first. */
export function HistoryDays({
  place,
  days,
}: {
  place: NamesPlace
  days: readonly NameHistoryDay[]
}) {
  return (
    <DayLedger days={days}>
      {(entry) => <Entry key={entry.id} place={place} entry={entry} />}
    </DayLedger>
  )
}

function Entry({
  place,
  entry: { at, time, person, told },
}: {
  place: NamesPlace
  entry: NameHistoryEntry
}) {
  return (
    <li className="flex gap-4 py-2.5">
      <time dateTime={at} className="shrink-0 text-ink-faint tabular-nums">
        {time}
      </time>
      {'sentence' in told ? (
        <p className="max-w-measure min-w-0 grow break-words">
          {told.byItself ? null : <span className="font-semibold">{nameOf(person)} </span>}
          {told.sentence}
        </p>
      ) : (
        <div className="max-w-measure min-w-0 grow break-words">
          <p>
            <TextLink
              href={namesHref(place, `/ideas/${told.move.ideaId}`)}
              className="font-title text-ink"
            >
              {told.move.text}
            </TextLink>{' '}
            <span className="text-ink-faint">
              ({told.shade === null ? 'in the heap' : `No. ${told.shade}`})
            </span>
            : <span className="font-semibold">{nameOf(person)}</span> {MOVE_WORDS[told.move.move]}
          </p>
          <p className="text-sm text-ink-soft">
            {stateInWords(told.move)}
            {told.move.reason ? `. Because: ${told.move.reason}` : null}
          </p>
        </div>
      )}
    </li>
  )
}

/** "Draft → In review", or where it stands when that did not change. */
function stateInWords({ from, to }: MoveView): string {
  if (from === null || from === to) return STATE_WORDS[to]
  return `${STATE_WORDS[from]} → ${STATE_WORDS[to]}`
}
