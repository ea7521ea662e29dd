'use client'

import { usePathname } from 'next/navigation'
import { AppLink } from '@/components/ui/app-link'
import { LinkPending } from './link-pending'

/** A chapter of the line in the left margin. */
export interface Chapter {
  label: string
  href: string
  /** How many, or what is missing: "40", "9 of 12", "2 to judge". */
  note?: string
}

/** The line's chapters in the order of the work; the one that is open is marked. */
export function ChapterNav({ chapters, label }: { chapters: readonly Chapter[]; label: string }) {
  const path = usePathname()
  return (
    <nav aria-label={label}>
      <ul role="list" className="divide-y divide-hairline border-b border-hairline">
        {chapters.map((chapter) => (
          <li key={chapter.href}>
            <AppLink
              href={chapter.href}
              aria-current={
                path === chapter.href || path.startsWith(`${chapter.href}/`) ? 'page' : undefined
              }
              className="group relative flex min-h-10 items-baseline justify-between gap-3 py-2 aria-[current=page]:font-semibold aria-[current=page]:text-woad pointer-coarse:min-h-12 pointer-coarse:py-3"
            >
              <span
                aria-hidden="true"
                className="absolute inset-y-1.5 -left-6 hidden w-[3px] bg-woad group-aria-[current=page]:block"
              />
              <span className="inline-flex items-center gap-2">
                <span className="group-hover:underline">{chapter.label}</span>
                <LinkPending />
              </span>
              {chapter.note ? (
                <span className="text-right text-sm font-normal text-ink-faint">
                  {chapter.note}
                </span>
              ) : null}
            </AppLink>
          </li>
        ))}
      </ul>
    </nav>
  )
}
