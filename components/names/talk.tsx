'use client'

import { useRef, useState, type Ref } from 'react'

import { reach } from '@/components/reach'
import { Button } from '@/components/ui/button'
import { Field } from '@/components/ui/field'
import { Textarea } from '@/components/ui/textarea'
import { NAME_LIMITS } from '@/lib/names/constants'
import type { RemarkView } from '@/lib/names/present'

import type { TalkActions } from './idea-actions'
import type { NamesPlace } from './names-place'
import { sends } from './reason-form'
import { minuteInWords, nameOf } from './said-when'

/** What was said about a name, oldest first. */
export function TalkList({ remarks }: { remarks: readonly RemarkView[] }) {
  if (remarks.length === 0) return <p className="text-ink-faint">Nobody has said anything yet.</p>
  return (
    <ul role="list" className="max-w-measure space-y-3">
      {remarks.map(({ id, person, text, at }) => (
        <li key={id}>
          <p className="text-sm text-ink-faint">
            <span className="font-semibold text-ink">{nameOf(person)}</span>, {minuteInWords(at)}
          </p>
          <p className="break-words whitespace-pre-line">{text}</p>
        </li>
      ))}
    </ul>
  )
}

/** A remark to add to the talk; what was written stays until it is kept. */
export function RemarkForm({
  place: { brand, lineSlug },
  ideaId,
  text,
  onText,
  add,
  onAdded,
  fieldRef,
}: {
  place: NamesPlace
  ideaId: string
  text: string
  onText: (text: string) => void
  add: TalkActions['addRemark']
  onAdded?: () => void
  fieldRef?: Ref<HTMLTextAreaElement>
}) {
  const [pending, setPending] = useState(false)
  const [problem, setProblem] = useState<string>()
  const requestKey = useRef<string>(undefined)
  const send = async () => {
    if (pending) return
    if (text.trim() === '') {
      setProblem('Write something.')
      return
    }
    setPending(true)
    setProblem(undefined)
    // One key a remark: pressed twice, it is said once.
    requestKey.current ??= crypto.randomUUID()
    const answer = await reach(
      add(brand, { lineSlug, ideaId, text, requestKey: requestKey.current }),
    )
    setPending(false)
    if (!answer.ok) {
      setProblem(answer.fieldErrors?.text?.[0] ?? answer.message)
      return
    }
    requestKey.current = undefined
    onText('')
    onAdded?.()
  }
  return (
    <form
      className="max-w-measure space-y-2"
      onSubmit={(event) => {
        event.preventDefault()
        void send()
      }}
    >
      <Field label="Your remark" error={problem}>
        <Textarea
          ref={fieldRef}
          rows={2}
          value={text}
          maxLength={NAME_LIMITS.remark}
          onChange={(event) => {
            // Other words are another remark.
            requestKey.current = undefined
            onText(event.target.value)
          }}
          onKeyDown={(event) => {
            if (!sends(event)) return
            event.preventDefault()
            void send()
          }}
        />
      </Field>
      <Button type="submit" size="small" pending={pending} pendingLabel="Adding remark…">
        Add remark
      </Button>
    </form>
  )
}
