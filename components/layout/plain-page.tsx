import type { ReactNode } from 'react'
import { Wordmark } from './wordmark'

/** A page with no margins: the front door, signing in, an error outside the studio. */
export function PlainPage({
  children,
  homeHref,
  wide = false,
}: {
  children: ReactNode
  homeHref?: string
  wide?: boolean
}) {
  return (
    <div
      className={`mx-auto flex min-h-dvh w-full flex-col px-4 pt-6 pb-16 sm:px-6 ${wide ? 'max-w-5xl' : 'max-w-md'}`}
    >
      <Wordmark href={homeHref} />
      <main id="sheet" className="mt-10 grow">
        {children}
      </main>
    </div>
  )
}
