import type { Metadata } from 'next'

import { ForbiddenPage } from '@/components/layout/page-states'
import { Sheet } from '@/components/layout/sheet'

export const metadata: Metadata = { title: 'Not part of your role' }

export default function Forbidden() {
  return (
    <Sheet>
      <ForbiddenPage />
    </Sheet>
  )
}
