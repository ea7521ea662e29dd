import type { Metadata } from 'next'

import { Note } from '@/components/layout/note'
import { Sheet } from '@/components/layout/sheet'
import { SheetHeader } from '@/components/layout/sheet-header'
import { HeapImport } from '@/components/names/heap-import'
import { namesHref } from '@/components/names/names-place'
import { authorize } from '@/lib/auth/actor'
import { getLine } from '@/lib/lines/queries'
import { NAME_LIMITS } from '@/lib/names/constants'
import { canDraftNames } from '@/lib/names/policy'
import { readForPage } from '@/lib/server/page'

import { addIdeasAction, deleteIdeasAction } from '../../actions'
import { previewIdeasAction } from '../actions'

export const metadata: Metadata = { title: 'Add many names' }

export default async function AddNamesPage({
  params,
}: PageProps<'/[brand]/lines/[line]/names/heap/add'>) {
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
          <Note title="What the file holds">
            <p>
              One name a row under a header row, at most{' '}
              {NAME_LIMITS.atOnce.toLocaleString('en-GB')} rows. The columns are found by their
              heads: name; note, the thought behind it; shade, a shade’s number. Only the name must
              be there.
            </p>
            <p>A row without a shade goes to the heap.</p>
          </Note>
          <Note title="What is there already">
            <p>
              A name that the line has, in whatever state, is shown with where it is and left out
              unless you ask for it. Case, accents and punctuation make no difference.
            </p>
          </Note>
        </>
      }
    >
      <SheetHeader
        title="Add many names"
        back={{ href: namesHref(place, '/heap'), label: 'Heap' }}
      />
      <HeapImport
        place={place}
        actions={{
          preview: previewIdeasAction,
          addMany: addIdeasAction,
          remove: deleteIdeasAction,
        }}
      />
    </Sheet>
  )
}
