'use client'

import { useState } from 'react'
import useSWR from 'swr'

import { reach } from '@/components/reach'
import { Button } from '@/components/ui/button'
import { Dialog } from '@/components/ui/dialog'
import { Field } from '@/components/ui/field'
import { Notice } from '@/components/ui/notice'
import { Select } from '@/components/ui/select'
import { Skeleton } from '@/components/ui/skeleton'
import { FAMILY_LIMITS } from '@/lib/families/constants'
import type { SortPreview } from '@/lib/families/present'

import { shadesInWords, type FamiliesActions } from './families-actions'
import type { SendEdit } from './use-families'

const SUITS = 'suits'
const COUNTS = Array.from(
  { length: FAMILY_LIMITS.most - FAMILY_LIMITS.least + 1 },
  (_, at) => FAMILY_LIMITS.least + at,
)

/** Sorts all shades anew, after it has shown what would change. */
export function SortDialog({
  place,
  version,
  count,
  actions,
  edit,
  onClose,
}: {
  place: { brand: string; lineSlug: string }
  /** Of the families as they are shown. */
  version: number
  /** How many families were asked for last; null left it open. */
  count: number | null
  actions: Pick<FamiliesActions, 'preview' | 'sort'>
  edit: SendEdit
  onClose: () => void
}) {
  const { brand, lineSlug } = place
  const [wished, setWished] = useState(count)
  const [refusal, setRefusal] = useState<string>()
  const [sorting, setSorting] = useState(false)
  const { data: looked, mutate: lookAgain } = useSWR(
    ['what sorting would change', place, version, wished],
    () => reach(actions.preview(brand, { lineSlug, count: wished })),
    { revalidateOnFocus: false },
  )
  const preview = looked?.ok ? looked.data : undefined
  const problem = refusal ?? (looked?.ok === false ? looked.message : undefined)

  async function sort() {
    if (!preview) return
    setSorting(true)
    const answer = await edit({
      // What was shown is what is done, or nothing is.
      send: (base) => actions.sort(brand, { ...base, version: preview.version, count: wished }),
      done: 'The shades are sorted anew.',
      quiet: true,
    })
    setSorting(false)
    if (answer.ok) return onClose()
    setRefusal(answer.message)
    void lookAgain()
  }

  return (
    <Dialog
      title="Sort shades anew"
      description="Look at what changes before you sort. It can be taken back right after."
      open
      onOpenChange={onClose}
      footer={
        <>
          <Button onClick={onClose}>Leave them as they are</Button>
          <Button
            variant="primary"
            disabled={!preview}
            pending={sorting}
            pendingLabel="Sorting shades…"
            onClick={() => void sort()}
          >
            Sort shades
          </Button>
        </>
      }
    >
      <div className="space-y-4">
        <Field label="Hue families" hint="Neutrals stand apart and are not counted.">
          <Select
            value={wished ?? SUITS}
            onChange={({ target }) => {
              setRefusal(undefined)
              setWished(target.value === SUITS ? null : Number(target.value))
            }}
          >
            <option value={SUITS}>As many as suit the line</option>
            {COUNTS.map((number) => (
              <option key={number} value={number}>
                {number}
              </option>
            ))}
          </Select>
        </Field>
        {problem ? <Notice kind="error">{problem}</Notice> : null}
        <div aria-live="polite">
          {preview ? (
            <PreviewWords preview={preview} />
          ) : problem ? null : (
            <Skeleton className="h-40" />
          )}
        </div>
      </div>
    </Dialog>
  )
}

function PreviewWords({ preview: { moved, pinned, families, gone } }: { preview: SortPreview }) {
  return (
    <>
      <p>
        {moved === 0 ? 'No shade moves. ' : `${shadesInWords(moved)} of the line would move. `}
        {pinned > 0 ? `${shadesInWords(pinned)} pinned stay${pinned === 1 ? 's' : ''} put.` : null}
      </p>
      <ul role="list" className="mt-2 divide-y divide-hairline border-y border-hairline">
        {families.map(({ id, name, formerName, shades, arriving }) => (
          <li key={id} className="flex flex-wrap justify-between gap-x-4 py-1.5">
            <span className="min-w-0 break-words">
              {name}
              {formerName === null ? <span className="text-ink-faint"> · new</span> : null}
              {formerName !== null && formerName !== name ? (
                <span className="text-ink-faint"> · now {formerName}</span>
              ) : null}
            </span>
            <span className="text-ink-soft">
              {shadesInWords(shades)}
              {formerName !== null && arriving > 0 ? `, ${arriving} from elsewhere` : ''}
            </span>
          </li>
        ))}
      </ul>
      {gone.length > 0 ? <p className="mt-2 text-ink-soft">Gone then: {gone.join(', ')}.</p> : null}
    </>
  )
}
