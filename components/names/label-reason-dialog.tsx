'use client'

import { useRouter } from 'next/navigation'
import { useId, useState, type FormEvent, type ReactElement } from 'react'

import { reach } from '@/components/reach'
import { Button } from '@/components/ui/button'
import { Dialog, DialogClose } from '@/components/ui/dialog'
import { Field } from '@/components/ui/field'
import { Notice } from '@/components/ui/notice'
import { SubmitButton } from '@/components/ui/submit-button'
import { Textarea } from '@/components/ui/textarea'
import { toastDone } from '@/components/ui/toast'
import type { ActionResult } from '@/lib/errors'
import { NAME_LIMITS } from '@/lib/names/constants'

/** Asks why before a lock is opened; what was typed stays through every refusal. */
export function LabelReasonDialog({
  title,
  description,
  trigger,
  confirmLabel,
  pendingLabel,
  done,
  confirm,
}: {
  title: string
  description: string
  trigger: ReactElement
  /** The verb with its object: "Lift the lock". */
  confirmLabel: string
  pendingLabel: string
  /** Said once it is done. */
  done: string
  confirm: (reason: string) => Promise<ActionResult<unknown>>
}) {
  const router = useRouter()
  const form = useId()
  const [open, setOpen] = useState(false)
  const [reason, setReason] = useState('')
  const [pending, setPending] = useState(false)
  const [refusal, setRefusal] = useState<{ message: string; reason?: string[] }>()

  function change(next: boolean) {
    if (pending) return
    setRefusal(undefined)
    setOpen(next)
  }

  async function submit(event: FormEvent) {
    event.preventDefault()
    if (pending) return
    if (reason.trim() === '') {
      setRefusal({ message: '', reason: ['Say why: it stands in the history.'] })
      return
    }
    setPending(true)
    setRefusal(undefined)
    const answer = await reach(confirm(reason))
    setPending(false)
    if (!answer.ok) {
      setRefusal({ message: answer.message, reason: answer.fieldErrors?.reason })
      router.refresh()
      return
    }
    toastDone(done)
    setReason('')
    setOpen(false)
  }

  return (
    <Dialog
      title={title}
      description={description}
      trigger={trigger}
      open={open}
      onOpenChange={change}
      footer={
        <>
          <DialogClose>
            <Button>Keep it locked</Button>
          </DialogClose>
          <SubmitButton form={form} pending={pending} pendingLabel={pendingLabel}>
            {confirmLabel}
          </SubmitButton>
        </>
      }
    >
      <form id={form} noValidate onSubmit={(event) => void submit(event)} className="space-y-4">
        {refusal?.message ? <Notice kind="error">{refusal.message}</Notice> : null}
        <Field
          label="Reason"
          required
          hint="It stands in the history of the names, with your name and the time."
          error={refusal?.reason}
        >
          <Textarea
            value={reason}
            maxLength={NAME_LIMITS.reason}
            onChange={({ target }) => setReason(target.value)}
          />
        </Field>
      </form>
    </Dialog>
  )
}
