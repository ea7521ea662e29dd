import type { ReactNode } from 'react'
import { ScreenCaution } from './screen-caution'

/**
 * The sheet in the middle and, when there are notes, the right margin; under 1280 px the notes
 * follow the sheet. Every page of the studio draws one inside the StudioShell of its layout.
 */
export function Sheet({
  notes,
  children,
}: {
  /** For the right margin: Note elements. */
  notes?: ReactNode
  children: ReactNode
}) {
  return (
    <div
      className={notes ? 'xl:grid xl:grid-cols-[minmax(0,1fr)_18rem] print:block' : 'print:block'}
    >
      <main
        id="sheet"
        tabIndex={-1}
        className="min-w-0 px-4 pt-5 pb-16 outline-none sm:px-6 margins:px-10 margins:pt-7 print:p-0"
      >
        {children}
        <ScreenCaution printOnly className="mt-8" />
      </main>
      {notes ? (
        <div className="margins:max-xl:mx-10 margins:max-xl:px-0 border-t border-hairline px-4 pt-6 pb-16 xl:border-t-0 xl:border-l xl:pt-7 sm:px-6 print:hidden">
          <aside
            aria-label="Notes"
            className="max-xl:sm:grid-cols-2 grid gap-x-8 gap-y-6 xl:sticky xl:top-7"
          >
            {notes}
          </aside>
        </div>
      ) : null}
    </div>
  )
}
