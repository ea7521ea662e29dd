'use client'

import { Popover as Radix } from 'radix-ui'
import type { ReactElement, ReactNode } from 'react'

/** A small sheet beside the button that opens it. */
export function Popover({
  trigger,
  label,
  children,
  align = 'start',
  open,
  onOpenChange,
}: {
  trigger: ReactElement
  /** Its name for those who listen. */
  label: string
  children: ReactNode
  align?: 'start' | 'center' | 'end'
  open?: boolean
  onOpenChange?: (open: boolean) => void
}) {
  return (
    <Radix.Root open={open} onOpenChange={onOpenChange}>
      <Radix.Trigger asChild>{trigger}</Radix.Trigger>
      <Radix.Portal>
        <Radix.Content
          aria-label={label}
          align={align}
          sideOffset={6}
          collisionPadding={8}
          className="z-50 max-h-(--radix-popover-content-available-height) w-72 max-w-[calc(100vw-1rem)] animate-appear overflow-y-auto rounded border border-rule bg-sheet p-4"
        >
          {children}
          <Radix.Arrow className="fill-rule" />
        </Radix.Content>
      </Radix.Portal>
    </Radix.Root>
  )
}
