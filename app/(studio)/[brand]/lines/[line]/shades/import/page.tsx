import type { Metadata } from 'next'

import { Note } from '@/components/layout/note'
import { Sheet } from '@/components/layout/sheet'
import { SheetHeader } from '@/components/layout/sheet-header'
import { ImportShades } from '@/components/shades/import-shades'
import { shadesHref } from '@/components/shades/shades-actions'
import { authorize } from '@/lib/auth/actor'
import { getLine } from '@/lib/lines/queries'
import { readForPage } from '@/lib/server/page'
import { canEditShades } from '@/lib/shades/policy'
import { SHADE_LIMITS, SHADE_STATUSES } from '@/lib/shades/constants'

import { importShadesAction, previewImportAction } from '../actions'

export const metadata: Metadata = { title: 'Import shades' }

export default async function ImportShadesPage({
  params,
}: PageProps<'/[brand]/lines/[line]/shades/import'>) {
  const { brand, line: lineSlug } = await params
  await readForPage(brand, async (actor) => {
    authorize(actor, canEditShades)
    return getLine(actor, lineSlug)
  })
  const place = { brand, lineSlug }
  return (
    <Sheet
      notes={
        <>
          <Note title="What the file holds">
            <p>
              One shade a row under a header row, at most{' '}
              {SHADE_LIMITS.importRows.toLocaleString('en-GB')} rows. Each needs a number and a
              colour: L, a and b as read under D65, or a hex.
            </p>
            <p>
              Name, status ({SHADE_STATUSES.join(', ')}) and order may be left out. Decimal points
              and commas are both understood.
            </p>
            <p>A name begins as a draft: the shade is called so once it is approved.</p>
          </Note>
          <Note title="Shades that are there already">
            <p>
              A row with a number of this line changes that shade; what the file does not say stays.
              No shade is deleted, and no name is taken away.
            </p>
          </Note>
        </>
      }
    >
      <SheetHeader title="Import shades" back={{ href: shadesHref(place), label: 'Shades' }} />
      <ImportShades
        place={place}
        actions={{ preview: previewImportAction, import: importShadesAction }}
      />
    </Sheet>
  )
}
