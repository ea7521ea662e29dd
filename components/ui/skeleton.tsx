import { cn } from './cn'

/** A still, undyed place where something will stand; give it a size by class. */
export function Skeleton({ className }: { className?: string }) {
  return <div aria-hidden="true" className={cn('rounded bg-wash', className)} />
}

/** Ledger rows that are on their way, with the words for those who listen. */
export function SkeletonRows({ rows = 6, label = 'Loading' }: { rows?: number; label?: string }) {
  return (
    <div role="status" className="divide-y divide-hairline">
      <span className="sr-only">{label}…</span>
      {Array.from({ length: rows }, (_, row) => (
        <div key={row} className="flex items-center gap-4 py-3">
          <Skeleton className="h-11 w-20 shrink-0" />
          <div className="grow space-y-2">
            <Skeleton className="h-4 w-2/5" />
            <Skeleton className="h-3 w-1/4" />
          </div>
        </div>
      ))}
    </div>
  )
}
