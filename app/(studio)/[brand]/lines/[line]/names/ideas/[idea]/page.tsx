import type { Metadata } from 'next'
import { cache } from 'react'

import { dayInWords } from '@/components/date-words'
import { Note } from '@/components/layout/note'
import { ScreenCaution } from '@/components/layout/screen-caution'
import { Sheet } from '@/components/layout/sheet'
import { SheetHeader, SheetSection } from '@/components/layout/sheet-header'
import { Findings } from '@/components/names/findings'
import { inShort } from '@/components/names/finding-words'
import { IdeaHistory } from '@/components/names/idea-history'
import { IdeaMoves } from '@/components/names/idea-moves'
import { IdeaState } from '@/components/names/idea-state'
import { IdeaTalk } from '@/components/names/idea-talk'
import { DeleteIdea, IdeaWords } from '@/components/names/idea-words'
import { namesHref } from '@/components/names/names-place'
import { nameOf } from '@/components/names/said-when'
import { Searches } from '@/components/names/searches'
import { TextLink } from '@/components/ui/text-link'
import { Ground } from '@/components/yarn/ground'
import { GroundSwitch } from '@/components/yarn/ground-switch'
import { WoundSample } from '@/components/yarn/wound-sample'
import { getIdea } from '@/lib/names/get-idea'
import { readForPage } from '@/lib/server/page'

import {
  approveNameAction,
  deleteIdeasAction,
  editIdeaAction,
  putByIdeasAction,
  recallIdeasAction,
  reopenNameAction,
  restoreIdeasAction,
  returnNameAction,
  sendForReviewAction,
  takeUpIdeasAction,
  unlockNameAction,
} from '../../actions'
import {
  addRemarkAction,
  recordSearchAction,
  removeSearchAction,
  voteAction,
} from '../../review/actions'

type Props = PageProps<'/[brand]/lines/[line]/names/ideas/[idea]'>

const MOVES = {
  send: sendForReviewAction,
  recall: recallIdeasAction,
  'put-by': putByIdeasAction,
  'take-up': takeUpIdeasAction,
  approve: approveNameAction,
  return: returnNameAction,
  reopen: reopenNameAction,
  unlock: unlockNameAction,
}

const read = cache((brand: string, lineSlug: string, ideaId: string) =>
  readForPage(brand, (actor) => getIdea(actor, lineSlug, ideaId)),
)

/** The idea names its page. */
export async function generateMetadata({ params }: Props): Promise<Metadata> {
  const { brand, line, idea } = await params
  return { title: (await read(brand, line, idea)).idea.text }
}

export default async function IdeaPage({ params }: Props) {
  const { brand, line: lineSlug, idea: ideaId } = await params
  const place = { brand, lineSlug }
  const detail = await read(brand, lineSlug, ideaId)
  const { idea, shade, held, findings } = detail
  return (
    <Sheet
      notes={
        <>
          <Note title="Its shade">
            {shade ? (
              <>
                <Ground className="border border-hairline p-2">
                  <WoundSample
                    hex={shade.hex}
                    size="large"
                    label={`No. ${shade.number}, wound on card`}
                    className="h-auto max-w-full"
                  />
                </Ground>
                <GroundSwitch />
                <p>
                  <TextLink href={namesHref(place, `/shades/${shade.id}`)}>
                    All ideas for No. {shade.number}
                  </TextLink>
                </p>
                {held ? (
                  <p>
                    It is called “{held.text}” now{held.locked ? ', which is locked' : ''}.
                  </p>
                ) : null}
              </>
            ) : idea.shadeId === null ? (
              <p>
                None yet: it lies in <TextLink href={namesHref(place, '/heap')}>the heap</TextLink>.
                Give it to a shade there, then it can be sent for review.
              </p>
            ) : (
              <p>Its shade was deleted.</p>
            )}
          </Note>
          <Note title="Before you judge">
            <ScreenCaution />
          </Note>
        </>
      }
    >
      <SheetHeader
        title={idea.text}
        meta={
          <div className="flex flex-wrap items-center gap-x-4 gap-y-1">
            <IdeaState state={idea.state} locked={idea.locked} />
            <span>
              {shade ? `for No. ${shade.number} · ` : ''}by {nameOf(idea.author)}
              {idea.wordedBy && idea.wordedBy.id !== idea.author?.id
                ? `, worded by ${nameOf(idea.wordedBy)}`
                : ''}
              {' · '}since {dayInWords(idea.stateSince)}
            </span>
          </div>
        }
        back={{ href: namesHref(place, shade ? '' : '/heap'), label: shade ? 'Names' : 'The heap' }}
      />
      <IdeaMoves place={place} idea={idea} actions={MOVES} />
      <SheetSection title="What it says" className="mt-8">
        {idea.canEdit ? (
          <IdeaWords
            place={place}
            idea={idea}
            needsReason={detail.needsReason}
            edit={editIdeaAction}
          />
        ) : (
          <div className="max-w-measure space-y-2">
            <p className="break-words whitespace-pre-line">
              {idea.note || 'No thought is written down with it.'}
            </p>
            {idea.wordingReason ? (
              <p className="break-words">
                <span className="font-semibold">Why the wording stands:</span> {idea.wordingReason}
              </p>
            ) : null}
            {idea.state === 'in-review' ? (
              <p className="text-ink-faint">
                Its words are locked while it is in review: take it back to change them.
              </p>
            ) : null}
          </div>
        )}
      </SheetSection>
      <SheetSection
        title="The checks"
        aside={`${inShort(findings)}${detail.findingsKept ? ', when it was sent' : ', as it stands now'}`}
      >
        <Findings findings={findings} />
      </SheetSection>
      <IdeaTalk
        place={place}
        idea={idea}
        remarks={detail.remarks}
        actions={{ vote: voteAction, addRemark: addRemarkAction }}
      />
      <SheetSection title="Marks">
        <Searches
          place={place}
          ideaId={idea.id}
          searches={detail.searches}
          actions={{ record: recordSearchAction, remove: removeSearchAction }}
        />
      </SheetSection>
      <SheetSection title="History">
        <IdeaHistory moves={detail.moves} />
      </SheetSection>
      {idea.canDelete ? (
        <div className="mt-10 border-t border-hairline pt-6 print:hidden">
          <DeleteIdea
            place={place}
            idea={idea}
            remove={deleteIdeasAction}
            restore={restoreIdeasAction}
          />
        </div>
      ) : null}
    </Sheet>
  )
}
