'use client'

import { Check, CircleAlert, Info } from 'lucide-react'
import { Toaster as Sonner, toast } from 'sonner'
import { Spinner } from './spinner'

const DETAIL = 'text-ink-soft text-sm'

/** Where toasts appear; it stands once, in the root layout. */
export function Toaster() {
  return (
    <Sonner
      position="bottom-right"
      duration={6000}
      gap={8}
      visibleToasts={3}
      style={{ fontFamily: 'inherit' }}
      containerAriaLabel="Messages"
      icons={{
        success: <Check aria-hidden="true" className="size-[1.125rem]" />,
        error: <CircleAlert aria-hidden="true" className="size-[1.125rem]" />,
        info: <Info aria-hidden="true" className="size-[1.125rem]" />,
        loading: <Spinner />,
      }}
      toastOptions={{
        unstyled: true,
        classNames: {
          toast:
            'bg-sheet border-rule text-ink flex w-full items-center gap-3 rounded border py-2.5 pr-2.5 pl-4 print:hidden',
          content: 'grow',
          title: 'text-base',
          description: DETAIL,
          actionButton:
            'text-woad hover:bg-wash min-h-9 shrink-0 rounded px-3 font-semibold pointer-coarse:min-h-11',
        },
      }}
    />
  )
}

/** Says that something is done. */
export const toastDone = (message: string, description?: string) =>
  toast.success(message, { description })

/** Says that something went wrong and what was kept; it stays longer. */
export const toastProblem = (message: string, description?: string) =>
  toast.error(message, { description, duration: 12_000 })

/** Says what was done and offers to take it back for ten seconds. */
export const toastUndo = (message: string, onUndo: () => void, label = 'Undo') =>
  toast.success(message, { duration: 10_000, action: { label, onClick: onUndo } })
