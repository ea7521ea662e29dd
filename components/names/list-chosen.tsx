'use client'

import { useState } from 'react'

import { reach } from '@/components/reach'
import { Button } from '@/components/ui/button'
import { LiveRegion } from '@/components/ui/live-region'
import { Notice } from '@/components/ui/notice'
import { TextLink } from '@/components/ui/text-link'
import { toastDone, toastProblem, toastUndo } from '@/components/ui/toast'

import type { ListActions, Moved } from './list-actions'
import { countNames } from './list-words'
import { namesHref, type NamesPlace } from './names-place'

/** Of those that stayed so many are named. */
const NAMED = 8

/** What can be done with the chosen names of the list, on whichever page they stand. */
export function ChosenNames({
  place,
  actions,
  ideaIds,
  onChoose,
}: {
  place: NamesPlace
  actions: Pick<ListActions, 'send' | 'recall' | 'putBy' | 'takeUp'>
  ideaIds: readonly string[]
  /** Chooses these and no others. */
  onChoose: (ideaIds: readonly string[]) => void
}) {
  const [pending, setPending] = useState<keyof typeof actions>()
  const [stayed, setStayed] = useState<Moved['stayed']>([])
  const { brand, lineSlug } = place

  /** Moves these names; those that stay are said why, and stay chosen. */
  async function move(
    action: keyof typeof actions,
    ids: readonly string[],
    tell: (moved: string[]) => void,
  ): Promise<void> {
    setPending(action)
    setStayed([])
    const answer = await reach(actions[action](brand, { lineSlug, ideaIds: [...ids] }))
    setPending(undefined)
    if (!answer.ok) return toastProblem(answer.message)
    setStayed(answer.data.stayed)
    onChoose(answer.data.stayed.map(({ ideaId }) => ideaId))
    tell(answer.data.moved)
  }

  const takeUp = (ids: string[]) =>
    void move('takeUp', ids, ({ length }) => toastDone(`${countNames(length)} taken up again.`))

  const chosen = countNames(ideaIds.length)
  return (
    <>
      <LiveRegion>{ideaIds.length > 0 ? `${chosen} chosen.` : ''}</LiveRegion>
      {stayed.length > 0 ? (
        <Notice
          kind="warning"
          title={`${countNames(stayed.length)} stayed as ${stayed.length === 1 ? 'it was' : 'they were'}`}
          className="mt-4 print:hidden"
        >
          <ul role="list">
            {stayed.slice(0, NAMED).map(({ ideaId, text, why }) => (
              <li key={ideaId}>
                <TextLink href={namesHref(place, `/ideas/${ideaId}`)}>{text}</TextLink>: {why}
              </li>
            ))}
          </ul>
          {stayed.length > NAMED ? <p>and {stayed.length - NAMED} more.</p> : null}
        </Notice>
      ) : null}
      {ideaIds.length > 0 ? (
        <section
          aria-label="Chosen names"
          className="z-10 mt-4 flex flex-wrap items-center gap-x-4 gap-y-3 border-y border-rule bg-paper py-3 md:sticky md:bottom-0 print:hidden"
        >
          <p className="font-medium">{chosen} chosen</p>
          <Button
            variant="primary"
            pending={pending === 'send'}
            onClick={() =>
              void move('send', ideaIds, ({ length }) =>
                toastDone(`${countNames(length)} sent for review.`),
              )
            }
          >
            Send for review
          </Button>
          <Button
            pending={pending === 'recall'}
            onClick={() =>
              void move('recall', ideaIds, ({ length }) =>
                toastDone(`${countNames(length)} taken back from review.`),
              )
            }
          >
            Take back names
          </Button>
          <Button
            pending={pending === 'putBy'}
            onClick={() =>
              void move('putBy', ideaIds, (moved) =>
                toastUndo(
                  `${countNames(moved.length)} put by.`,
                  () => takeUp(moved),
                  'Take up again',
                ),
              )
            }
          >
            Put names by
          </Button>
          <Button
            variant="quiet"
            onClick={() => {
              setStayed([])
              onChoose([])
            }}
          >
            Choose none
          </Button>
        </section>
      ) : null}
    </>
  )
}
