'use client'

import { READING_KINDS, type ReadingKind } from '@/lib/color/readings'

import { READING_LABELS } from './types'

/** Chooses which of the five readings is shown; one that this photograph does not give says so. */
export function ReadingChoice({
  reading,
  unavailable,
  onChange,
}: {
  reading: ReadingKind
  unavailable: ReadonlySet<ReadingKind>
  onChange: (reading: ReadingKind) => void
}) {
  return (
    <fieldset className="border-b border-hairline print:hidden">
      <legend className="sr-only">Reading of the photograph</legend>
      <div className="flex flex-wrap gap-x-6">
        {READING_KINDS.map((kind) => (
          <label
            key={kind}
            className="has-focus-visible:outline-focus relative -mb-px inline-flex min-h-10 cursor-pointer items-center border-b-2 border-transparent text-ink-soft hover:text-ink has-checked:border-woad has-checked:font-semibold has-checked:text-woad has-focus-visible:outline-2 pointer-coarse:min-h-11"
          >
            <input
              type="radio"
              name="reading"
              value={kind}
              checked={kind === reading}
              onChange={() => onChange(kind)}
              className="absolute inset-0 cursor-pointer appearance-none opacity-0"
            />
            {READING_LABELS[kind]}{' '}
            {unavailable.has(kind) ? (
              <span className="ml-1.5 text-sm font-normal text-ink-faint">none here</span>
            ) : null}
          </label>
        ))}
      </div>
    </fieldset>
  )
}
