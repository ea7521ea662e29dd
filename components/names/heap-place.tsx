'use client'

import { useState } from 'react'
import useSWR from 'swr'

import { reach } from '@/components/reach'
import { Dialog } from '@/components/ui/dialog'
import { Field } from '@/components/ui/field'
import { Input } from '@/components/ui/input'
import { Notice } from '@/components/ui/notice'
import { Skeleton } from '@/components/ui/skeleton'
import { WoundSample } from '@/components/yarn/wound-sample'
import type { NameableShade } from '@/lib/names/present'
import { SHADE_LIMITS } from '@/lib/shades/constants'

import type { HeapActions } from './heap-actions'
import type { NamesPlace } from './names-place'

/** As many samples as a dialog draws; a longer line is narrowed by typing. */
const MOST = 60

/** Chooses the shade that names are laid on, by its yarn. */
export function HeapPlace({
  place: { brand, lineSlug },
  what,
  actions,
  onChoose,
  onClose,
}: {
  place: NamesPlace
  /** “Thyme Will Tell”, or "3 names". */
  what: string
  actions: Pick<HeapActions, 'nameable'>
  onChoose: (shade: NameableShade) => Promise<boolean>
  onClose: () => void
}) {
  const [q, setQ] = useState('')
  const [laying, setLaying] = useState<string>()
  const { data: answer } = useSWR(['shades to lay names on', brand, lineSlug], () =>
    reach(actions.nameable(brand, { lineSlug })),
  )
  const fits = ({ number, label }: NameableShade) =>
    `${number} ${label}`.toLowerCase().includes(q.trim().toLowerCase())

  async function choose(shade: NameableShade) {
    if (laying) return
    setLaying(shade.id)
    if (await onChoose(shade)) onClose()
    else setLaying(undefined)
  }

  const group = (title: string, shades: readonly NameableShade[]) => {
    const found = shades.filter(fits)
    if (found.length === 0) return null
    return (
      <section aria-label={title} className="mt-5">
        <h3 className="mb-1 text-sm text-ink-faint">{title}</h3>
        <ul role="list" className="grid gap-x-4 sm:grid-cols-2">
          {found.slice(0, MOST).map((shade) => (
            <li key={shade.id}>
              <button
                type="button"
                aria-busy={laying === shade.id || undefined}
                onClick={() => void choose(shade)}
                className="flex w-full items-center gap-3 border-b border-hairline px-1 py-2 text-left hover:bg-wash"
              >
                <WoundSample hex={shade.hex} />
                <span className="min-w-0">
                  <span className="block font-title break-words">{shade.label}</span>
                  {shade.label === `No. ${shade.number}` ? null : (
                    <span className="block text-sm text-ink-soft">No. {shade.number}</span>
                  )}
                </span>
              </button>
            </li>
          ))}
        </ul>
        {found.length > MOST ? (
          <p className="mt-2 text-sm text-ink-faint">
            And {found.length - MOST} more: narrow them by number or name.
          </p>
        ) : null}
      </section>
    )
  }

  const shades = answer?.ok ? answer.data : undefined
  const none = shades && ![...shades.waiting, ...shades.named].some(fits)
  return (
    <Dialog
      title={`Lay ${what} on a shade`}
      description="Press the shade. A shade can hold many ideas; one of them is approved in the end."
      open
      wide
      onOpenChange={onClose}
    >
      <Field hideLabel label="Narrow by number or name">
        <Input
          type="search"
          placeholder="Narrow by number or name"
          maxLength={SHADE_LIMITS.search}
          value={q}
          onChange={({ target }) => setQ(target.value)}
        />
      </Field>
      {answer?.ok === false ? (
        <Notice kind="error" className="mt-4">
          {answer.message}
        </Notice>
      ) : null}
      {shades ? (
        <>
          {group('Without a name', shades.waiting)}
          {group('Named already', shades.named)}
          {none ? (
            <p className="mt-5 text-ink-soft">
              {q.trim()
                ? 'No shade of the line fits that.'
                : 'The line has no shades yet: add them first.'}
            </p>
          ) : null}
        </>
      ) : answer ? null : (
        <Skeleton className="mt-5 h-64" />
      )}
    </Dialog>
  )
}
