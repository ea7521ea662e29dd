import { Status, type StatusKind } from '@/components/ui/status'
import { STATE_WORDS, type NameState } from '@/lib/names/constants'

const KINDS: Record<NameState, StatusKind> = {
  draft: 'draft',
  'in-review': 'waiting',
  approved: 'done',
  returned: 'attention',
  'put-by': 'retired',
}

/** Where an idea stands; a locked name says so instead. */
export function IdeaState({ state, locked = false }: { state: NameState; locked?: boolean }) {
  return (
    <Status kind={locked ? 'locked' : KINDS[state]}>
      {STATE_WORDS[state]}
      {locked ? ', locked' : ''}
    </Status>
  )
}
