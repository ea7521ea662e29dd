'use client'

import { Note } from '@/components/layout/note'
import { Switch } from '@/components/ui/checkbox'
import { Kbd } from '@/components/ui/kbd'

import { KEY_FACES } from './key-hint'
import { REVIEW_KEYS, useKeysOn, type ReviewDeed } from './review-keys'

const DECIDERS: readonly ReviewDeed[] = [
  'yes',
  'unsure',
  'no',
  'comment',
  'approve',
  'return',
  'put-by',
  'undo',
]

/** The single keys of the review with what each does, and the switch that turns them off. */
export function ReviewKeysNote({ decides }: { decides: boolean }) {
  const [on, choose] = useKeysOn()
  const keys = REVIEW_KEYS.filter(({ deed }) => decides || !DECIDERS.includes(deed))
  return (
    <Note title="By keyboard">
      <Switch
        label="Single keys"
        hint="They work while you are not writing. Off, all is done by Tab and Enter."
        checked={on}
        onChange={(event) => choose(event.target.checked)}
      />
      {on ? (
        <dl className="pt-1">
          {keys.map(({ key, words }) => (
            <div key={key} className="flex items-baseline gap-3 py-0.5">
              <dt className="w-7 shrink-0 text-center">
                <Kbd>{KEY_FACES[key] ?? key.toUpperCase()}</Kbd>
              </dt>
              <dd>{words}</dd>
            </div>
          ))}
        </dl>
      ) : null}
      <p>In a field: Ctrl or ⌘ with Enter sends what you wrote, Escape leads back to the name.</p>
    </Note>
  )
}
