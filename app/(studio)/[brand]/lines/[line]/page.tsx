import type { Metadata } from 'next'

import { Sheet } from '@/components/layout/sheet'
import { SheetHeader } from '@/components/layout/sheet-header'
import { Facts } from '@/components/ui/ledger'
import { LinkButton } from '@/components/ui/link-button'
import { canUpdateLine } from '@/lib/lines/policy'
import { presentLine } from '@/lib/lines/present'

import { readLine } from './read-line'

export const metadata: Metadata = { title: 'The line' }

export default async function LinePage({ params }: PageProps<'/[brand]/lines/[line]'>) {
  const { brand, line: slug } = await params
  const { actor, line: row } = await readLine(brand, slug)
  const line = presentLine(row)
  return (
    <Sheet>
      <SheetHeader
        title={line.name}
        meta={line.launchDate ? `Launches ${line.launchDate}` : 'No launch date yet'}
        actions={
          canUpdateLine(actor) && (
            <LinkButton href={`/${brand}/lines/${line.slug}/edit`}>Edit line</LinkButton>
          )
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
