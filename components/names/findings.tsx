import { Status } from '@/components/ui/status'
import type { Finding } from '@/lib/naming/finding'

import { CHECK_WORDS, SURE_WORDS } from './finding-words'

/** What the checks found about a name: each says what, why, and how sure it is; warnings first. */
export function Findings({ findings }: { findings: readonly Finding[] }) {
  if (findings.length === 0) return <Status kind="done">The checks found nothing.</Status>
  const sorted = [
    ...findings.filter(({ grade }) => grade === 'warning'),
    ...findings.filter(({ grade }) => grade === 'note'),
  ]
  return (
    <ul className="max-w-measure space-y-3">
      {sorted.map(({ check, grade, what, why, sure }) => (
        <li key={check + what}>
          <Status kind={grade === 'warning' ? 'attention' : 'none'}>
            {CHECK_WORDS[check]} ({SURE_WORDS[sure]})
          </Status>
          <p className="text-ink">{what}</p>
          <p className="text-sm text-ink-soft">{why}</p>
        </li>
      ))}
    </ul>
  )
}
