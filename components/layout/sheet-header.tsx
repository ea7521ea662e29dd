import { ChevronLeft } from 'lucide-react'
import type { ReactNode } from 'react'
import { AppLink } from '@/components/ui/app-link'

/** Props of {@link SheetHeader}. */
export interface SheetHeaderProps {
  title: ReactNode
  /** Facts in one line: "Own work · read 2 minutes ago". */
  meta?: ReactNode
  /** Buttons; the primary one last. */
  actions?: ReactNode
  back?: { href: string; label: string }
}

/** The head of a sheet; its title is the page's h1. */
export function SheetHeader({ title, meta, actions, back }: SheetHeaderProps) {
  return (
    <header className="mb-6 print:mb-4">
      {back ? (
        <AppLink
          href={back.href}
          className="mb-1 -ml-1 inline-flex min-h-8 items-center gap-0.5 text-ink-soft hover:text-ink print:hidden pointer-coarse:min-h-11"
        >
          <ChevronLeft aria-hidden="true" className="size-4" />
          {back.label}
        </AppLink>
      ) : null}
      <div className="flex flex-wrap items-end justify-between gap-x-6 gap-y-4">
        <div className="min-w-0">
          <h1 className="text-2xl break-words md:text-3xl">{title}</h1>
          {meta ? <div className="mt-1 text-ink-faint">{meta}</div> : null}
        </div>
        {actions ? (
          <div className="flex flex-wrap gap-3 max-sm:w-full print:hidden max-sm:[&>*]:grow">
            {actions}
          </div>
        ) : null}
      </div>
    </header>
  )
}

/** A titled part of a sheet. */
export function SheetSection({
  title,
  aside,
  children,
  className,
}: {
  title: ReactNode
  /** A word or a control at the end of the title's line. */
  aside?: ReactNode
  children: ReactNode
  className?: string
}) {
  return (
    <section className={className ?? 'mt-10'}>
      <div className="mb-3 flex flex-wrap items-baseline justify-between gap-x-4 gap-y-1 border-b border-hairline pb-2">
        <h2 className="text-xl">{title}</h2>
        {aside ? <div className="text-sm text-ink-faint">{aside}</div> : null}
      </div>
      {children}
    </section>
  )
}
