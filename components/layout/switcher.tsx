'use client'

import { Check, ChevronsUpDown } from 'lucide-react'
import { AppLink } from '@/components/ui/app-link'

/** A name with its place. */
export interface Place {
  name: string
  href: string
}

/**
 * The current brand or line, and the others to go to. A browser's own disclosure: it stands on
 * every page, so it brings no script of its own.
 */
export function Switcher({
  current,
  places,
  heading,
  className,
}: {
  current: Place
  places: readonly Place[]
  heading: string
  className?: string
}) {
  return (
    <details
      // Another place is another disclosure, closed.
      key={current.href}
      className="relative"
      onKeyDown={(event) => {
        if (event.key !== 'Escape') return
        event.currentTarget.open = false
        event.currentTarget.querySelector('summary')?.focus()
      }}
      onBlur={(event) => {
        if (!event.currentTarget.contains(event.relatedTarget)) event.currentTarget.open = false
      }}
    >
      <summary
        className={`-mx-1.5 flex min-h-8 w-[calc(100%+0.75rem)] cursor-pointer list-none items-center justify-between gap-2 rounded px-1.5 hover:bg-wash pointer-coarse:min-h-11 [&::-webkit-details-marker]:hidden ${className ?? ''}`}
      >
        <span className="min-w-0 break-words">
          <span className="sr-only">{heading}: </span>
          {current.name}
        </span>
        <ChevronsUpDown aria-hidden="true" className="size-4 shrink-0 text-ink-faint" />
      </summary>
      <ul
        role="list"
        aria-label={heading}
        className="absolute z-20 mt-1 max-h-80 w-full overflow-y-auto rounded border border-rule bg-sheet py-1 font-body text-base"
      >
        {places.map(({ name, href }) => (
          <li key={href}>
            <AppLink
              href={href}
              aria-current={href === current.href ? 'true' : undefined}
              className="flex min-h-9 items-center justify-between gap-2 px-3 hover:bg-wash pointer-coarse:min-h-11"
            >
              <span className="min-w-0 break-words">{name}</span>
              {href === current.href ? (
                <Check aria-hidden="true" className="size-4 shrink-0" />
              ) : null}
            </AppLink>
          </li>
        ))}
      </ul>
    </details>
  )
}
