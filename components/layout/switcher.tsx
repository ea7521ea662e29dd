'use client'

import { ChevronsUpDown } from 'lucide-react'
import { DropdownMenu } from '@/components/ui/menu'

/** A name with its place. */
export interface Place {
  name: string
  href: string
}

/** The current brand or line; a menu when there are others to go to. */
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
    <DropdownMenu
      align="start"
      heading={heading}
      items={places.map((place) => ({
        label: place.name,
        href: place.href,
        current: place.href === current.href,
      }))}
      trigger={
        <button
          type="button"
          className={`-mx-1.5 flex min-h-8 w-[calc(100%+0.75rem)] items-center justify-between gap-2 rounded px-1.5 text-left hover:bg-wash pointer-coarse:min-h-11 ${className ?? ''}`}
        >
          <span className="min-w-0 break-words">
            <span className="sr-only">{heading}: </span>
            {current.name}
          </span>
          <ChevronsUpDown aria-hidden="true" className="size-4 shrink-0 text-ink-faint" />
        </button>
      }
    />
  )
}
