import type { Metadata } from 'next'

import { Note } from '@/components/layout/note'
import { Sheet } from '@/components/layout/sheet'
import { SheetHeader } from '@/components/layout/sheet-header'
import { listHref } from '@/components/names/list-address'
import { NamesInNumbersNote, PrintDateNote } from '@/components/names/list-notes'
import { NamesTable } from '@/components/names/list-table'
import { namesHref } from '@/components/names/names-place'
import { NamesTabs } from '@/components/names/names-tabs'
import { AddShades } from '@/components/shades/add-shades'
import { LinkButton } from '@/components/ui/link-button'
import { Notice } from '@/components/ui/notice'
import { Pagination } from '@/components/ui/pagination'
import { EmptyState, NotFoundState } from '@/components/ui/states'
import { MARKS_CAUTION, NAME_LIMITS } from '@/lib/names/constants'
import { listNames } from '@/lib/names/list-names'
import { nameListSchema } from '@/lib/names/schema'
import { readForPage } from '@/lib/server/page'
import { pagesOf } from '@/lib/server/paging'
import { canEditShades } from '@/lib/shades/policy'

import {
  addIdeaAction,
  editIdeaAction,
  putByIdeasAction,
  recallIdeasAction,
  sendForReviewAction,
  takeUpIdeasAction,
} from './actions'

export const metadata: Metadata = { title: 'Names' }

type Props = PageProps<'/[brand]/lines/[line]/names'>

export default async function NamesPage({ params, searchParams }: Props) {
  const { brand, line: lineSlug } = await params
  const place = { brand, lineSlug }
  const filter = nameListSchema.parse(await searchParams)
  const list = await readForPage(brand, async (actor) => ({
    ...(await listNames(actor, lineSlug, filter)),
    editsShades: canEditShades(actor),
  }))
  const { line, rows, total, numbers, families, frozen, printOn, unsifted } = list

  if (numbers.shades === 0) {
    return (
      <Sheet>
        <SheetHeader title="Names" />
        <NamesTabs place={place} current="list" />
        <EmptyState
          title="No shades to name yet"
          action={list.editsShades ? <AddShades place={place} first="import" /> : null}
        >
          {`The shades of ${line.name} will stand here with their names, from the first draft to the approved one. Ideas can lie in the heap until then.`}
        </EmptyState>
      </Sheet>
    )
  }

  const pages = pagesOf({
    page: filter.page,
    perPage: NAME_LIMITS.page,
    total,
    noun: 'shades',
    hrefOf: (page) => listHref(place, { ...filter, page }),
  })
  return (
    <Sheet
      notes={
        <>
          <NamesInNumbersNote place={place} numbers={numbers} />
          <PrintDateNote place={place} frozen={frozen} printOn={printOn} />
          <Note title="What the checks say">
            <p>
              Drafts are checked as they stand now. What has been sent shows what was found then.
            </p>
            <p>{MARKS_CAUTION}</p>
          </Note>
        </>
      }
    >
      <SheetHeader
        title="Names"
        meta={`${numbers.named} of ${numbers.shades} shades of ${line.name} named`}
        actions={
          <>
            <LinkButton href={namesHref(place, '/heap')}>Add ideas</LinkButton>
            <LinkButton variant="primary" href={namesHref(place, '/review')}>
              Review names
            </LinkButton>
          </>
        }
      />
      <div className="mb-4">
        <NamesTabs place={place} current="list" />
      </div>
      {unsifted > 0 ? (
        <Notice className="mb-4">
          {`The first ${NAME_LIMITS.sifted} drafts of the line were checked; ${unsifted} more count as not checked here. Narrow the list by state or family to reach them.`}
        </Notice>
      ) : null}
      <NamesTable
        place={place}
        rows={rows}
        total={total}
        filter={filter}
        families={families}
        actions={{
          add: addIdeaAction,
          edit: editIdeaAction,
          send: sendForReviewAction,
          recall: recallIdeasAction,
          putBy: putByIdeasAction,
          takeUp: takeUpIdeasAction,
        }}
      />
      {total === 0 ? (
        <NotFoundState
          title="No shade fits"
          action={<LinkButton href={namesHref(place)}>Show all names</LinkButton>}
        >
          Nothing in this line is all of what you asked for.
        </NotFoundState>
      ) : (
        <Pagination label="Pages of names" {...pages} />
      )}
    </Sheet>
  )
}
