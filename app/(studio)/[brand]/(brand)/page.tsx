import type { Metadata } from 'next'

import { Sheet } from '@/components/layout/sheet'
import { SheetHeader } from '@/components/layout/sheet-header'
import { AppLink } from '@/components/ui/app-link'
import { LedgerList } from '@/components/ui/ledger'
import { LinkButton } from '@/components/ui/link-button'
import { Pagination } from '@/components/ui/pagination'
import { EmptyState } from '@/components/ui/states'
import { canCreateLine } from '@/lib/lines/policy'
import { presentLine } from '@/lib/lines/present'
import { listLines } from '@/lib/lines/queries'
import { pageNumber, pagesOf } from '@/lib/server/paging'
import { readForPage } from '@/lib/server/page'

const PER_PAGE = 24

export const metadata: Metadata = { title: 'Lines' }

export default async function BrandPage({ params, searchParams }: PageProps<'/[brand]'>) {
  const { brand } = await params
  const page = pageNumber((await searchParams).page)
  const { actor, lines, total } = await readForPage(brand, async (one) => {
    const found = await listLines(one, { page, perPage: PER_PAGE })
    return {
      actor: one,
      total: found.total,
      lines: found.lines.map(({ line, shadeCount }) => ({ ...presentLine(line), shadeCount })),
    }
  })
  const creates = canCreateLine(actor)
  const newLine = (
    <LinkButton href={`/${brand}/lines/new`} variant="primary">
      Make a line
    </LinkButton>
  )
  return (
    <Sheet>
      <SheetHeader title="Lines" meta={actor.brandName} actions={creates && total > 0 && newLine} />
      {lines.length === 0 ? (
        <EmptyState title="No line yet" action={creates && newLine}>
          <p>
            A line is one base yarn, dyed in many shades. Its shades, photographs and combinations
            will stand here.
          </p>
          {creates ? null : <p>An owner of {actor.brandName} makes the first one.</p>}
        </EmptyState>
      ) : (
        <LedgerList>
          {lines.map((line) => (
            <li key={line.id} className="py-4">
              <AppLink
                href={`/${brand}/lines/${line.slug}/shades`}
                className="font-title text-xl hover:underline"
              >
                {line.name}
              </AppLink>
              <p className="mt-1 text-ink-soft">
                {line.fibreContent} · {line.yarn} · {line.length} to {line.weight}
              </p>
              <p className="text-sm text-ink-faint">
                {line.shadeCount === 1 ? '1 shade' : `${line.shadeCount} shades`}
                {line.launchDate ? ` · launches ${line.launchDate}` : ''}
              </p>
            </li>
          ))}
        </LedgerList>
      )}
      <Pagination
        label="Pages of lines"
        {...pagesOf({
          page,
          perPage: PER_PAGE,
          total,
          noun: 'lines',
          hrefOf: (to) => `/${brand}?page=${to}`,
        })}
      />
    </Sheet>
  )
}
