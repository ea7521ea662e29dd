'use client'

import { DropdownMenu as Radix } from 'radix-ui'
import type { ReactElement, ReactNode } from 'react'
import { AppLink } from './app-link'
import { cn } from './cn'

/** One line of a menu: a place to go, a thing to do, or a rule between them. */
export type MenuItem =
  | { label: string; href: string; icon?: ReactNode; current?: boolean }
  | {
      label: string
      onSelect: () => void
      icon?: ReactNode
      disabled?: boolean
      danger?: boolean
    }
  | 'rule'

const ITEM =
  'data-highlighted:bg-wash flex min-h-9 items-center gap-2.5 rounded px-2.5 py-1.5 outline-none select-none ' +
  'data-disabled:text-ink-faint pointer-coarse:min-h-11 [&>svg]:size-4 [&>svg]:shrink-0'

/** A menu under the button that opens it. */
export function DropdownMenu({
  trigger,
  items,
  align = 'end',
  heading,
}: {
  /** A Button or IconButton. */
  trigger: ReactElement
  items: readonly MenuItem[]
  align?: 'start' | 'end'
  heading?: string
}) {
  return (
    <Radix.Root>
      <Radix.Trigger asChild>{trigger}</Radix.Trigger>
      <Radix.Portal>
        <Radix.Content
          align={align}
          sideOffset={4}
          collisionPadding={8}
          className="z-50 max-h-(--radix-dropdown-menu-content-available-height) min-w-44 animate-appear overflow-y-auto rounded border border-rule bg-sheet p-1"
        >
          {heading ? (
            <Radix.Label className="px-2.5 pt-1 pb-1 text-sm text-ink-faint">{heading}</Radix.Label>
          ) : null}
          {items.map((item, index) => {
            if (item === 'rule')
              return <Radix.Separator key={index} className="mx-2 my-1 h-px bg-hairline" />
            if ('href' in item)
              return (
                <Radix.Item key={item.href} asChild className={ITEM}>
                  <AppLink href={item.href} aria-current={item.current || undefined}>
                    {item.icon}
                    <span className={item.current ? 'font-semibold' : undefined}>{item.label}</span>
                  </AppLink>
                </Radix.Item>
              )
            return (
              <Radix.Item
                key={item.label}
                disabled={item.disabled}
                onSelect={item.onSelect}
                className={cn(ITEM, item.danger && 'font-semibold')}
              >
                {item.icon}
                {item.label}
                {item.danger ? '…' : null}
              </Radix.Item>
            )
          })}
        </Radix.Content>
      </Radix.Portal>
    </Radix.Root>
  )
}
