import type { Metadata } from 'next'

import { Note } from '@/components/layout/note'
import { ScreenCaution } from '@/components/layout/screen-caution'
import { Sheet } from '@/components/layout/sheet'
import { SheetHeader } from '@/components/layout/sheet-header'
import { NamesTabs } from '@/components/names/names-tabs'
import { Review } from '@/components/names/review'
import { ReviewKeysNote } from '@/components/names/review-keys-note'
import { MARKS_CAUTION } from '@/lib/names/constants'
import { readReview } from '@/lib/names/read-review'
import { reviewAddressSchema } from '@/lib/names/schema'
import { readForPage } from '@/lib/server/page'

import {
  approveNameAction,
  putByIdeasAction,
  recallIdeasAction,
  reopenNameAction,
  returnNameAction,
  sendForReviewAction,
  takeUpIdeasAction,
  unlockNameAction,
} from '../actions'
import { addRemarkAction, voteAction } from './actions'

export const metadata: Metadata = { title: 'Names in review' }

const ACTIONS = {
  send: sendForReviewAction,
  recall: recallIdeasAction,
  'put-by': putByIdeasAction,
  'take-up': takeUpIdeasAction,
  approve: approveNameAction,
  return: returnNameAction,
  reopen: reopenNameAction,
  unlock: unlockNameAction,
  vote: voteAction,
  addRemark: addRemarkAction,
}

export default async function ReviewNamesPage({
  params,
  searchParams,
}: PageProps<'/[brand]/lines/[line]/names/review'>) {
  const { brand, line: lineSlug } = await params
  const { idea } = reviewAddressSchema.parse(await searchParams)
  const place = { brand, lineSlug }
  const review = await readForPage(brand, (actor) => readReview(actor, lineSlug, idea))
  return (
    <Sheet
      notes={
        <>
          <ReviewKeysNote decides={review.decides} />
          <Note title="Marks">
            <p>{MARKS_CAUTION}</p>
          </Note>
          <Note title="Before you judge">
            <ScreenCaution />
          </Note>
        </>
      }
    >
      <SheetHeader title="Names in review" />
      <NamesTabs place={place} current="review" />
      <div className="mt-6">
        <Review place={place} review={review} firstId={idea} actions={ACTIONS} />
      </div>
    </Sheet>
  )
}
