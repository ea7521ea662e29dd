import { CircleAlert, Info, TriangleAlert } from 'lucide-react'
import type { ReactNode } from 'react'
import { cn } from './cn'

const ICONS = { info: Info, warning: TriangleAlert, error: CircleAlert }

/**
 * A message on the sheet: what happened, what was kept, what to do. An error is spoken at once.
 */
export function Notice({
  kind = 'info',
  title,
  children,
  actions,
  className,
}: {
  kind?: keyof typeof ICONS
  title?: string
  children?: ReactNode
  actions?: ReactNode
  className?: string
}) {
  const Icon = ICONS[kind]
  return (
    <div
      role={kind === 'error' ? 'alert' : undefined}
      className={cn(
        'flex gap-3 border-l-2 py-1 pl-3',
        kind === 'info' ? 'border-rule' : 'border-ink',
        className,
      )}
    >
      <Icon aria-hidden="true" className="mt-0.5 size-[1.125rem] shrink-0" />
      <div className="max-w-measure min-w-0">
        {title ? <p className="font-semibold">{title}</p> : null}
        {children ? <div className="text-ink-soft">{children}</div> : null}
        {actions ? <div className="mt-2 flex flex-wrap gap-2">{actions}</div> : null}
      </div>
    </div>
  )
}
