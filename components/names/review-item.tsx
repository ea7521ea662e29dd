'use client'

import type { RefObject } from 'react'

import { dayInWords } from '@/components/date-words'
import { SheetSection } from '@/components/layout/sheet-header'
import { Button } from '@/components/ui/button'
import { TextLink } from '@/components/ui/text-link'
import type { ReviewItem as Item } from '@/lib/names/present'

import { Findings } from './findings'
import { inShort } from './finding-words'
import { KeyHint } from './key-hint'
import { MOVE_BUTTONS, MOVE_PENDING } from './move-words'
import { namesHref, type NamesPlace } from './names-place'
import { ReasonForm } from './reason-form'
import { ReviewStage } from './review-stage'
import { nameOf } from './said-when'
import type { ReviewMove, useReview } from './use-review'

const DECISIONS: readonly { move: ReviewMove; key: string }[] = [
  { move: 'approve', key: 'a' },
  { move: 'return', key: 'r' },
  { move: 'put-by', key: 'p' },
]

/** The name in front: its shade among its neighbours, what it says, the decision, the checks. */
export function ReviewItem({
  place,
  item,
  decides,
  walk,
  heading,
  keys,
}: {
  place: NamesPlace
  item: Item
  decides: boolean
  walk: ReturnType<typeof useReview>
  heading: RefObject<HTMLHeadingElement | null>
  keys: boolean
}) {
  const { idea, shade } = item
  return (
    <div className="grid gap-x-10 gap-y-6 lg:grid-cols-[minmax(0,20rem)_minmax(0,1fr)]">
      <ReviewStage item={item} />
      <div className="min-w-0">
        <h2 ref={heading} tabIndex={-1} className="text-3xl break-words outline-none">
          {idea.text}
        </h2>
        <p className="mt-1 text-ink-faint">
          for No. {shade.number} · by {nameOf(idea.author)}
          {idea.wordedBy && idea.wordedBy.id !== idea.author?.id
            ? `, worded by ${nameOf(idea.wordedBy)}`
            : ''}{' '}
          · in review since {dayInWords(idea.stateSince)}
        </p>
        {idea.note ? (
          <p className="mt-3 max-w-measure break-words whitespace-pre-line">{idea.note}</p>
        ) : null}
        <Beside item={item} />
        <Decisions item={item} decides={decides} walk={walk} keys={keys} />
        <SheetSection title="The checks" aside={inShort(idea.findings)} className="mt-8">
          {idea.findings ? (
            <Findings findings={idea.findings} />
          ) : (
            <p className="text-ink-faint">It was not checked when it was sent.</p>
          )}
          {idea.wordingReason ? (
            <p className="mt-3 max-w-measure break-words">
              <span className="font-semibold">Why the wording stands:</span> {idea.wordingReason}
            </p>
          ) : null}
        </SheetSection>
        <p className="mt-4">
          <TextLink href={namesHref(place, `/ideas/${idea.id}`)}>
            Open the page of this name, with its history and searches
          </TextLink>
        </p>
      </div>
    </div>
  )
}

/** What it would take the place of, and what else is proposed for the same shade. */
function Beside({ item: { held, rivals } }: { item: Item }) {
  if (!held && rivals.length === 0) return null
  return (
    <div className="mt-3 max-w-measure space-y-1 text-ink-soft">
      {held ? (
        <p>
          The shade is called “{held.text}” now
          {held.locked
            ? ', and names are locked for the label printer: an owner must unlock that one first.'
            : '. That name is put by if you approve this one.'}
        </p>
      ) : null}
      {rivals.length > 0 ? (
        <p>Also in review for it: {rivals.map((text) => `“${text}”`).join(', ')}.</p>
      ) : null}
    </div>
  )
}

function Decisions({
  item: { idea },
  decides,
  walk,
  keys,
}: {
  item: Item
  decides: boolean
  walk: ReturnType<typeof useReview>
  keys: boolean
}) {
  const { asking, pending, decide, ask, leave } = walk
  const open = DECISIONS.filter(({ move }) => idea.moves.includes(move))
  const takesBack = idea.moves.includes('recall') && (idea.isOwn || !decides)
  if (asking)
    return (
      <div className="mt-5">
        <ReasonForm
          move="return"
          pending={pending === 'return'}
          onGive={(reason) => void decide('return', reason)}
          onLeave={leave}
        />
      </div>
    )
  return (
    <div className="mt-5 space-y-2">
      {open.length > 0 || takesBack ? (
        <div role="group" aria-label="Decide" className="flex flex-wrap gap-2">
          {open.map(({ move, key }) => (
            <Button
              key={move}
              variant={move === 'approve' ? 'primary' : 'secondary'}
              aria-keyshortcuts={keys ? key : undefined}
              pending={pending === move}
              pendingLabel={MOVE_PENDING[move]}
              onClick={() => (move === 'return' ? ask() : void decide(move))}
            >
              {MOVE_BUTTONS[move]}
              {keys ? <KeyHint of={key} /> : null}
            </Button>
          ))}
          {takesBack ? (
            <Button
              variant="quiet"
              pending={pending === 'recall'}
              pendingLabel={MOVE_PENDING.recall}
              onClick={() => void decide('recall')}
            >
              {MOVE_BUTTONS.recall}
            </Button>
          ) : null}
        </div>
      ) : null}
      {decides && !idea.moves.includes('approve') ? (
        <p className="text-ink-soft">It is your own idea: somebody else must approve it.</p>
      ) : null}
      {decides ? null : (
        <p className="max-w-measure text-ink-soft">
          Owners and appointed reviewers decide. What you think counts too: say it below.
        </p>
      )}
    </div>
  )
}
