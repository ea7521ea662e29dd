import type { Metadata } from 'next'

import { Sheet } from '@/components/layout/sheet'
import { SheetHeader } from '@/components/layout/sheet-header'
import { LineForm } from '@/components/lines/line-form'
import { authorize } from '@/lib/auth/actor'
import { canCreateLine } from '@/lib/lines/policy'
import { readForPage } from '@/lib/server/page'

import { createLineAction } from '../actions'

export const metadata: Metadata = { title: 'Make a line' }

export default async function NewLinePage({ params }: PageProps<'/[brand]/lines/new'>) {
  const { brand } = await params
  await readForPage(brand, (actor) => Promise.resolve(authorize(actor, canCreateLine)))
  return (
    <Sheet>
      <SheetHeader title="Make a line" back={{ href: `/${brand}`, label: 'Lines' }} />
      <LineForm brand={brand} save={createLineAction} />
    </Sheet>
  )
}
