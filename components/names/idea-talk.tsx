'use client'

import { useState } from 'react'

import { SheetSection } from '@/components/layout/sheet-header'
import { reach } from '@/components/reach'
import { LiveRegion } from '@/components/ui/live-region'
import { Notice } from '@/components/ui/notice'
import { VOTE_WORDS, type NameVoteKind } from '@/lib/names/constants'
import type { IdeaView, RemarkView } from '@/lib/names/present'

import type { TalkActions } from './idea-actions'
import type { NamesPlace } from './names-place'
import { RemarkForm, TalkList } from './talk'
import { VoteForm, VoteList } from './votes'

/** What reviewers say of an idea in its round, and the talk about it. */
export function IdeaTalk({
  place,
  idea,
  remarks,
  actions,
}: {
  place: NamesPlace
  idea: IdeaView
  remarks: readonly RemarkView[]
  actions: TalkActions
}) {
  const own = idea.votes.find(({ mine }) => mine)
  const [comment, setComment] = useState(own?.comment ?? '')
  const [remark, setRemark] = useState('')
  const [pending, setPending] = useState(false)
  const [problem, setProblem] = useState<string | null>(null)
  const [said, setSaid] = useState('')

  async function vote(kind: NameVoteKind | null) {
    setPending(true)
    setProblem(null)
    const { brand, lineSlug } = place
    const { id: ideaId, round } = idea
    const answer = await reach(
      actions.vote(brand, { lineSlug, ideaId, round, vote: kind, comment: kind ? comment : '' }),
    )
    setPending(false)
    if (answer.ok) setSaid(kind ? `You said: ${VOTE_WORDS[kind]}.` : 'You took back what you said.')
    else setProblem(answer.fieldErrors?.comment?.[0] ?? answer.message)
  }

  return (
    <>
      <LiveRegion>{said}</LiveRegion>
      {idea.round > 0 ? (
        <SheetSection title="What reviewers say">
          <div className="space-y-5">
            <VoteList votes={idea.votes} />
            {problem ? <Notice kind="error">{problem}</Notice> : null}
            {idea.canVote ? (
              <VoteForm
                own={own}
                comment={comment}
                onComment={setComment}
                onVote={(kind) => void vote(kind)}
                pending={pending}
              />
            ) : null}
          </div>
        </SheetSection>
      ) : null}
      <SheetSection title="Talk">
        <div className="space-y-5">
          <TalkList remarks={remarks} />
          <RemarkForm
            place={place}
            ideaId={idea.id}
            text={remark}
            onText={setRemark}
            add={actions.addRemark}
            onAdded={() => setSaid('Your remark is added.')}
          />
        </div>
      </SheetSection>
    </>
  )
}
