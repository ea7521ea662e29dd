import { ListPlus } from 'lucide-react'
import type { Metadata } from 'next'

import { Note } from '@/components/layout/note'
import { Sheet } from '@/components/layout/sheet'
import { SheetHeader } from '@/components/layout/sheet-header'
import { HeapAdd } from '@/components/names/heap-add'
import { heapHref } from '@/components/names/heap-address'
import { HeapFilter } from '@/components/names/heap-filter'
import { HeapList } from '@/components/names/heap-list'
import { namesHref } from '@/components/names/names-place'
import { NamesTabs } from '@/components/names/names-tabs'
import { buttonClass } from '@/components/ui/button-class'
import { LinkButton } from '@/components/ui/link-button'
import { Pagination } from '@/components/ui/pagination'
import { EmptyState, NotFoundState } from '@/components/ui/states'
import { NAME_LIMITS } from '@/lib/names/constants'
import { listHeap } from '@/lib/names/list-heap'
import { heapAddressSchema } from '@/lib/names/schema'
import { pagesOf } from '@/lib/server/paging'
import { readForPage } from '@/lib/server/page'

import {
  addIdeaAction,
  deleteIdeasAction,
  editIdeaAction,
  placeIdeasAction,
  putByIdeasAction,
  restoreIdeasAction,
  takeUpIdeasAction,
} from '../actions'
import { listNameableAction } from './actions'

export const metadata: Metadata = { title: 'The heap of names' }

type Props = PageProps<'/[brand]/lines/[line]/names/heap'>

export default async function HeapPage({ params, searchParams }: Props) {
  const { brand, line: lineSlug } = await params
  const filter = heapAddressSchema.parse(await searchParams)
  const place = { brand, lineSlug }
  const { ideas, total, counts } = await readForPage(brand, (actor) =>
    listHeap(actor, lineSlug, filter),
  )
  const pages = pagesOf({
    page: filter.page,
    perPage: NAME_LIMITS.heapPage,
    total,
    noun: 'ideas',
    hrefOf: (page) => heapHref(place, { ...filter, page }),
  })
  return (
    <Sheet notes={<HeapNotes />}>
      <SheetHeader
        title="Heap"
        meta={`${counts.loose === 1 ? '1 idea' : `${counts.loose} ideas`} on no shade yet`}
        actions={
          <>
            <LinkButton href={namesHref(place, '/heap/add')} icon={<ListPlus aria-hidden="true" />}>
              Add many names
            </LinkButton>
            {counts.loose > 0 ? (
              <LinkButton variant="primary" href={namesHref(place, '/heap/deal')}>
                Deal the heap
              </LinkButton>
            ) : null}
          </>
        }
      />
      <div className="mb-6 print:hidden">
        <NamesTabs place={place} current="heap" />
      </div>
      <HeapAdd place={place} actions={{ add: addIdeaAction }} />
      <div className="mt-8 mb-4">
        <HeapFilter place={place} filter={filter} counts={counts} />
      </div>
      {ideas.length > 0 ? (
        <HeapList
          // Another page or filter begins with nothing chosen.
          key={heapHref(place, filter)}
          place={place}
          ideas={ideas}
          putBy={filter.put}
          actions={{
            edit: editIdeaAction,
            place: placeIdeasAction,
            putBy: putByIdeasAction,
            takeUp: takeUpIdeasAction,
            remove: deleteIdeasAction,
            restore: restoreIdeasAction,
            nameable: listNameableAction,
          }}
        />
      ) : total > 0 || filter.q !== '' ? (
        <NotFoundState
          title="No idea fits"
          action={
            // Loaded anew, so that the search forgets what is typed in it.
            <a className={buttonClass()} href={heapHref(place, { ...filter, q: '', page: 1 })}>
              Show all ideas
            </a>
          }
        >
          Nothing here is what you asked for.
        </NotFoundState>
      ) : filter.put ? (
        <EmptyState title="Nothing was put by">
          Names that are good, but not for now, are kept here until somebody takes them up again.
        </EmptyState>
      ) : (
        <EmptyState
          title="The heap is empty"
          action={<LinkButton href={namesHref(place, '/heap/add')}>Add many names</LinkButton>}
        >
          Ideas for names that belong to no shade yet lie here. Write one above, or bring a whole
          list; then deal them out to the shades they suit.
        </EmptyState>
      )}
      <Pagination label="Pages of ideas" {...pages} />
    </Sheet>
  )
}

function HeapNotes() {
  return (
    <>
      <Note title="What happens here">
        <p>
          An idea needs a shade before it can be sent for review. Lay it on one by hand, or deal the
          whole heap: each idea goes where its words call the colour to mind.
        </p>
      </Note>
      <Note title="What is put by">
        <p>
          Good, but not for now. It stands in nobody’s way, is not checked against, and can be taken
          up again.
        </p>
      </Note>
    </>
  )
}
