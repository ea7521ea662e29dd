'use client'

import { useRouter } from 'next/navigation'
import { useState } from 'react'

import { reach } from '@/components/reach'
import { Button } from '@/components/ui/button'
import { Field } from '@/components/ui/field'
import { Input } from '@/components/ui/input'
import { LiveRegion } from '@/components/ui/live-region'
import { Select } from '@/components/ui/select'
import { toastDone, toastProblem } from '@/components/ui/toast'
import { SHADE_STATUSES, type ShadeStatus } from '@/lib/shades/constants'

import { STATUS_WORDS } from './shade-words'
import { type LinePlace, type ShadesActions } from './shades-actions'
import { useDeleteShades } from './use-delete-shades'

/** What can be done with the chosen shades of the table, on whichever page they stand. */
export function SelectedShades({
  place,
  actions,
  shadeIds,
  onClear,
}: {
  place: LinePlace
  actions: Pick<ShadesActions, 'setStatus' | 'reorder' | 'remove' | 'restore'>
  shadeIds: string[]
  onClear: () => void
}) {
  const router = useRouter()
  const [status, setStatus] = useState<ShadeStatus>('approved')
  const [to, setTo] = useState('')
  const [pending, setPending] = useState(false)
  const { brand, lineSlug } = place
  const deleting = useDeleteShades({
    place,
    actions,
    onDeleted: () => {
      onClear()
      router.refresh()
    },
  })

  async function run<Data>(
    work: ReturnType<typeof reach<Data>>,
    words: (data: Data) => string,
  ): Promise<void> {
    setPending(true)
    const answer = await work
    setPending(false)
    if (answer.ok) toastDone(words(answer.data))
    else toastProblem(Object.values(answer.fieldErrors ?? {})[0]?.[0] ?? answer.message)
  }

  const count = shadeIds.length
  const shades = count === 1 ? '1 shade' : `${count} shades`
  return (
    <>
      <LiveRegion>{count > 0 ? `${shades} chosen.` : ''}</LiveRegion>
      {deleting.dialog}
      {count > 0 ? (
        <section
          aria-label="Chosen shades"
          className="z-10 mt-4 flex flex-wrap items-center gap-x-4 gap-y-3 border-y border-rule bg-paper py-3 md:sticky md:bottom-0 print:hidden"
        >
          <p className="font-medium">{shades} chosen</p>
          <form
            className="flex items-center gap-2"
            onSubmit={(event) => {
              event.preventDefault()
              void run(
                reach(actions.setStatus(brand, { lineSlug, shadeIds, status })),
                ({ changed }) => `${changed} set to ${STATUS_WORDS[status].toLowerCase()}.`,
              )
            }}
          >
            <Field hideLabel label="Status for the chosen shades">
              <Select
                value={status}
                onChange={(event) => setStatus(event.target.value as ShadeStatus)}
              >
                {SHADE_STATUSES.map((one) => (
                  <option key={one} value={one}>
                    {STATUS_WORDS[one]}
                  </option>
                ))}
              </Select>
            </Field>
            <Button type="submit" pending={pending}>
              Set status
            </Button>
          </form>
          <form
            className="flex items-center gap-2"
            onSubmit={(event) => {
              event.preventDefault()
              void run(
                reach(actions.reorder(brand, { lineSlug, shadeIds, place: to.trim() })),
                (moved) => `${shades} moved to place ${moved.place}.`,
              )
            }}
          >
            <Field hideLabel label="Place for the chosen shades">
              <Input
                inputMode="numeric"
                placeholder="Place"
                className="max-w-20"
                value={to}
                onChange={(event) => setTo(event.target.value)}
              />
            </Field>
            <Button type="submit" pending={pending} disabled={to.trim() === ''}>
              Move shades
            </Button>
          </form>
          <Button
            variant="danger"
            pending={deleting.pending}
            onClick={() => void deleting.remove(shadeIds)}
          >
            Delete shades
          </Button>
          <Button variant="quiet" onClick={onClear}>
            Choose none
          </Button>
        </section>
      ) : null}
    </>
  )
}
