import { Status } from '@/components/ui/status'
import type { Finding } from '@/lib/naming/finding'

/** What stands out among the names of a line, warnings first. */
export function LineFindings({ findings }: { findings: readonly Finding[] }) {
  if (findings.length === 0) return <Status kind="done">Nothing stands out.</Status>
  const sorted = [
    ...findings.filter(({ grade }) => grade === 'warning'),
    ...findings.filter(({ grade }) => grade === 'note'),
  ]
  return (
    <ul role="list" className="max-w-measure space-y-3">
      {sorted.map(({ grade, what, why }) => (
        <li key={what}>
          <Status
            kind={grade === 'warning' ? 'attention' : 'none'}
            className="items-start text-base"
          >
            {what}
          </Status>
          <p className="pl-5.5 text-sm text-ink-soft">{why}</p>
        </li>
      ))}
    </ul>
  )
}
