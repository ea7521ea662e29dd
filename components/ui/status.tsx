import {
  Archive,
  Check,
  CircleAlert,
  CircleDashed,
  Clock,
  Lock,
  PencilLine,
  TriangleAlert,
  type LucideIcon,
} from 'lucide-react'
import type { ReactNode } from 'react'
import { cn } from './cn'

const KINDS = {
  done: Check,
  waiting: Clock,
  attention: TriangleAlert,
  problem: CircleAlert,
  draft: PencilLine,
  none: CircleDashed,
  locked: Lock,
  retired: Archive,
} satisfies Record<string, LucideIcon>

/** What a status means; each has its own icon. */
export type StatusKind = keyof typeof KINDS

/** A state said by an icon and a word, with no colour of its own. */
export function Status({
  kind,
  children,
  className,
}: {
  kind: StatusKind
  children: ReactNode
  className?: string
}) {
  const Icon = KINDS[kind]
  const loud = kind === 'attention' || kind === 'problem'
  return (
    <span
      className={cn(
        'inline-flex items-center gap-1.5 text-sm',
        loud ? 'font-semibold text-ink' : 'text-ink-soft',
        className,
      )}
    >
      <Icon aria-hidden="true" className="size-4 shrink-0" strokeWidth={loud ? 2.25 : 1.75} />
      <span>{children}</span>
    </span>
  )
}
