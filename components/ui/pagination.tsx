import { ChevronLeft, ChevronRight } from 'lucide-react'
import { AppLink } from './app-link'
import { buttonClass } from './button-class'

/**
 * The pages of a long list, as links. Leave out the address of a page that does not exist; with
 * neither, nothing is drawn.
 */
export function Pagination({
  label,
  summary,
  previousHref,
  previousLabel = 'Previous page',
  nextHref,
  nextLabel = 'Next page',
}: {
  /** "Pages of photographs" */
  label: string
  /** "49–96 of 213 photographs" */
  summary?: string
  previousHref?: string
  previousLabel?: string
  nextHref?: string
  nextLabel?: string
}) {
  if (!previousHref && !nextHref) return null
  return (
    <nav
      aria-label={label}
      className="mt-6 flex flex-wrap items-center gap-3 border-t border-hairline pt-4 print:hidden"
    >
      {previousHref ? (
        <AppLink href={previousHref} rel="prev" className={buttonClass('secondary', 'main')}>
          <ChevronLeft aria-hidden="true" /> {previousLabel}
        </AppLink>
      ) : null}
      {nextHref ? (
        <AppLink href={nextHref} rel="next" className={buttonClass('secondary', 'main')}>
          {nextLabel} <ChevronRight aria-hidden="true" />
        </AppLink>
      ) : null}
      {summary ? <p className="ml-auto text-sm text-ink-faint">{summary}</p> : null}
    </nav>
  )
}
