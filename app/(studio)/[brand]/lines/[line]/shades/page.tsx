import { Download } from 'lucide-react'
import type { Metadata } from 'next'

import { Note } from '@/components/layout/note'
import { ScreenCaution } from '@/components/layout/screen-caution'
import { Sheet } from '@/components/layout/sheet'
import { SheetHeader } from '@/components/layout/sheet-header'
import { AddShades } from '@/components/shades/add-shades'
import { BookOrderChoice, bookHref } from '@/components/shades/book-order'
import { SampleBook } from '@/components/shades/sample-book'
import { ShadeTable } from '@/components/shades/shade-table'
import { shadesHref } from '@/components/shades/shades-actions'
import { ShadesTabs } from '@/components/shades/shades-tabs'
import { tableHref } from '@/components/shades/table-address'
import { buttonClass } from '@/components/ui/button-class'
import { LinkButton } from '@/components/ui/link-button'
import { Pagination } from '@/components/ui/pagination'
import { EmptyState, NotFoundState } from '@/components/ui/states'
import { GroundSwitch } from '@/components/yarn/ground-switch'
import { canReadNames } from '@/lib/names/policy'
import { readForPage } from '@/lib/server/page'
import { pagesOf } from '@/lib/server/paging'
import { canEditShades } from '@/lib/shades/policy'
import { listShadeTable, readSampleBook } from '@/lib/shades/queries'
import { SHADE_LIMITS } from '@/lib/shades/constants'
import { sampleBookSchema, shadeTableSchema } from '@/lib/shades/schema'

import {
  deleteShadesAction,
  reorderShadesAction,
  restoreShadesAction,
  setShadeStatusAction,
  updateShadeAction,
} from './actions'

export const metadata: Metadata = { title: 'Shades' }

type Props = PageProps<'/[brand]/lines/[line]/shades'>

export default async function ShadesPage({ params, searchParams }: Props) {
  const { brand, line: lineSlug } = await params
  const address = await searchParams
  const place = { brand, lineSlug }
  const view = address.view === 'table' ? 'table' : 'book'
  const filter = shadeTableSchema.parse(address)
  const { order, page } = sampleBookSchema.parse(address)
  const isNarrowed = filter.q !== '' || filter.status.length > 0 || filter.outside

  const { edits, seesIdeas, line, book, table } = await readForPage(brand, async (actor) => {
    const sees = { edits: canEditShades(actor), seesIdeas: canReadNames(actor) }
    if (view === 'table') {
      const table = await listShadeTable(actor, lineSlug, filter)
      return { ...sees, line: table.line.name, table, book: null }
    }
    const book = await readSampleBook(actor, lineSlug, { order, page })
    return { ...sees, line: book.line.name, book, table: null }
  })
  const total = (book ?? table)!.total
  const isEmpty = total === 0 && (book !== null || !isNarrowed)

  const actions = {
    update: updateShadeAction,
    setStatus: setShadeStatusAction,
    reorder: reorderShadesAction,
    remove: deleteShadesAction,
    restore: restoreShadesAction,
  }
  const pages = pagesOf({
    page: table ? filter.page : page,
    perPage: table ? SHADE_LIMITS.tablePage : SHADE_LIMITS.bookPage,
    total,
    noun: 'shades',
    hrefOf: (next) =>
      table ? tableHref(place, { ...filter, page: next }) : bookHref(place, order, next),
  })

  if (isEmpty) {
    return (
      <Sheet>
        <SheetHeader title="Shades" />
        <EmptyState
          title="No shades yet"
          action={edits ? <AddShades place={place} first="import" /> : null}
        >
          {edits
            ? `The shades of ${line} will stand here as a sample book. Bring the whole line from a CSV file, or add the first one by hand.`
            : `The shades of ${line} will stand here once its owner or designer has added them.`}
        </EmptyState>
      </Sheet>
    )
  }

  return (
    <Sheet
      notes={
        <>
          <Note title="Before you judge">
            <ScreenCaution />
          </Note>
          <Note title="Take the shades away">
            <p>A CSV file of all shades of the line, which imports again unchanged.</p>
            <p>
              <a
                className={buttonClass()}
                href={`/api/brands/${brand}/lines/${lineSlug}/shades.csv`}
                download
              >
                <Download aria-hidden="true" />
                Export shades
              </a>
            </p>
          </Note>
        </>
      }
    >
      <SheetHeader
        title="Shades"
        meta={
          <span className="hidden print:inline">
            {book ? `${line}, sample book by ${order}` : line}
          </span>
        }
        actions={edits && <AddShades place={place} first="new" />}
      />
      <div className="mb-4 flex flex-wrap items-end justify-between gap-x-6 gap-y-2 print:hidden">
        <ShadesTabs place={place} current={view} />
        {book ? (
          <div className="flex flex-wrap items-center gap-x-6 gap-y-2">
            <BookOrderChoice place={place} order={order} />
            <GroundSwitch />
          </div>
        ) : null}
      </div>
      {book ? <SampleBook place={place} groups={book.groups} /> : null}
      {table ? (
        <ShadeTable
          place={place}
          shades={table.shades}
          total={total}
          filter={filter}
          edits={edits}
          seesIdeas={seesIdeas}
          actions={actions}
        />
      ) : null}
      {table && total === 0 ? (
        <NotFoundState
          title="No shade fits"
          action={<LinkButton href={shadesHref(place, '?view=table')}>Show all shades</LinkButton>}
        >
          Nothing in this line is all of what you asked for.
        </NotFoundState>
      ) : null}
      {total > 0 && (table ?? book) ? <Pagination label="Pages of shades" {...pages} /> : null}
    </Sheet>
  )
}
