'use client'

import { useRef, useState, type FormEvent } from 'react'

import { reach } from '@/components/reach'
import { Field } from '@/components/ui/field'
import { Input } from '@/components/ui/input'
import { LiveRegion } from '@/components/ui/live-region'
import { Notice } from '@/components/ui/notice'
import { SubmitButton } from '@/components/ui/submit-button'
import { NAME_LIMITS } from '@/lib/names/constants'

import type { HeapActions } from './heap-actions'
import type { NamesPlace } from './names-place'

/** Puts one name on the heap after another: Enter adds, and the field is ready for the next. */
export function HeapAdd({
  place: { brand, lineSlug },
  actions,
}: {
  place: NamesPlace
  actions: Pick<HeapActions, 'add'>
}) {
  const [text, setText] = useState('')
  const [note, setNote] = useState('')
  const [errors, setErrors] = useState<Record<string, string[]>>({})
  const [problem, setProblem] = useState<string>()
  const [added, setAdded] = useState('')
  const [pending, setPending] = useState(false)
  const field = useRef<HTMLInputElement>(null)
  // The same until it is added, so that an answer that was lost adds no second one.
  const requestKey = useRef<string>(undefined)

  async function send(event: FormEvent) {
    event.preventDefault()
    if (pending) return
    setPending(true)
    requestKey.current ??= crypto.randomUUID()
    const own = { lineSlug, shadeId: null, requestKey: requestKey.current }
    const answer = await reach(actions.add(brand, { ...own, text, note }))
    setPending(false)
    field.current?.focus()
    if (answer.ok) {
      requestKey.current = undefined
      setAdded(`“${text.trim()}” is in the heap.`)
      setText('')
      setNote('')
      setErrors({})
      setProblem(undefined)
      return
    }
    setErrors(answer.fieldErrors ?? {})
    setProblem(answer.fieldErrors ? undefined : answer.message)
  }

  return (
    <form aria-label="Add a name" noValidate onSubmit={(event) => void send(event)}>
      <div className="grid items-start gap-3 sm:grid-cols-[minmax(0,1fr)_minmax(0,1fr)_auto]">
        <Field label="Name" error={errors.text}>
          <Input
            ref={field}
            value={text}
            maxLength={NAME_LIMITS.text}
            autoComplete="off"
            onChange={({ target }) => setText(target.value)}
          />
        </Field>
        <Field label="The thought behind it" optional error={errors.note}>
          <Input
            value={note}
            maxLength={NAME_LIMITS.note}
            autoComplete="off"
            onChange={({ target }) => setNote(target.value)}
          />
        </Field>
        <SubmitButton
          variant="secondary"
          className="sm:mt-[1.625rem]"
          pending={pending}
          pendingLabel="Adding name…"
        >
          Add name
        </SubmitButton>
      </div>
      <LiveRegion>{added}</LiveRegion>
      {problem ? (
        <Notice kind="error" className="mt-3">
          {problem}
        </Notice>
      ) : null}
    </form>
  )
}
