'use client'

import { AlertDialog as Radix } from 'radix-ui'
import { useRef, useState, type ReactElement, type ReactNode, type RefObject } from 'react'
import { Button } from './button'
import { cn } from './cn'
import { DIALOG_CLASS, OVERLAY_CLASS } from './dialog'

/** Props of {@link ConfirmDialog}. */
export interface ConfirmDialogProps {
  /** The question: "Delete this photograph?" */
  title: string
  /** What is lost by it, in whole sentences. */
  lost: ReactNode
  /** What stays. */
  kept?: ReactNode
  /** The verb with its object: "Delete photograph". */
  confirmLabel: string
  cancelLabel?: string
  /** Returns false (or throws) when it did not work; the dialog then stays open. */
  onConfirm: () => void | boolean | Promise<void | boolean>
  trigger?: ReactElement
  open?: boolean
  onOpenChange?: (open: boolean) => void
  danger?: boolean
  /** Where the keyboard goes on once it is done, if what it came from goes away by it. */
  focusAfter?: RefObject<HTMLElement | null>
}

/** Asks before something is lost, and says what. Focus starts on the way back. */
export function ConfirmDialog({
  title,
  lost,
  kept,
  confirmLabel,
  cancelLabel = 'Keep it',
  onConfirm,
  trigger,
  open,
  onOpenChange,
  danger = true,
  focusAfter,
}: ConfirmDialogProps) {
  const [ownOpen, setOwnOpen] = useState(false)
  const [pending, setPending] = useState(false)
  const [failed, setFailed] = useState(false)
  const done = useRef(false)
  const change = (next: boolean) => {
    if (pending) return
    setFailed(false)
    setOwnOpen(next)
    onOpenChange?.(next)
  }
  const confirm = async () => {
    setPending(true)
    setFailed(false)
    const worked = await Promise.resolve()
      .then(onConfirm)
      .then(
        (answer) => answer !== false,
        () => false,
      )
    setPending(false)
    done.current = worked
    if (worked) {
      setOwnOpen(false)
      onOpenChange?.(false)
    } else setFailed(true)
  }
  return (
    <Radix.Root open={open ?? ownOpen} onOpenChange={change}>
      {trigger ? <Radix.Trigger asChild>{trigger}</Radix.Trigger> : null}
      <Radix.Portal>
        <Radix.Overlay className={OVERLAY_CLASS} />
        <Radix.Content
          className={cn(DIALOG_CLASS, 'gap-3 p-5 sm:max-w-md sm:p-6')}
          onCloseAutoFocus={(event) => {
            if (!done.current || !focusAfter?.current) return
            done.current = false
            event.preventDefault()
            focusAfter.current.focus()
          }}
        >
          <Radix.Title className="font-title text-xl">{title}</Radix.Title>
          <Radix.Description asChild>
            <div className="space-y-2">
              <div>{lost}</div>
              {kept ? <div className="text-ink-soft">{kept}</div> : null}
            </div>
          </Radix.Description>
          <p role="alert" className="font-semibold empty:hidden">
            {failed ? 'That did not work. Nothing was changed; please try again.' : null}
          </p>
          <div className="mt-2 flex flex-wrap justify-end gap-3">
            <Radix.Cancel asChild>
              <Button>{cancelLabel}</Button>
            </Radix.Cancel>
            <Button
              variant={danger ? 'danger' : 'primary'}
              pending={pending}
              onClick={() => void confirm()}
            >
              {confirmLabel}
            </Button>
          </div>
        </Radix.Content>
      </Radix.Portal>
    </Radix.Root>
  )
}
