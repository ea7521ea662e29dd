import type { Metadata } from 'next'

import { Sheet } from '@/components/layout/sheet'
import { SheetHeader } from '@/components/layout/sheet-header'
import { Gallery } from '@/components/photographs/gallery'
import { GalleryFilter } from '@/components/photographs/gallery-filter'
import { UploadPhotographs } from '@/components/photographs/upload-photographs'
import { LinkButton } from '@/components/ui/link-button'
import { Pagination } from '@/components/ui/pagination'
import { EmptyState, NotFoundState } from '@/components/ui/states'
import { getLine } from '@/lib/lines/queries'
import { canUploadPhotographs } from '@/lib/photographs/policy'
import { presentPhotograph } from '@/lib/photographs/present'
import { countPhotographs, listPhotographs } from '@/lib/photographs/queries'
import { PHOTOGRAPH_LIMITS } from '@/lib/photographs/constants'
import { galleryFilterSchema } from '@/lib/photographs/schema'
import { pagesOf } from '@/lib/server/paging'
import { readForPage } from '@/lib/server/page'

import { deletePhotographsAction, restorePhotographsAction } from './actions'

export const metadata: Metadata = { title: 'Photographs' }

export default async function PhotographsPage({
  params,
  searchParams,
}: PageProps<'/[brand]/lines/[line]/photographs'>) {
  const { brand, line: lineSlug } = await params
  const filter = galleryFilterSchema.parse(await searchParams)
  const { photographs, total, counts, uploads } = await readForPage(brand, async (actor) => {
    const line = await getLine(actor, lineSlug)
    const [found, counted] = await Promise.all([
      listPhotographs(actor, line, filter),
      countPhotographs(actor, line),
    ])
    return {
      photographs: found.photographs.map((one) => presentPhotograph(actor, line, one)),
      total: found.total,
      counts: counted,
      uploads: canUploadPhotographs(actor),
    }
  })
  const here = `/${brand}/lines/${lineSlug}/photographs`
  const asked = {
    ...(filter.q && { q: filter.q }),
    ...(filter.state && { state: filter.state }),
    ...(filter.missing && { missing: filter.missing }),
  }
  const facts = [
    counts.all === 1 ? '1 photograph' : `${counts.all} photographs`,
    counts.reading > 0 && `${counts.reading} being read`,
    counts.failed > 0 && `${counts.failed} could not be read`,
    counts.withoutLicence > 0 && `${counts.withoutLicence} without licence`,
    counts.withoutAltText > 0 && `${counts.withoutAltText} without alt text`,
  ].filter(Boolean)
  const sheet =
    counts.all === 0 ? (
      <EmptyState title="No photograph yet">
        <p>
          Each photograph that the line grew from stands here with the five shades that are it.
          {uploads ? ' Add the first one above.' : ' An owner or a designer adds the first one.'}
        </p>
      </EmptyState>
    ) : (
      <>
        <GalleryFilter filter={filter} here={here} />
        {photographs.length === 0 ? (
          <NotFoundState
            title="No photograph fits that"
            action={<LinkButton href={here}>Show all photographs</LinkButton>}
          />
        ) : (
          <Gallery
            brand={brand}
            lineSlug={lineSlug}
            photographs={photographs}
            remove={deletePhotographsAction}
            restore={restorePhotographsAction}
          />
        )}
        <Pagination
          label="Pages of photographs"
          {...pagesOf({
            page: filter.page,
            perPage: PHOTOGRAPH_LIMITS.perPage,
            total,
            noun: 'photographs',
            hrefOf: (page) => `${here}?${new URLSearchParams({ ...asked, page: String(page) })}`,
          })}
        />
      </>
    )
  return (
    <Sheet>
      <SheetHeader title="Photographs" meta={counts.all > 0 ? facts.join(' · ') : undefined} />
      {uploads ? (
        <UploadPhotographs brand={brand} lineSlug={lineSlug}>
          {sheet}
        </UploadPhotographs>
      ) : (
        sheet
      )}
    </Sheet>
  )
}
