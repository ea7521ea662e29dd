import type { ReactNode } from 'react'
import { AppLink } from './app-link'
import { TAB_CLASS, TAB_LIST_CLASS } from './tab-class'

/** Tabs that are pages: links, so that each has its address. */
export function NavTabs({
  label,
  items,
}: {
  label: string
  items: readonly { href: string; label: ReactNode; note?: ReactNode; current?: boolean }[]
}) {
  return (
    <nav aria-label={label} className={TAB_LIST_CLASS}>
      {items.map((item) => (
        <AppLink
          key={item.href}
          href={item.href}
          aria-current={item.current ? 'page' : undefined}
          className={TAB_CLASS}
        >
          {item.label}
          {item.note ? <span className="font-normal text-ink-faint"> {item.note}</span> : null}
        </AppLink>
      ))}
    </nav>
  )
}
