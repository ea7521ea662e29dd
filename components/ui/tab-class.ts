/** A row of tabs on its hairline; it scrolls sideways where it does not fit. */
export const TAB_LIST_CLASS =
  'border-hairline flex gap-x-6 overflow-x-auto border-b [scrollbar-width:none] print:hidden'

/** One tab, chosen by data-state or aria-current. */
export const TAB_CLASS =
  'text-ink-soft hover:text-ink -mb-px shrink-0 border-b-2 border-transparent py-2 whitespace-nowrap ' +
  'data-[state=active]:border-woad data-[state=active]:text-ink data-[state=active]:font-semibold ' +
  'aria-[current=page]:border-woad aria-[current=page]:text-ink aria-[current=page]:font-semibold ' +
  'disabled:text-ink-faint focus-visible:-outline-offset-2 pointer-coarse:py-3'
