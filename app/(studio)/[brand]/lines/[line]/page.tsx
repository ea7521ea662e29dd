import type { Metadata } from 'next'

import { Sheet } from '@/components/layout/sheet'
import { SheetHeader } from '@/components/layout/sheet-header'
import { Facts } from '@/components/ui/ledger'
import { LinkButton } from '@/components/ui/link-button'
import { canUpdateLine } from '@/lib/lines/policy'
import { presentLine } from '@/lib/lines/present'
import { getLine } from '@/lib/lines/queries'
import { readForPage } from '@/lib/server/page'

export const metadata: Metadata = { title: 'The line' }

export default async function LinePage({ params }: PageProps<'/[brand]/lines/[line]'>) {
  const { brand, line: slug } = await params
  const { line, edits } = await readForPage(brand, async (actor) => ({
    line: presentLine(await getLine(actor, slug)),
    edits: canUpdateLine(actor),
  }))
  return (
    <Sheet>
      <SheetHeader
        title={line.name}
        meta={line.launchDate ? `Launches ${line.launchDate}` : 'No launch date yet'}
        actions={
          edits && <LinkButton href={`/${brand}/lines/${line.slug}/edit`}>Edit line</LinkButton>
        }
      />
      <Facts
        className="max-w-measure"
        items={[
          { term: 'Fibre content', reading: line.fibreContent },
          { term: 'Yarn', reading: line.yarn },
          { term: 'Ball', reading: `${line.weight}, ${line.length}` },
          { term: 'Gauge', reading: line.gauge },
          { term: 'Price of a ball', reading: line.price },
        ]}
      />
    </Sheet>
  )
}
