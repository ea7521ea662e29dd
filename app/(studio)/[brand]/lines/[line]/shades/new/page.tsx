import type { Metadata } from 'next'

import { Sheet } from '@/components/layout/sheet'
import { SheetHeader } from '@/components/layout/sheet-header'
import { ShadeForm } from '@/components/shades/shade-form'
import { shadesHref } from '@/components/shades/shades-actions'
import { authorize } from '@/lib/auth/actor'
import { getLine } from '@/lib/lines/queries'
import { readForPage } from '@/lib/server/page'
import { canEditShades } from '@/lib/shades/policy'

import { createShadeAction } from '../actions'

export const metadata: Metadata = { title: 'Add shade' }

export default async function NewShadePage({
  params,
}: PageProps<'/[brand]/lines/[line]/shades/new'>) {
  const { brand, line: lineSlug } = await params
  await readForPage(brand, async (actor) => {
    authorize(actor, canEditShades)
    return getLine(actor, lineSlug)
  })
  const place = { brand, lineSlug }
  return (
    <Sheet>
      <SheetHeader title="Add shade" back={{ href: shadesHref(place), label: 'Shades' }} />
      <ShadeForm place={place} save={createShadeAction} />
    </Sheet>
  )
}
