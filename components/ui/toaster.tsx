'use client'

import { Check, CircleAlert, Info } from 'lucide-react'
import { Toaster as Sonner } from 'sonner'
import { Spinner } from './spinner'

/** Sonner in our clothes. */
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
          description: 'text-ink-soft text-sm',
          actionButton:
            'text-woad hover:bg-wash min-h-9 shrink-0 rounded px-3 font-semibold pointer-coarse:min-h-11',
        },
      }}
    />
  )
}
