import type { ReactNode } from 'react'

/** Words for those who listen to the page. */
export function VisuallyHidden({ children }: { children: ReactNode }) {
  return <span className="sr-only">{children}</span>
}
