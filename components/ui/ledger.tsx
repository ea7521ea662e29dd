import type { ComponentProps, ReactNode } from 'react'
import { cn } from './cn'

/**
 * A table ruled like a ledger: hairlines, no boxes. It scrolls sideways inside itself where the
 * page is narrow, and the keyboard can reach it there.
 */
export function Ledger({
  caption,
  showCaption = false,
  className,
  children,
  ...rest
}: ComponentProps<'table'> & { caption: ReactNode; showCaption?: boolean }) {
  return (
    <div
      role="group"
      aria-label={typeof caption === 'string' ? caption : undefined}
      tabIndex={0}
      className="max-w-full overflow-x-auto print:overflow-visible"
    >
      <table
        className={cn(
          'w-full border-collapse text-left',
          '[&_td]:border-b [&_td]:border-hairline [&_th]:border-b [&_th]:border-hairline',
          '[&_td]:py-2.5 [&_td]:pr-4 [&_td]:align-middle [&_td:last-child]:pr-0',
          '[&_th]:pr-4 [&_th:last-child]:pr-0',
          '[&_thead_th]:border-rule [&_thead_th]:py-1.5 [&_thead_th]:align-bottom [&_thead_th]:text-sm [&_thead_th]:font-normal [&_thead_th]:text-ink-faint',
          '[&_tbody_th]:py-2.5 [&_tbody_th]:font-normal',
          '[&_.number]:text-right [&_.number]:whitespace-nowrap',
          className,
        )}
        {...rest}
      >
        <caption className={showCaption ? 'pb-2 text-left font-title text-lg' : 'sr-only'}>
          {caption}
        </caption>
        {children}
      </table>
    </div>
  )
}

/** A list ruled like a ledger, for rows that are not a table. */
export function LedgerList({ className, ...rest }: ComponentProps<'ul'>) {
  return (
    <ul
      role="list"
      className={cn('divide-y divide-hairline border-y border-hairline', className)}
      {...rest}
    />
  )
}

/** Terms and readings, one a line: the facts of one thing. */
export function Facts({
  items,
  className,
}: {
  items: readonly { term: ReactNode; reading: ReactNode }[]
  className?: string
}) {
  return (
    <dl className={cn('divide-y divide-hairline', className)}>
      {items.map((item, index) => (
        <div key={index} className="flex justify-between gap-4 py-1.5">
          <dt className="shrink-0 text-ink-faint">{item.term}</dt>
          <dd className="text-right">{item.reading}</dd>
        </div>
      ))}
    </dl>
  )
}
