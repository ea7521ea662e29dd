import type { Metadata } from 'next'

import { bandsOf, keptInWords, namesInWords } from '@/components/combinations/words'
import { Sheet } from '@/components/layout/sheet'
import { SheetHeader } from '@/components/layout/sheet-header'
import { AppLink } from '@/components/ui/app-link'
import { Button } from '@/components/ui/button'
import { Field } from '@/components/ui/field'
import { Input } from '@/components/ui/input'
import { LinkButton } from '@/components/ui/link-button'
import { Pagination } from '@/components/ui/pagination'
import { EmptyState, NotFoundState } from '@/components/ui/states'
import { WrapCard } from '@/components/yarn/wrap-card'
import { presentCombination } from '@/lib/combinations/present'
import { listCombinations } from '@/lib/combinations/queries'
import { COMBINATION_LIMITS } from '@/lib/combinations/constants'
import { combinationFilterSchema } from '@/lib/combinations/schema'
import { pagesOf } from '@/lib/server/paging'
import { readForPage } from '@/lib/server/page'

export const metadata: Metadata = { title: 'Combinations' }

export default async function CombinationsPage({
  params,
  searchParams,
}: PageProps<'/[brand]/lines/[line]/combinations'>) {
  const { brand, line: lineSlug } = await params
  const filter = combinationFilterSchema.parse(await searchParams)
  const { combinations, total } = await readForPage(brand, async (actor) => {
    const found = await listCombinations(actor, lineSlug, filter)
    return {
      total: found.total,
      combinations: found.combinations.map((one) => presentCombination(actor, one)),
    }
  })
  const here = `/${brand}/lines/${lineSlug}/combinations`
  const hrefOf = (page: number) =>
    `${here}?${new URLSearchParams({ ...(filter.q && { q: filter.q }), page: String(page) })}`
  const pages = pagesOf({
    page: filter.page,
    perPage: COMBINATION_LIMITS.perPage,
    total,
    noun: 'combinations',
    hrefOf,
  })
  return (
    <Sheet>
      <SheetHeader title="Combinations" meta={total === 1 ? '1 kept' : `${total} kept`} />
      {total === 0 && !filter.q ? (
        <EmptyState
          title="No combination kept yet"
          action={
            <LinkButton variant="primary" href={`/${brand}/lines/${lineSlug}/photographs`}>
              Open the photographs
            </LinkButton>
          }
        >
          <p>
            Five shades that you keep from a photograph stand here as a wrap card: in their order,
            with their shares, as they were on that day.
          </p>
        </EmptyState>
      ) : (
        <>
          <form
            action={here}
            role="search"
            className="mb-6 flex max-w-md items-end gap-3 print:hidden"
          >
            <Field label="Title or shade" className="grow">
              <Input
                type="search"
                name="q"
                defaultValue={filter.q}
                maxLength={COMBINATION_LIMITS.search}
              />
            </Field>
            <Button type="submit">Search</Button>
          </form>
          {combinations.length === 0 ? (
            <NotFoundState
              title="No combination fits that"
              action={<LinkButton href={here}>Show all combinations</LinkButton>}
            />
          ) : (
            <ul
              role="list"
              className="grid gap-x-8 border-t border-hairline xl:grid-cols-3 md:grid-cols-2"
            >
              {combinations.map((combination) => (
                <li key={combination.id} className="flex gap-5 border-b border-hairline py-5">
                  <WrapCard
                    compact
                    bands={bandsOf(combination)}
                    title={combination.title}
                    className="w-28 shrink-0"
                  />
                  <div className="min-w-0">
                    <AppLink
                      href={`${here}/${combination.id}`}
                      className="font-title text-lg leading-tight break-words hover:underline"
                    >
                      {combination.title}
                    </AppLink>
                    <p className="mt-1 text-sm">{namesInWords(combination)}</p>
                    <p className="mt-1 text-sm text-ink-faint">
                      {combination.photograph
                        ? `From ${combination.photograph.title}`
                        : 'Its photograph is gone'}
                    </p>
                    <p className="text-sm text-ink-faint">{keptInWords(combination)}</p>
                  </div>
                </li>
              ))}
            </ul>
          )}
          <Pagination label="Pages of combinations" {...pages} />
        </>
      )}
    </Sheet>
  )
}
