import type { Metadata } from 'next'

import { Note } from '@/components/layout/note'
import { ScreenCaution } from '@/components/layout/screen-caution'
import { Sheet } from '@/components/layout/sheet'
import { SheetHeader } from '@/components/layout/sheet-header'
import { DealHeap } from '@/components/names/deal-heap'
import { namesHref } from '@/components/names/names-place'
import { authorize } from '@/lib/auth/actor'
import { getLine } from '@/lib/lines/queries'
import { canDraftNames } from '@/lib/names/policy'
import { readForPage } from '@/lib/server/page'

import { placeIdeasAction } from '../../actions'
import { dealIdeasAction } from '../actions'

export const metadata: Metadata = { title: 'Deal the heap' }

export default async function DealPage({
  params,
}: PageProps<'/[brand]/lines/[line]/names/heap/deal'>) {
  const { brand, line: lineSlug } = await params
  await readForPage(brand, async (actor) => {
    authorize(actor, canDraftNames)
    return getLine(actor, lineSlug)
  })
  const place = { brand, lineSlug }
  return (
    <Sheet
      notes={
        <>
          <Note title="How it is dealt">
            <p>
              Every idea is held to every shade without a name: how near the colour is that its
              words call to mind, and whether it would stand beside a name like it. Of all ways to
              deal, the one that suits best in all is shown; families that wait most go a little
              before.
            </p>
          </Note>
          <Note title="Leave one, and deal anew">
            <p>
              What you leave stays in the heap, and the next deal finds another for its shade.
              Shades with a name in review are not dealt to.
            </p>
          </Note>
          <Note title="Before you judge">
            <ScreenCaution />
          </Note>
        </>
      }
    >
      <SheetHeader
        title="Deal the heap"
        back={{ href: namesHref(place, '/heap'), label: 'Heap' }}
      />
      <DealHeap place={place} actions={{ deal: dealIdeasAction, place: placeIdeasAction }} />
    </Sheet>
  )
}
