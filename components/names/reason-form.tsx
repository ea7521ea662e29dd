'use client'

import { useEffect, useRef, useState, type KeyboardEvent } from 'react'

import { Button } from '@/components/ui/button'
import { Field } from '@/components/ui/field'
import { Textarea } from '@/components/ui/textarea'
import { NAME_LIMITS, type StateMove } from '@/lib/names/constants'

import { MOVE_BUTTONS, MOVE_PENDING, REASON_WORDS } from './move-words'

/** Whether Ctrl or ⌘ with Enter was pressed, which sends what a field of several lines holds. */
export const sends = ({ key, ctrlKey, metaKey }: KeyboardEvent): boolean =>
  key === 'Enter' && (ctrlKey || metaKey)

/** Asks for the reason of a move and takes the focus; Escape leaves all as it was. */
export function ReasonForm({
  move,
  pending,
  onGive,
  onLeave,
}: {
  move: StateMove
  pending: boolean
  onGive: (reason: string) => void
  onLeave: () => void
}) {
  const [reason, setReason] = useState('')
  const [missing, setMissing] = useState(false)
  const field = useRef<HTMLTextAreaElement>(null)
  const words = REASON_WORDS[move]
  useEffect(() => field.current?.focus(), [])
  const give = () => {
    if (pending) return
    if (reason.trim() === '') {
      setMissing(true)
      field.current?.focus()
    } else onGive(reason)
  }
  return (
    <form
      className="max-w-measure space-y-3"
      onSubmit={(event) => {
        event.preventDefault()
        give()
      }}
      onKeyDown={(event) => {
        if (event.key === 'Escape') {
          event.stopPropagation()
          onLeave()
        } else if (sends(event)) {
          event.preventDefault()
          give()
        }
      }}
    >
      <Field
        label={words?.label}
        hint={words?.hint}
        required
        error={missing && reason.trim() === '' ? 'Give a reason.' : undefined}
      >
        <Textarea
          ref={field}
          rows={2}
          value={reason}
          maxLength={NAME_LIMITS.reason}
          onChange={(event) => setReason(event.target.value)}
        />
      </Field>
      <div className="flex flex-wrap gap-3">
        <Button type="submit" variant="primary" pending={pending} pendingLabel={MOVE_PENDING[move]}>
          {MOVE_BUTTONS[move]}
        </Button>
        <Button onClick={onLeave}>Leave it as it is</Button>
      </div>
    </form>
  )
}
