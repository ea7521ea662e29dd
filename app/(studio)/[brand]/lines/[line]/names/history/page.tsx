import type { Metadata } from 'next'

import { Note } from '@/components/layout/note'
import { Sheet } from '@/components/layout/sheet'
import { SheetHeader } from '@/components/layout/sheet-header'
import { HistoryDays } from '@/components/names/history-days'
import { namesHref } from '@/components/names/names-place'
import { NamesTabs } from '@/components/names/names-tabs'
import { LinkButton } from '@/components/ui/link-button'
import { Pagination } from '@/components/ui/pagination'
import { EmptyState, NotFoundState } from '@/components/ui/states'
import { NAME_LIMITS } from '@/lib/names/constants'
import { listHistory } from '@/lib/names/list-history'
import { pageNumber, pagesOf } from '@/lib/server/paging'
import { readForPage } from '@/lib/server/page'

export const metadata: Metadata = { title: 'History of names' }

export default async function NameHistoryPage({
  params,
  searchParams,
}: PageProps<'/[brand]/lines/[line]/names/history'>) {
  const { brand, line: lineSlug } = await params
  const place = { brand, lineSlug }
  const page = pageNumber((await searchParams).page)
  const { line, days, total } = await readForPage(brand, (actor) =>
    listHistory(actor, lineSlug, page),
  )
  const here = namesHref(place, '/history')
  const pages = pagesOf({
    page,
    perPage: NAME_LIMITS.page,
    total,
    noun: 'entries',
    hrefOf: (other) => `${here}?page=${other}`,
  })
  return (
    <Sheet
      notes={
        <Note title="For good">
          <p>
            Every change of a name’s state stands here with who made it and when. Nobody can change
            or remove an entry. Days and times are UTC.
          </p>
        </Note>
      }
    >
      <SheetHeader
        title="History of names"
        meta={`What became of the names of ${line.name}, newest first`}
      />
      <div className="mb-6">
        <NamesTabs place={place} current="history" />
      </div>
      {days.length > 0 ? <HistoryDays place={place} days={days} /> : null}
      {days.length === 0 && total > 0 ? (
        <NotFoundState
          title="The history is not that long"
          action={<LinkButton href={here}>Show the newest entries</LinkButton>}
        />
      ) : null}
      {total === 0 ? (
        <EmptyState
          title="Nothing has happened yet"
          action={<LinkButton href={namesHref(place, '/heap')}>Open the heap</LinkButton>}
        >
          <p>
            From the first idea on, every step of every name will stand here: who wrote it down,
            sent it, approved or returned it, and why.
          </p>
        </EmptyState>
      ) : null}
      <Pagination
        label="Pages of the history"
        previousLabel="Newer entries"
        nextLabel="Older entries"
        {...pages}
      />
    </Sheet>
  )
}
