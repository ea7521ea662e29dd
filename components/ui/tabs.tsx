'use client'

import { Tabs as Radix } from 'radix-ui'
import type { ReactNode } from 'react'
import { TAB_CLASS, TAB_LIST_CLASS } from './tab-class'

/** One tab with its panel. */
export interface TabItem {
  value: string
  label: ReactNode
  note?: ReactNode
  content: ReactNode
  disabled?: boolean
}

/** Several views of one thing, on the same page. */
export function Tabs({
  label,
  items,
  value,
  defaultValue,
  onValueChange,
  className,
}: {
  /** What the tabs are of, for those who listen. */
  label: string
  items: readonly TabItem[]
  value?: string
  defaultValue?: string
  onValueChange?: (value: string) => void
  className?: string
}) {
  return (
    <Radix.Root
      value={value}
      defaultValue={defaultValue ?? (value === undefined ? items[0]?.value : undefined)}
      onValueChange={onValueChange}
      className={className}
    >
      <Radix.List aria-label={label} className={TAB_LIST_CLASS}>
        {items.map((item) => (
          <Radix.Trigger
            key={item.value}
            value={item.value}
            disabled={item.disabled}
            className={TAB_CLASS}
          >
            {item.label}
            {item.note ? <span className="font-normal text-ink-faint"> {item.note}</span> : null}
          </Radix.Trigger>
        ))}
      </Radix.List>
      {items.map((item) => (
        <Radix.Content key={item.value} value={item.value} className="pt-4">
          {item.content}
        </Radix.Content>
      ))}
    </Radix.Root>
  )
}
