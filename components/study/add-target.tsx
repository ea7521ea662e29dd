'use client'

import { useRouter } from 'next/navigation'
import { useRef, useState, type FormEvent } from 'react'

import { reach } from '@/components/reach'
import type { LinePlace, ShadesActions } from '@/components/shades/shades-actions'
import { Field } from '@/components/ui/field'
import { Input } from '@/components/ui/input'
import { SubmitButton } from '@/components/ui/submit-button'
import { toastDone, toastProblem, toastUndo } from '@/components/ui/toast'
import type { Lab } from '@/lib/color/types'
import { SHADE_LIMITS, type ReadingTerms } from '@/lib/shades/constants'

/** Adds the colour of a gap as a target shade, under a number that may be changed; with an undo. */
export function AddTarget({
  place: { brand, lineSlug },
  lab: [L, a, b],
  terms,
  number,
  gap,
  actions,
}: {
  place: LinePlace
  lab: Lab
  terms: ReadingTerms
  /** The number proposed. */
  number: string
  /** "gap A", for those who listen. */
  gap: string
  actions: Pick<ShadesActions, 'create' | 'remove'>
}) {
  const router = useRouter()
  const [pending, setPending] = useState(false)
  const [error, setError] = useState<string>()
  const requestKey = useRef<string>(undefined)

  async function undo(shadeId: string) {
    const answer = await reach(
      actions.remove(brand, { lineSlug, shadeIds: [shadeId], confirmed: true }),
    )
    if (answer.ok) toastDone('The target shade is taken back.')
    else toastProblem(answer.message)
    router.refresh()
  }

  async function add(event: FormEvent<HTMLFormElement>) {
    event.preventDefault()
    const typed = String(new FormData(event.currentTarget).get('number'))
    // Kept until an answer comes: the same again is the same shade.
    requestKey.current ??= crypto.randomUUID()
    setPending(true)
    setError(undefined)
    const answer = await reach(
      actions.create(brand, {
        lineSlug,
        number: typed,
        name: null,
        status: 'target',
        color: { kind: 'lab', L, a, b, terms },
        requestKey: requestKey.current,
      }),
    )
    setPending(false)
    if (answer.ok) {
      // The gap goes with its row; the keyboard stays in the list.
      document.getElementById('gaps')?.focus()
      const { id, number: added } = answer.data
      toastUndo(`Target shade ${added} added.`, () => void undo(id))
      return
    }
    if (answer.code !== 'unavailable') requestKey.current = undefined
    setError(answer.fieldErrors?.number?.[0] ?? answer.message)
  }

  return (
    <form onSubmit={(event) => void add(event)} className="mt-3 flex flex-wrap items-end gap-2">
      <Field label="Number" error={error} className="w-24 grow-0">
        <Input
          name="number"
          defaultValue={number}
          maxLength={SHADE_LIMITS.number}
          autoComplete="off"
          required
        />
      </Field>
      <SubmitButton
        variant="secondary"
        pending={pending}
        pendingLabel="Adding target…"
        aria-label={`Add as target shade: ${gap}`}
      >
        Add as target shade
      </SubmitButton>
    </form>
  )
}
