'use client'

import { X } from 'lucide-react'
import { Dialog as Radix } from 'radix-ui'
import type { ReactElement, ReactNode } from 'react'
import { cn } from './cn'

/** The veil behind a dialog. */
export const OVERLAY_CLASS = 'animate-appear fixed inset-0 z-40 bg-[rgb(20_20_19/0.45)]'

/** Where a dialog stands: a card in the middle, the foot of the page on a phone. */
export const DIALOG_CLASS =
  'animate-appear bg-paper border-rule fixed z-50 flex max-h-[85dvh] flex-col border ' +
  'max-sm:inset-x-0 max-sm:bottom-0 max-sm:border-x-0 max-sm:border-b-0 ' +
  'sm:top-1/2 sm:left-1/2 sm:w-[calc(100vw-2rem)] sm:-translate-x-1/2 sm:-translate-y-1/2 sm:rounded'

/** Props of {@link Dialog}. */
export interface DialogProps {
  title: string
  description?: ReactNode
  /** The element that opens it; leave out when `open` is handed in. */
  trigger?: ReactElement
  open?: boolean
  onOpenChange?: (open: boolean) => void
  wide?: boolean
  /** The buttons at the foot. Wrap one in {@link DialogClose} to let it close the dialog. */
  footer?: ReactNode
  children: ReactNode
}

/** A task on its own sheet above the page. */
export function Dialog({
  title,
  description,
  trigger,
  open,
  onOpenChange,
  wide,
  footer,
  children,
}: DialogProps) {
  return (
    <Radix.Root open={open} onOpenChange={onOpenChange}>
      {trigger ? <Radix.Trigger asChild>{trigger}</Radix.Trigger> : null}
      <Radix.Portal>
        <Radix.Overlay className={OVERLAY_CLASS} />
        <Radix.Content
          {...(description ? {} : { 'aria-describedby': undefined })}
          className={cn(DIALOG_CLASS, wide ? 'sm:max-w-3xl' : 'sm:max-w-lg')}
        >
          <header className="flex items-start justify-between gap-4 px-5 pt-4 pb-2 sm:px-6 sm:pt-5">
            <div>
              <Radix.Title className="font-title text-xl">{title}</Radix.Title>
              {description ? (
                <Radix.Description className="mt-1 text-ink-soft">{description}</Radix.Description>
              ) : null}
            </div>
            <Radix.Close
              aria-label="Close"
              className="-mr-2 inline-flex size-9 shrink-0 items-center justify-center rounded hover:bg-wash pointer-coarse:size-11"
            >
              <X aria-hidden="true" className="size-[1.125rem]" />
            </Radix.Close>
          </header>
          <div className="min-h-0 overflow-y-auto px-5 pt-2 pb-5 sm:px-6">{children}</div>
          {footer ? (
            <footer className="flex flex-wrap justify-end gap-3 border-t border-hairline px-5 py-4 sm:px-6">
              {footer}
            </footer>
          ) : null}
        </Radix.Content>
      </Radix.Portal>
    </Radix.Root>
  )
}

/** Lets the one button inside close the dialog around it. */
export function DialogClose({ children }: { children: ReactElement }) {
  return <Radix.Close asChild>{children}</Radix.Close>
}
