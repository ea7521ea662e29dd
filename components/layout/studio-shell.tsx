import type { ReactNode } from 'react'
import { AppLink } from '@/components/ui/app-link'
import { ChapterNav, type Chapter } from './chapter-nav'
import { MarginMenu } from './margin-menu'
import { SkipLink } from './skip-link'
import { Switcher, type Place } from './switcher'
import { Wordmark } from './wordmark'

/** Props of {@link StudioShell}. */
export interface StudioShellProps {
  brand: Place
  /** All brands of this person, the current one among them. */
  brands?: readonly Place[]
  person: { name: string; role?: string }
  /** The sign-out form or button. */
  signOut: ReactNode
  line?: Place
  /** All lines of the brand, the current one among them. */
  lines?: readonly Place[]
  chapters?: readonly Chapter[]
  /** What is about the brand as a whole. */
  brandPages?: readonly Chapter[]
  /** One Sheet. */
  children: ReactNode
}

/**
 * The studio's frame: contents in the left margin, one Sheet beside it. Under 900 px the contents
 * fold behind a button. A layout draws it, so that it stays while the sheet changes.
 */
export function StudioShell(props: StudioShellProps) {
  const { brand, line, children } = props
  // One element in both places is sent to the browser once.
  const contents = <Contents {...props} />
  return (
    <div className="margins:grid margins:min-h-dvh margins:grid-cols-[14.5rem_minmax(0,1fr)] print:block">
      <SkipLink />
      <header className="sticky top-0 z-30 flex items-center justify-between gap-3 border-b border-hairline bg-paper px-4 py-2 margins:hidden print:hidden">
        <div className="min-w-0">
          <Wordmark href={brand.href} />
          <p className="truncate text-sm text-ink-faint">{line?.name ?? brand.name}</p>
        </div>
        <MarginMenu>{contents}</MarginMenu>
      </header>
      <div className="hidden border-r border-hairline margins:block print:hidden">
        <div className="sticky top-0 flex h-dvh flex-col overflow-y-auto px-6 pt-6 pb-4">
          <Wordmark href={brand.href} />
          <div className="mt-6 flex grow flex-col">{contents}</div>
        </div>
      </div>
      {children}
    </div>
  )
}

function Contents({
  brand,
  brands = [],
  line,
  lines = [],
  chapters = [],
  brandPages = [],
  person,
  signOut,
}: StudioShellProps) {
  return (
    <>
      {brands.length > 1 ? (
        <Switcher current={brand} places={brands} heading="Brand" className="text-ink-soft" />
      ) : (
        <AppLink href={brand.href} className="inline-flex min-h-8 items-center text-ink-soft">
          {brand.name}
        </AppLink>
      )}
      {line ? (
        lines.length > 1 ? (
          <Switcher current={line} places={lines} heading="Line" className="font-title text-xl" />
        ) : (
          <AppLink href={line.href} className="inline-flex min-h-8 items-center font-title text-xl">
            {line.name}
          </AppLink>
        )
      ) : null}
      {chapters.length > 0 ? (
        <div className="mt-3">
          <ChapterNav chapters={chapters} label={line ? `Chapters of ${line.name}` : brand.name} />
        </div>
      ) : null}
      <div className="mt-auto pt-8">
        {brandPages.length > 0 ? <ChapterNav chapters={brandPages} label={brand.name} /> : null}
      </div>
      <div className="flex flex-wrap items-center justify-between gap-x-3 pt-4 text-sm">
        <p className="min-w-0 text-ink-soft">
          <AppLink
            href="/account"
            className="inline-flex min-h-8 items-center underline decoration-rule underline-offset-[3px] hover:decoration-ink pointer-coarse:min-h-11"
          >
            {person.name}
          </AppLink>
          {person.role ? <span className="block text-ink-faint">{person.role}</span> : null}
        </p>
        {signOut}
      </div>
    </>
  )
}
