import type { Metadata } from 'next'

import { KitForm } from '@/components/kits/kit-form'
import { KitList } from '@/components/kits/kit-list'
import { Note } from '@/components/layout/note'
import { Sheet } from '@/components/layout/sheet'
import { SheetHeader } from '@/components/layout/sheet-header'
import { LinkButton } from '@/components/ui/link-button'
import { Pagination } from '@/components/ui/pagination'
import { EmptyState } from '@/components/ui/states'
import { KIT_LIMITS } from '@/lib/kits/constants'
import { presentCandidate, presentKit } from '@/lib/kits/present'
import { listCandidates, listKits } from '@/lib/kits/queries'
import { kitsAddressSchema } from '@/lib/kits/schema'
import { pagesOf } from '@/lib/server/paging'
import { readForPage } from '@/lib/server/page'

import { deleteKitAction, requestKitAction } from './actions'

export const metadata: Metadata = { title: 'Kits' }

export default async function KitsPage({
  params,
  searchParams,
}: PageProps<'/[brand]/lines/[line]/kits'>) {
  const { brand, line: lineSlug } = await params
  const { combinations: asked, page } = kitsAddressSchema.parse(await searchParams)
  const { candidates, kits, total } = await readForPage(brand, async (actor) => {
    const [combinations, listed] = await Promise.all([
      listCandidates(actor, lineSlug),
      listKits(actor, lineSlug, page),
    ])
    return {
      candidates: combinations.map(presentCandidate),
      kits: listed.kits.map((kit) => presentKit(actor, kit)),
      total: listed.total,
    }
  })
  const here = `/${brand}/lines/${lineSlug}/kits`
  const wanted = asked ? new Set(asked) : null
  const ticked = candidates
    .filter(({ id, lane, reasons }) =>
      wanted ? wanted.has(id) : lane === 'chosen' && reasons.length === 0,
    )
    .slice(0, KIT_LIMITS.combinations)
    .map(({ id }) => id)
  const pages = pagesOf({
    page,
    perPage: KIT_LIMITS.perPage,
    total,
    noun: 'kits',
    hrefOf: (other) => `${here}?page=${other}`,
  })
  return (
    <Sheet notes={<KitNotes />}>
      <SheetHeader title="Kits" meta={total === 1 ? '1 kit' : `${total} kits`} />
      {candidates.length === 0 ? (
        <EmptyState
          title="No combination to build a kit of"
          action={
            <LinkButton variant="primary" href={`/${brand}/lines/${lineSlug}/combinations`}>
              Open the combinations
            </LinkButton>
          }
        >
          <p>
            A kit is what a designer hands to a blog: pictures and texts of combinations, in one
            file. Keep a combination first.
          </p>
        </EmptyState>
      ) : (
        <section aria-labelledby="build">
          <h2 id="build" className="mb-3 text-xl">
            Build a kit
          </h2>
          <KitForm
            key={ticked.join()}
            brand={brand}
            lineSlug={lineSlug}
            kits={here}
            candidates={candidates}
            ticked={ticked}
            request={requestKitAction}
          />
        </section>
      )}
      {total > 0 ? (
        <section aria-labelledby="built" className="mt-12">
          <h2 id="built" className="mb-3 text-xl">
            Built so far
          </h2>
          <KitList brand={brand} here={here} kits={kits} remove={deleteKitAction} />
          <Pagination label="Pages of kits" {...pages} />
        </section>
      ) : null}
    </Sheet>
  )
}

function KitNotes() {
  return (
    <>
      <Note title="What is in it">
        <p>
          Of each combination three pictures, a drawing (SVG), alt text and a caption. Over all: a
          piece of HTML for a post, CSS, design tokens, a table (CSV), a sheet to print (PDF), and
          the credits.
        </p>
      </Note>
      <Note title="What stays out">
        <p>
          A combination with an empty place or a deleted shade, and one whose photograph has no
          licence, credit or alt text. A shade without an approved name goes by its number.
        </p>
      </Note>
      <Note title="How long it is kept">
        <p>
          {KIT_LIMITS.keptDays} days. After that the file is removed, and the same kit can be built
          again.
        </p>
      </Note>
    </>
  )
}
