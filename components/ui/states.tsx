import { CircleAlert, Lock, SearchX } from 'lucide-react'
import type { ReactNode } from 'react'

interface StateProps {
  title: string
  children?: ReactNode
  /** The one action that helps. */
  action?: ReactNode
  /** `h1` when the state is the whole page. */
  heading?: 'h1' | 'h2' | 'h3'
}

function State({
  title,
  children,
  action,
  heading: Heading = 'h2',
  picture,
  role,
}: StateProps & { picture: ReactNode; role?: 'alert' }) {
  return (
    <section role={role} className="flex max-w-measure flex-col items-start gap-3 py-10">
      {picture}
      <Heading className="text-xl">{title}</Heading>
      {children ? <div className="space-y-2 text-ink-soft">{children}</div> : null}
      {action ? <div className="mt-2 flex flex-wrap gap-3">{action}</div> : null}
    </section>
  )
}

/** A card with nothing wound on it yet. */
function BareCard() {
  return (
    <svg width="96" height="60" viewBox="0 0 96 60" aria-hidden="true">
      <path
        d="M4.5 3.5h87v9l-4 3 4 3-4 3 4 3-4 3 4 3-4 3 4 3-4 3 4 3-4 3v12h-79v-12l-4-3 4-3-4-3 4-3-4-3 4-3-4-3 4-3-4-3 4-3-4-3z"
        fill="var(--yarn-card)"
        stroke="var(--rule)"
        strokeLinejoin="round"
      />
      <path
        d="M4 16c30 3 60-3 87 1M5 22c20 2 34-1 45 1"
        fill="none"
        stroke="var(--rule)"
        strokeDasharray="2 3"
      />
    </svg>
  )
}

/** Nothing here yet: what will stand here, and the one action that fills it. */
export function EmptyState(props: StateProps) {
  return <State {...props} picture={<BareCard />} />
}

/** Something broke: what happened, what was kept, what to do. */
export function ErrorState(props: StateProps) {
  return (
    <State
      {...props}
      role="alert"
      picture={<CircleAlert aria-hidden="true" className="size-7" strokeWidth={1.5} />}
    />
  )
}

/** This person may not do or see this; says who can. */
export function ForbiddenState(props: StateProps) {
  return (
    <State {...props} picture={<Lock aria-hidden="true" className="size-7" strokeWidth={1.5} />} />
  )
}

/** Nothing stands at this address, or the filter leaves nothing. */
export function NotFoundState(props: StateProps) {
  return (
    <State
      {...props}
      picture={<SearchX aria-hidden="true" className="size-7" strokeWidth={1.5} />}
    />
  )
}
