'use client'

import { CircleHelp, ThumbsDown, ThumbsUp, type LucideIcon } from 'lucide-react'
import type { Ref } from 'react'

import { Button } from '@/components/ui/button'
import { cn } from '@/components/ui/cn'
import { Field } from '@/components/ui/field'
import { Textarea } from '@/components/ui/textarea'
import { NAME_LIMITS, NAME_VOTES, VOTE_WORDS, type NameVoteKind } from '@/lib/names/constants'
import type { VoteView } from '@/lib/names/present'

import { KeyHint } from './key-hint'
import { VOTE_KEYS } from './review-keys'
import { nameOf } from './said-when'
import { sends } from './reason-form'

const ICONS: Record<NameVoteKind, LucideIcon> = {
  yes: ThumbsUp,
  unsure: CircleHelp,
  no: ThumbsDown,
}

/** What reviewers have said of a name in its round. */
export function VoteList({ votes }: { votes: readonly VoteView[] }) {
  if (votes.length === 0)
    return <p className="text-ink-faint">No reviewer has said anything yet.</p>
  return (
    <ul role="list" className="max-w-measure space-y-2">
      {votes.map(({ person, vote, comment, mine }, at) => {
        const Icon = ICONS[vote]
        return (
          <li key={person?.id ?? at} className="flex gap-2">
            <Icon aria-hidden="true" className="mt-0.5 size-4 shrink-0" strokeWidth={1.75} />
            <div className="min-w-0">
              <p>
                <span className="font-semibold">{VOTE_WORDS[vote]}</span>, {nameOf(person)}
                {mine ? ' (you)' : ''}
              </p>
              {comment ? (
                <p className="break-words whitespace-pre-line text-ink-soft">{comment}</p>
              ) : null}
            </div>
          </li>
        )
      })}
    </ul>
  )
}

/** The three words a reviewer may say, and room to say why. Their own word again takes it back. */
export function VoteForm({
  own,
  comment,
  onComment,
  onVote,
  pending,
  keys = false,
  commentRef,
}: {
  /** The reader's own vote; undefined while they have said nothing. */
  own: VoteView | undefined
  comment: string
  onComment: (comment: string) => void
  /** Null takes it back. */
  onVote: (vote: NameVoteKind | null) => void
  pending: boolean
  /** Its single keys work here: they are shown. */
  keys?: boolean
  commentRef?: Ref<HTMLTextAreaElement>
}) {
  const changed = own !== undefined && own.comment !== comment.trim()
  return (
    <div className="max-w-measure space-y-3">
      <fieldset>
        <legend className="mb-1 font-medium">What do you say?</legend>
        <div className="flex flex-wrap gap-2">
          {NAME_VOTES.map((vote) => {
            const Icon = ICONS[vote]
            const said = own?.vote === vote
            return (
              <Button
                key={vote}
                aria-pressed={said}
                aria-keyshortcuts={keys ? VOTE_KEYS[vote] : undefined}
                aria-disabled={pending || undefined}
                className={cn(said && 'border-2 border-woad font-semibold')}
                icon={<Icon aria-hidden="true" />}
                onClick={() => {
                  if (!pending) onVote(said ? null : vote)
                }}
              >
                {VOTE_WORDS[vote]}
                {keys ? <KeyHint of={VOTE_KEYS[vote]} /> : null}
              </Button>
            )
          })}
        </div>
      </fieldset>
      <Field label="Why" optional hint="It goes with what you say; say it first or after.">
        <Textarea
          ref={commentRef}
          rows={2}
          value={comment}
          maxLength={NAME_LIMITS.comment}
          onChange={(event) => onComment(event.target.value)}
          onKeyDown={(event) => {
            if (!sends(event) || !changed || pending) return
            event.preventDefault()
            onVote(own.vote)
          }}
        />
      </Field>
      {changed ? (
        <Button size="small" pending={pending} onClick={() => onVote(own.vote)}>
          Save comment
        </Button>
      ) : null}
    </div>
  )
}
