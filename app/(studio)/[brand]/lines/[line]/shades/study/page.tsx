import type { Metadata } from 'next'

import { Sheet } from '@/components/layout/sheet'
import { SheetHeader } from '@/components/layout/sheet-header'
import { AddShades } from '@/components/shades/add-shades'
import { ShadesTabs } from '@/components/shades/shades-tabs'
import { RangeStudySections } from '@/components/study/range-study'
import { StudyNotes } from '@/components/study/study-notes'
import { showCount } from '@/components/study/study-words'
import { EmptyState } from '@/components/ui/states'
import { GroundSwitch } from '@/components/yarn/ground-switch'
import { readForPage } from '@/lib/server/page'
import { STUDY_LIMITS } from '@/lib/shades/constants'
import { canEditShades } from '@/lib/shades/policy'
import { readRangeStudy } from '@/lib/shades/range-study'
import { rangeStudySchema } from '@/lib/shades/schema'

import { createShadeAction, deleteShadesAction } from '../actions'

export const metadata: Metadata = { title: 'Range study' }

export default async function RangeStudyPage({
  params,
  searchParams,
}: PageProps<'/[brand]/lines/[line]/shades/study'>) {
  const { brand, line: lineSlug } = await params
  const place = { brand, lineSlug }
  const { twins: limit } = rangeStudySchema.parse(await searchParams)
  const { edits, line, shadeCount, study } = await readForPage(brand, async (actor) => ({
    ...(await readRangeStudy(actor, lineSlug, { twins: limit })),
    edits: canEditShades(actor),
  }))

  const tabs = <ShadesTabs place={place} current="study" />

  if (!study) {
    return (
      <Sheet>
        <SheetHeader title="Range study" />
        {tabs}
        <EmptyState title="Too many shades to compare at once">
          {line.name} has more than {STUDY_LIMITS.shades.toLocaleString('en-GB')} shades. The study
          compares every pair, so it is for lines up to that size.
        </EmptyState>
      </Sheet>
    )
  }
  if (study.shadeCount < 2) {
    return (
      <Sheet>
        <SheetHeader title="Range study" />
        {tabs}
        <EmptyState
          title={shadeCount === 0 ? 'No shades to study yet' : 'No range to study yet'}
          action={edits ? <AddShades place={place} first="new" /> : null}
        >
          What lies near, what is missing and what falls together will stand here once {line.name}{' '}
          has two shades that are not retired.
        </EmptyState>
      </Sheet>
    )
  }

  return (
    <Sheet notes={<StudyNotes isMixed={study.isMixed} />}>
      <SheetHeader
        title="Range study"
        meta={
          <>
            <span className="hidden print:inline">{line.name} · </span>
            {showCount(study.shadeCount, 'shade')}
            {study.retiredCount > 0 ? `, ${study.retiredCount} retired left out` : null}
          </>
        }
      />
      <div className="mb-4 flex flex-wrap items-end justify-between gap-x-6 gap-y-2 print:hidden">
        {tabs}
        <GroundSwitch />
      </div>

      <RangeStudySections
        place={place}
        study={study}
        limit={limit}
        actions={edits ? { create: createShadeAction, remove: deleteShadesAction } : null}
      />
    </Sheet>
  )
}
