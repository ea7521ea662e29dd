import { Status, type StatusKind } from '@/components/ui/status'
import type { PhotographState } from '@/lib/photographs/constants'

const STATES: Record<PhotographState, { kind: StatusKind; words: string }> = {
  pending: { kind: 'waiting', words: 'Not sent yet' },
  waiting: { kind: 'waiting', words: 'Waiting to be read' },
  reading: { kind: 'waiting', words: 'Being read' },
  ready: { kind: 'done', words: 'Read' },
  failed: { kind: 'problem', words: 'Could not be read' },
}

/** Where a photograph stands, as an icon and words. */
export function StateStatus({ state }: { state: PhotographState }) {
  const { kind, words } = STATES[state]
  return <Status kind={kind}>{words}</Status>
}
