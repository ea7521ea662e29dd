import type { ReactNode } from 'react'

/** A key to press. */
export function Kbd({ children }: { children: ReactNode }) {
  return (
    <kbd className="inline-block min-w-5 rounded border border-rule bg-sheet px-1 text-center font-body text-xs text-ink-soft">
      {children}
    </kbd>
  )
}
