import type { Metadata } from 'next'

import { FamiliesEditor } from '@/components/families/families-editor'
import { Note } from '@/components/layout/note'
import { ScreenCaution } from '@/components/layout/screen-caution'
import { Sheet } from '@/components/layout/sheet'
import { SheetHeader } from '@/components/layout/sheet-header'
import { AddShades } from '@/components/shades/add-shades'
import { shadesHref } from '@/components/shades/shades-actions'
import { ShadesTabs } from '@/components/shades/shades-tabs'
import { EmptyState } from '@/components/ui/states'
import { GroundSwitch } from '@/components/yarn/ground-switch'
import { canEditFamilies, canRenameFamily } from '@/lib/families/policy'
import { readFamilies } from '@/lib/families/queries'
import { readForPage } from '@/lib/server/page'

import {
  mergeFamiliesAction,
  moveShadesToFamilyAction,
  orderFamiliesAction,
  orderFamilyShadesAction,
  pinShadesAction,
  previewSortAction,
  renameFamilyAction,
  restoreFamiliesAction,
  sortIntoFamiliesAction,
  splitFamilyAction,
} from './actions'

export const metadata: Metadata = { title: 'Families' }

type Props = PageProps<'/[brand]/lines/[line]/shades/families'>

export default async function FamiliesPage({ params }: Props) {
  const { brand, line: lineSlug } = await params
  const place = { brand, lineSlug }
  const { line, families, unplaced, total, can } = await readForPage(brand, async (actor) => ({
    ...(await readFamilies(actor, lineSlug)),
    can: { edit: canEditFamilies(actor), rename: canRenameFamily(actor) },
  }))

  if (total === 0) {
    return (
      <Sheet>
        <SheetHeader title="Families" back={{ href: shadesHref(place), label: 'Shades' }} />
        <EmptyState
          title="No shades to sort yet"
          action={can.edit ? <AddShades place={place} first="import" /> : null}
        >
          {`The shades of ${line.name} will stand here by tonal family, neutrals first, each from light to dark. They sort themselves as they come.`}
        </EmptyState>
      </Sheet>
    )
  }

  return (
    <Sheet
      notes={
        <>
          <Note title="How they are sorted">
            <p>
              Neutrals are told by how little colour they have. The rest is cut where the hue circle
              parts best; vivid shades count for more than pale ones.
            </p>
            {can.edit ? (
              <p>
                What you move is pinned: sorting anew leaves it where you put it. New shades join
                the family of their nearest shade.
              </p>
            ) : null}
          </Note>
          <Note title="Before you judge">
            <ScreenCaution />
          </Note>
        </>
      }
    >
      <SheetHeader
        title="Families"
        meta={`${families.length} ${families.length === 1 ? 'family' : 'families'} of ${line.name}`}
        back={{ href: shadesHref(place), label: 'Shades' }}
      />
      <div className="mb-4 flex flex-wrap items-end justify-between gap-x-6 gap-y-2 print:hidden">
        <ShadesTabs place={place} current="families" />
        <GroundSwitch />
      </div>
      <FamiliesEditor
        place={place}
        version={line.familiesVersion}
        count={line.familyCount}
        families={families}
        unplaced={unplaced}
        can={can}
        actions={{
          sort: sortIntoFamiliesAction,
          preview: previewSortAction,
          rename: renameFamilyAction,
          merge: mergeFamiliesAction,
          split: splitFamilyAction,
          move: moveShadesToFamilyAction,
          pin: pinShadesAction,
          orderShades: orderFamilyShadesAction,
          orderFamilies: orderFamiliesAction,
          restore: restoreFamiliesAction,
        }}
      />
    </Sheet>
  )
}
