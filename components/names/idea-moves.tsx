'use client'

import { useRouter } from 'next/navigation'
import { useRef, useState } from 'react'

import { reach } from '@/components/reach'
import { Button } from '@/components/ui/button'
import { LiveRegion } from '@/components/ui/live-region'
import { Notice } from '@/components/ui/notice'
import type { StateMove } from '@/lib/names/constants'
import type { IdeaView } from '@/lib/names/present'

import type { MoveActions } from './idea-actions'
import { MOVE_BUTTONS, MOVE_DONE, MOVE_PENDING, REASON_WORDS } from './move-words'
import type { NamesPlace } from './names-place'
import { ReasonForm } from './reason-form'

/** What mostly comes next with an idea, by its state; it stands first. */
const MAIN: readonly StateMove[] = ['send', 'approve', 'take-up']

/** The moves that the reader may make with an idea now. */
export function IdeaMoves({
  place: { brand, lineSlug },
  idea,
  actions,
}: {
  place: NamesPlace
  idea: IdeaView
  actions: MoveActions
}) {
  const router = useRouter()
  const [asking, setAsking] = useState<StateMove | null>(null)
  const [pending, setPending] = useState<StateMove | null>(null)
  const [problem, setProblem] = useState<string | null>(null)
  const [said, setSaid] = useState('')
  const group = useRef<HTMLDivElement>(null)

  async function make(move: StateMove, reason = '') {
    if (pending) return
    setPending(move)
    setProblem(null)
    const { id: ideaId, version, text } = idea
    const answer = await reach<unknown>(
      isBulk(move)
        ? actions[move](brand, { lineSlug, from: idea.state, ideaIds: [ideaId] })
        : actions[move](brand, { lineSlug, ideaId, version, reason }),
    )
    setPending(null)
    if (answer.ok) {
      setAsking(null)
      setSaid(`${MOVE_DONE[move]} “${text}”.`)
      // The button that was pressed may be there no more.
      group.current?.focus()
      return
    }
    setProblem(answer.fieldErrors?.reason?.[0] ?? answer.message)
    if (answer.code === 'conflict') router.refresh()
  }

  return (
    <div ref={group} tabIndex={-1} role="group" aria-label="Moves" className="outline-none">
      <LiveRegion>{said}</LiveRegion>
      {problem ? (
        <Notice kind="error" className="mb-3">
          {problem}
        </Notice>
      ) : null}
      {asking ? (
        <ReasonForm
          key={asking}
          move={asking}
          pending={pending === asking}
          onGive={(reason) => void make(asking, reason)}
          onLeave={() => {
            setAsking(null)
            group.current?.focus()
          }}
        />
      ) : (
        <div className="flex flex-wrap gap-3 empty:hidden">
          {[...idea.moves].sort(mainFirst).map((move) => (
            <Button
              key={move}
              variant={MAIN.includes(move) ? 'primary' : 'secondary'}
              pending={pending === move}
              pendingLabel={MOVE_PENDING[move]}
              onClick={() => (REASON_WORDS[move] ? setAsking(move) : void make(move))}
            >
              {MOVE_BUTTONS[move]}
            </Button>
          ))}
        </div>
      )}
    </div>
  )
}

const mainFirst = (one: StateMove, other: StateMove) =>
  Number(MAIN.includes(other)) - Number(MAIN.includes(one))

const isBulk = (move: StateMove): move is 'send' | 'recall' | 'put-by' | 'take-up' =>
  move === 'send' || move === 'recall' || move === 'put-by' || move === 'take-up'
