import type { ReactNode } from 'react'

/** One note for the right margin; the margin itself is drawn by StudioShell. */
export function Note({ title, children }: { title: ReactNode; children: ReactNode }) {
  return (
    <section className="max-w-measure min-w-0">
      <h2 className="text-lg">{title}</h2>
      <div className="mt-1 space-y-2 text-ink-soft">{children}</div>
    </section>
  )
}
