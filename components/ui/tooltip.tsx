'use client'

import { Tooltip as Radix } from 'radix-ui'
import type { ReactElement } from 'react'

/** Props of {@link Tooltip}. */
export interface TooltipProps {
  /** A few words; never the only place where something needed is said. */
  content: string
  side?: 'top' | 'right' | 'bottom' | 'left'
  /** One element that takes focus. */
  children: ReactElement
}

/** A short word on hover and focus. */
export function Tooltip({ content, side = 'top', children }: TooltipProps) {
  return (
    <Radix.Provider delayDuration={350}>
      <Radix.Root>
        <Radix.Trigger asChild>{children}</Radix.Trigger>
        <Radix.Portal>
          <Radix.Content
            side={side}
            sideOffset={6}
            collisionPadding={8}
            className="z-50 max-w-64 animate-appear rounded bg-ink px-2 py-1 text-sm text-paper"
          >
            {content}
            <Radix.Arrow className="fill-ink" />
          </Radix.Content>
        </Radix.Portal>
      </Radix.Root>
    </Radix.Provider>
  )
}
