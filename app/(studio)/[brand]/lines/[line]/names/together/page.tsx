import type { Metadata } from 'next'

import { Note } from '@/components/layout/note'
import { Sheet } from '@/components/layout/sheet'
import { SheetHeader, SheetSection } from '@/components/layout/sheet-header'
import { StockCodes } from '@/components/names/list-codes'
import { LengthRule } from '@/components/names/list-lengths'
import { LineFindings } from '@/components/names/list-findings'
import { countNames } from '@/components/names/list-words'
import { namesHref } from '@/components/names/names-place'
import { NamesTabs } from '@/components/names/names-tabs'
import { LinkButton } from '@/components/ui/link-button'
import { EmptyState } from '@/components/ui/states'
import { readTogether } from '@/lib/names/read-together'
import { readForPage } from '@/lib/server/page'

export const metadata: Metadata = { title: 'Names all together' }

type Props = PageProps<'/[brand]/lines/[line]/names/together'>

export default async function TogetherPage({ params }: Props) {
  const { brand, line: lineSlug } = await params
  const place = { brand, lineSlug }
  const { line, rows, report } = await readForPage(brand, (actor) => readTogether(actor, lineSlug))
  const { findings, lengths, wordplay } = report

  if (!lengths) {
    return (
      <Sheet>
        <SheetHeader title="All together" back={{ href: namesHref(place), label: 'Names' }} />
        <NamesTabs place={place} current="together" />
        <EmptyState
          title="No names to look at yet"
          action={<LinkButton href={namesHref(place)}>Go to the list</LinkButton>}
        >
          {`Once names of ${line.name} are in review or approved, this page shows how they stand beside each other: words that come back, neighbours that sound alike, stock codes that collide.`}
        </EmptyState>
      </Sheet>
    )
  }

  const inReview = rows.filter(({ state }) => state === 'in-review').length
  const plays = Object.keys(wordplay.sources).length
  return (
    <Sheet
      notes={
        <Note title="What is looked at">
          <p>
            One name of each shade that is still made: the approved one, or the newest in review.
            Neighbours are those of the sample book, family by family.
          </p>
          <p>Nothing here stops a name. It says what stands out; people decide.</p>
        </Note>
      }
    >
      <SheetHeader
        title="All together"
        meta={`${countNames(rows.length)} of ${line.name}${inReview > 0 ? `, ${inReview} of them in review` : ''}`}
        back={{ href: namesHref(place), label: 'Names' }}
      />
      <NamesTabs place={place} current="together" />
      <SheetSection
        className="mt-6"
        title="What stands out"
        aside={findings.length === 1 ? '1 thing' : `${findings.length} things`}
      >
        <LineFindings findings={findings} />
      </SheetSection>
      <SheetSection title="Manner">
        <p className="mb-5 max-w-measure text-ink-soft">
          {plays === 0
            ? 'No name plays on a saying that we know.'
            : `${plays} of ${countNames(rows.length)} (${Math.round(100 * wordplay.share)} %) ${plays === 1 ? 'plays' : 'play'} on a saying; which one stands beside the code below.`}{' '}
          {lengths.least === lengths.most
            ? `All are ${lengths.most} characters long, blanks among them.`
            : `They are ${lengths.least} to ${lengths.most} characters long, blanks among them; the middle one has ${lengths.middle}.`}
        </p>
        <LengthRule rows={rows} />
      </SheetSection>
      <SheetSection title="Stock codes">
        <StockCodes place={place} rows={rows} />
      </SheetSection>
    </Sheet>
  )
}
