import { Button } from '@/components/ui/button'
import { Notice } from '@/components/ui/notice'

import type { BoardState } from './board-state'

const moves = (count: number) => (count === 1 ? 'One move is' : `${count} moves are`)

/** What stands between the board and the server: moves that wait, and moves that were refused. */
export function BoardNotices({
  waits,
  waiting,
  outOfTouch,
  refused,
  onRetry,
  onDismiss,
}: Pick<BoardState, 'waits' | 'refused'> & {
  /** How many moves are not answered yet. */
  waiting: number
  /** What others do has not been heard of for a while. */
  outOfTouch: boolean
  onRetry: () => void
  onDismiss: () => void
}) {
  const lost = waits === 'unreached' || outOfTouch
  return (
    <div className="space-y-4 not-empty:mb-6">
      {waits === 'signed-out' ? (
        <Notice
          kind="warning"
          title="Your session has ended"
          actions={
            <Button size="small" onClick={onRetry}>
              Send moves again
            </Button>
          }
        >
          {moves(waiting)} kept here. Sign in again in another tab, then send them.
        </Notice>
      ) : lost ? (
        <Notice
          kind="warning"
          title="Woadmap cannot be reached"
          actions={
            waiting > 0 && (
              <Button size="small" onClick={onRetry}>
                Send moves again
              </Button>
            )
          }
        >
          {waiting > 0
            ? `${moves(waiting)} kept here and sent as soon as the connection is back. You can go on.`
            : 'What others move is not shown until the connection is back. You can go on: moves are kept.'}
        </Notice>
      ) : null}
      {refused.length > 0 ? (
        <Notice
          kind="error"
          title={
            refused.length === 1 ? 'A move was not done' : `${refused.length} moves were not done`
          }
          actions={
            <Button size="small" onClick={onDismiss}>
              Close message
            </Button>
          }
        >
          {refused.map(({ key, words }) => (
            <p key={key}>{words}</p>
          ))}
        </Notice>
      ) : null}
    </div>
  )
}
