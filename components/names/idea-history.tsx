import { MOVE_WORDS } from '@/lib/names/constants'
import type { ToldMove } from '@/lib/names/present'

import { minuteInWords, nameOf } from './said-when'

/** Everything that was done with an idea, oldest first: who, what, when, and why. */
export function IdeaHistory({ moves }: { moves: readonly ToldMove[] }) {
  return (
    <ol role="list" className="max-w-measure space-y-2.5">
      {moves.map(({ id, person, move, text, shadeLabel, reason, at }) => (
        <li key={id}>
          <p>
            <span className="font-semibold">{nameOf(person)}</span> {MOVE_WORDS[move]}
            {move === 'add' || move === 'reword' ? `: “${text}”` : ''}
            {move === 'place' ? `: ${shadeLabel ?? 'the heap'}` : ''}
            {move === 'add' && shadeLabel ? `, for ${shadeLabel}` : ''}
          </p>
          {reason ? (
            <p className="break-words whitespace-pre-line text-ink-soft">{reason}</p>
          ) : null}
          <p className="text-sm text-ink-faint">{minuteInWords(at)}</p>
        </li>
      ))}
    </ol>
  )
}
