import type { Metadata } from 'next'

import { Sheet } from '@/components/layout/sheet'
import { SheetHeader } from '@/components/layout/sheet-header'
import { LineForm } from '@/components/lines/line-form'
import { authorize } from '@/lib/auth/actor'
import { canUpdateLine } from '@/lib/lines/policy'
import { presentLine } from '@/lib/lines/present'
import { getLine } from '@/lib/lines/queries'
import { readForPage } from '@/lib/server/page'

import { updateLineAction } from '../../../(brand)/lines/actions'

export const metadata: Metadata = { title: 'Edit line' }

export default async function EditLinePage({ params }: PageProps<'/[brand]/lines/[line]/edit'>) {
  const { brand, line: slug } = await params
  const line = await readForPage(brand, async (actor) => {
    authorize(actor, canUpdateLine)
    return presentLine(await getLine(actor, slug))
  })
  return (
    <Sheet>
      <SheetHeader
        title="Edit line"
        back={{ href: `/${brand}/lines/${line.slug}`, label: line.name }}
      />
      <LineForm brand={brand} line={line} save={updateLineAction} />
    </Sheet>
  )
}
