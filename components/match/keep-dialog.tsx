'use client'

import { useRef, useState, type FormEvent } from 'react'

import { reach } from '@/components/reach'
import { Button } from '@/components/ui/button'
import { Dialog, DialogClose } from '@/components/ui/dialog'
import { Field } from '@/components/ui/field'
import { Input } from '@/components/ui/input'
import { Notice } from '@/components/ui/notice'
import { SubmitButton } from '@/components/ui/submit-button'
import { toastDone } from '@/components/ui/toast'
import { TextLink } from '@/components/ui/text-link'
import type { Match } from '@/lib/color/match'
import { COMBINATION_LIMITS, draftTitle } from '@/lib/combinations/constants'
import type { KeepCombinationValues } from '@/lib/combinations/schema'
import type { ActionResult } from '@/lib/errors'

/** The action that keeps five shades. */
export type KeepCombination = (
  brand: string,
  values: KeepCombinationValues,
) => Promise<ActionResult<{ combinationId: string; title: string }>>

/** Props of {@link KeepDialog}. */
export interface KeepDialogProps {
  brand: string
  lineSlug: string
  photograph: { id: string; title: string }
  match: Match
  disabled: boolean
  keep: KeepCombination
}

/** Keeps the five as a combination, under a title that is proposed and can be changed. */
export function KeepDialog({
  brand,
  lineSlug,
  photograph,
  match,
  disabled,
  keep,
}: KeepDialogProps) {
  const [open, setOpen] = useState(false)
  const [title, setTitle] = useState('')
  const [error, setError] = useState<string>()
  const [problem, setProblem] = useState<string>()
  const [pending, setPending] = useState(false)
  // One key for one keeping, however often it is sent.
  const requestKey = useRef('')

  function begin(opens: boolean) {
    setOpen(opens)
    if (!opens) return
    requestKey.current = crypto.randomUUID()
    setTitle(draftTitle(photograph.title, match.kind))
    setError(undefined)
    setProblem(undefined)
  }

  async function send(event: FormEvent) {
    event.preventDefault()
    event.stopPropagation()
    if (pending) return
    setPending(true)
    setError(undefined)
    setProblem(undefined)
    const answer = await reach(
      keep(brand, {
        lineSlug,
        photographId: photograph.id,
        reading: match.kind,
        title,
        places: match.places.map(({ shadeId, share }) => ({ shadeId, share })),
        requestKey: requestKey.current,
      }),
    )
    setPending(false)
    if (!answer.ok) {
      setError(answer.fieldErrors?.title?.[0])
      setProblem(answer.fieldErrors?.title ? undefined : answer.message)
      return
    }
    setOpen(false)
    const href = `/${brand}/lines/${lineSlug}/combinations/${answer.data.combinationId}`
    toastDone(
      <>
        Kept as{' '}
        <TextLink href={href} prefetch={false}>
          {answer.data.title}
        </TextLink>
      </>,
    )
  }

  return (
    <Dialog
      title="Keep these five"
      description="They stay as they are now, also when the line's shades change."
      open={open}
      onOpenChange={begin}
      trigger={
        <Button variant="primary" disabled={disabled}>
          Keep combination
        </Button>
      }
      footer={
        <>
          <DialogClose>
            <Button>Not now</Button>
          </DialogClose>
          <SubmitButton form="keep-combination" pending={pending} pendingLabel="Keeping…">
            Keep combination
          </SubmitButton>
        </>
      }
    >
      <form
        id="keep-combination"
        noValidate
        className="space-y-4"
        onSubmit={(event) => void send(event)}
      >
        <Field label="Title" required error={error}>
          <Input
            value={title}
            maxLength={COMBINATION_LIMITS.title}
            autoComplete="off"
            onChange={({ target }) => setTitle(target.value)}
          />
        </Field>
        {problem ? <Notice kind="error">{problem}</Notice> : null}
      </form>
    </Dialog>
  )
}
