'use client'

import { Menu, X } from 'lucide-react'
import { Dialog as Radix } from 'radix-ui'
import { useState, type ReactNode } from 'react'
import { OVERLAY_CLASS } from '@/components/ui/dialog'

/** The left margin, folded behind a button where the page is narrow. */
export function MarginMenu({ children }: { children: ReactNode }) {
  const [open, setOpen] = useState(false)
  return (
    <Radix.Root open={open} onOpenChange={setOpen}>
      <Radix.Trigger asChild>
        <button
          type="button"
          className="inline-flex min-h-11 items-center gap-2 rounded border border-rule bg-sheet px-3 font-medium hover:border-ink"
        >
          <Menu aria-hidden="true" className="size-[1.125rem]" />
          Contents
        </button>
      </Radix.Trigger>
      <Radix.Portal>
        <Radix.Overlay className={OVERLAY_CLASS} />
        <Radix.Content
          aria-describedby={undefined}
          className="fixed inset-y-0 left-0 z-50 flex w-72 max-w-[calc(100vw-2.5rem)] animate-appear flex-col overflow-y-auto border-r border-rule bg-paper px-6 py-4"
          // A client navigation keeps this mounted, so following a link must close it.
          onClick={(event) => {
            if ((event.target as HTMLElement).closest('a[href]')) setOpen(false)
          }}
        >
          <div className="mb-2 flex items-center justify-between">
            <Radix.Title className="font-body text-base text-ink-faint">Contents</Radix.Title>
            <Radix.Close
              aria-label="Close contents"
              className="-mr-2 inline-flex size-11 items-center justify-center rounded hover:bg-wash"
            >
              <X aria-hidden="true" className="size-[1.125rem]" />
            </Radix.Close>
          </div>
          {children}
        </Radix.Content>
      </Radix.Portal>
    </Radix.Root>
  )
}
