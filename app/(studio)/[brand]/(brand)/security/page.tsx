import type { Metadata } from 'next'

import { Sheet } from '@/components/layout/sheet'
import { SheetHeader } from '@/components/layout/sheet-header'
import { SecondFactorSetting } from '@/components/team/second-factor-setting'
import { readForPage } from '@/lib/server/page'
import { getSecondFactorRequirement } from '@/lib/team/get-second-factor-requirement'

import { requireSecondFactorAction } from './actions'

export const metadata: Metadata = { title: 'Signing in' }

export default async function SecurityPage({ params }: PageProps<'/[brand]/security'>) {
  const { brand } = await params
  const { brandName, requirement } = await readForPage(brand, async (actor) => ({
    brandName: actor.brandName,
    requirement: await getSecondFactorRequirement(actor),
  }))
  return (
    <Sheet>
      <SheetHeader
        title="Signing in"
        meta={brandName}
        back={{ href: `/${brand}/team`, label: 'Team' }}
      />
      <SecondFactorSetting brand={brand} {...requirement} require={requireSecondFactorAction} />
    </Sheet>
  )
}
