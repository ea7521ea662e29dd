'use client'

import { useTransition } from 'react'

import { Button } from '@/components/ui/button'
import { LedgerList } from '@/components/ui/ledger'
import { toastDone, toastProblem } from '@/components/ui/toast'
import { VisuallyHidden } from '@/components/ui/visually-hidden'
import type { ActionResult } from '@/lib/errors'
import type { SessionView } from '@/lib/people/present'
import type { EndSessionInput } from '@/lib/people/schema'

/** Where somebody is signed in, and the way to end each or all others. */
export function SessionsList({
  sessions,
  end,
  endOthers,
}: {
  sessions: readonly SessionView[]
  end: (input: EndSessionInput) => Promise<ActionResult<void>>
  endOthers: (input: Record<string, never>) => Promise<ActionResult<number>>
}) {
  const others = sessions.filter(({ current }) => !current).length
  return (
    <div className="space-y-5">
      <LedgerList>
        {sessions.map((session) => (
          <li
            key={session.id}
            className="flex flex-wrap items-center justify-between gap-x-6 gap-y-2 py-3"
          >
            <div className="min-w-0">
              <p className="font-semibold">
                {session.browser}
                {session.current ? (
                  <span className="font-normal text-ink-soft"> · this one</span>
                ) : null}
              </p>
              <p className="text-sm break-words text-ink-faint">
                Signed in {session.signedIn}
                {session.address ? ` from ${session.address}` : ''}
                {session.current ? '' : ` · last seen ${session.lastSeen}`}
              </p>
            </div>
            {session.current ? null : (
              <EndButton
                end={() => end({ sessionId: session.id })}
                done={`${session.browser} is signed out.`}
              >
                End session
                <VisuallyHidden>
                  {' '}
                  of {session.browser}, signed in {session.signedIn}
                </VisuallyHidden>
              </EndButton>
            )}
          </li>
        ))}
      </LedgerList>
      {others > 0 ? (
        <EndButton end={() => endOthers({})} done="You are signed out everywhere else.">
          End all other sessions
        </EndButton>
      ) : null}
    </div>
  )
}

function EndButton({
  end,
  done,
  children,
}: {
  end: () => Promise<ActionResult<unknown>>
  done: string
  children: React.ReactNode
}) {
  const [pending, start] = useTransition()
  const press = () =>
    start(async () => {
      const answer = await end().catch(() => null)
      if (answer?.ok) toastDone(done)
      else toastProblem(answer?.message ?? 'Woadmap could not be reached. Nothing was changed.')
    })
  return (
    <Button size="small" pending={pending} pendingLabel="Ending…" onClick={press}>
      {children}
    </Button>
  )
}
