'use client'

import { ChevronLeft, ChevronRight, Undo2 } from 'lucide-react'
import { useRef, useState } from 'react'

import { SheetSection } from '@/components/layout/sheet-header'
import { Button } from '@/components/ui/button'
import { LiveRegion } from '@/components/ui/live-region'
import { Notice } from '@/components/ui/notice'
import { Status } from '@/components/ui/status'
import { TextLink } from '@/components/ui/text-link'
import type { ReviewPage } from '@/lib/names/present'

import type { MoveActions, TalkActions } from './idea-actions'
import { KeyHint } from './key-hint'
import { MOVE_DONE } from './move-words'
import { namesHref, type NamesPlace } from './names-place'
import { ReviewEnd } from './review-end'
import { ReviewItem } from './review-item'
import { useKeysOn, useReviewKeys, type ReviewDeed } from './review-keys'
import { RemarkForm, TalkList } from './talk'
import { leftInWords, useReview } from './use-review'
import { VoteForm, VoteList } from './votes'

/** The names in review, one at a time, by keyboard alone if one likes. */
export function Review({
  place,
  review,
  firstId,
  actions,
}: {
  place: NamesPlace
  review: ReviewPage
  /** The name to begin with; the first when it is null. */
  firstId: string | null
  actions: MoveActions & TalkActions
}) {
  const heading = useRef<HTMLHeadingElement>(null)
  const region = useRef<HTMLElement>(null)
  const walk = useReview(place, review, actions, firstId, heading, region)
  const [keys] = useKeysOn()
  const [remarks, setRemarks] = useState<Record<string, string>>({})
  const commentField = useRef<HTMLTextAreaElement>(null)
  const remarkField = useRef<HTMLTextAreaElement>(null)
  const { item, index, isEnd, isGone, done, pending, problem } = walk

  useReviewKeys(region, keys, (deed: ReviewDeed) => {
    if (deed === 'next') walk.go(1)
    else if (deed === 'previous') walk.go(-1)
    else if (deed === 'undo') void walk.undo()
    else if (!item) return
    else if (deed === 'talk') remarkField.current?.focus()
    else if (deed === 'comment') commentField.current?.focus()
    else if (deed === 'yes' || deed === 'unsure' || deed === 'no')
      void walk.vote(walk.own?.vote === deed ? null : deed)
    else if (!item.idea.moves.includes(deed)) walk.say('That is not yours to decide.')
    else if (deed === 'return') walk.ask()
    else void walk.decide(deed)
  })

  return (
    <section
      ref={region}
      aria-label="Names in review"
      aria-busy={walk.isTurning || pending !== null}
      // From a field back to the name, where the keys work.
      onKeyDown={(event) => {
        if (event.key === 'Escape' && event.target instanceof HTMLTextAreaElement)
          heading.current?.focus()
      }}
    >
      <LiveRegion>{walk.said}</LiveRegion>
      {review.total > 0 ? (
        <div className="mb-4 flex flex-wrap items-center justify-between gap-x-6 gap-y-2 border-b border-hairline pb-3">
          <p className="tabular-nums">
            {isEnd ? (
              leftInWords(review.total)
            ) : (
              <>
                Name {review.start + index + 1} of {review.total}
                <span className="text-ink-faint"> in review</span>
              </>
            )}
          </p>
          <div className="flex gap-3">
            <Button
              size="small"
              icon={<ChevronLeft aria-hidden="true" />}
              aria-keyshortcuts={keys ? 'ArrowLeft' : undefined}
              aria-disabled={(index === 0 && review.before === null) || undefined}
              onClick={() => walk.go(-1, { keepFocus: true })}
            >
              Previous name
              {keys ? <KeyHint of="ArrowLeft" /> : null}
            </Button>
            <Button
              size="small"
              aria-keyshortcuts={keys ? 'ArrowRight' : undefined}
              aria-disabled={isEnd || undefined}
              onClick={() => walk.go(1, { keepFocus: true })}
            >
              Next name
              {keys ? <KeyHint of="ArrowRight" /> : null}
              <ChevronRight aria-hidden="true" />
            </Button>
          </div>
        </div>
      ) : null}
      {done ? (
        <div className="mb-4 flex min-h-9 flex-wrap items-center gap-x-4 gap-y-1">
          <Status kind="done">
            {MOVE_DONE[done.move]} “{done.text}” for No. {done.shade}.
          </Status>
          {walk.canUndo ? (
            <Button
              size="small"
              icon={<Undo2 aria-hidden="true" />}
              aria-keyshortcuts={keys ? 'z' : undefined}
              pending={pending === 'undo'}
              pendingLabel="Undoing…"
              onClick={() => void walk.undo()}
            >
              Undo
              {keys ? <KeyHint of="z" /> : null}
            </Button>
          ) : null}
          {done.move === 'take-up' ? (
            <TextLink href={namesHref(place, `/ideas/${done.ideaId}`)}>
              Open it to send it again
            </TextLink>
          ) : null}
        </div>
      ) : null}
      {isGone ? (
        <Notice className="mb-4">
          The name you were looking at is in review no more: somebody decided on it meanwhile. This
          is the one that followed.
        </Notice>
      ) : null}
      {problem ? (
        <Notice kind="error" className="mb-4">
          {problem}
        </Notice>
      ) : null}
      {item ? (
        <div key={item.idea.id}>
          <ReviewItem
            place={place}
            item={item}
            decides={review.decides}
            walk={walk}
            heading={heading}
            keys={keys}
          />
          <div className="mt-8 grid gap-x-10 gap-y-8 lg:grid-cols-2">
            <SheetSection title="What reviewers say" className="">
              <div className="space-y-5">
                <VoteList votes={item.idea.votes} />
                {item.idea.canVote ? (
                  <VoteForm
                    own={walk.own}
                    comment={walk.comment}
                    onComment={walk.setComment}
                    onVote={(vote) => void walk.vote(vote)}
                    pending={pending !== null}
                    keys={keys}
                    commentRef={commentField}
                  />
                ) : null}
              </div>
            </SheetSection>
            <SheetSection
              title="Talk"
              className=""
              aside={
                item.remarkCount > item.remarks.length ? (
                  <TextLink href={namesHref(place, `/ideas/${item.idea.id}`)}>
                    All {item.remarkCount} remarks
                  </TextLink>
                ) : null
              }
            >
              <div className="space-y-5">
                <TalkList remarks={item.remarks} />
                <RemarkForm
                  place={place}
                  ideaId={item.idea.id}
                  text={remarks[item.idea.id] ?? ''}
                  onText={(text) => setRemarks((kept) => ({ ...kept, [item.idea.id]: text }))}
                  add={actions.addRemark}
                  onAdded={() => walk.say('Your remark is added.')}
                  fieldRef={remarkField}
                />
              </div>
            </SheetSection>
          </div>
        </div>
      ) : (
        <ReviewEnd
          place={place}
          review={review}
          sitting={walk.sitting}
          heading={heading}
          onShow={(id) => walk.show(id)}
        />
      )}
    </section>
  )
}
