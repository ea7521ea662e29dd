import type { Metadata } from 'next'

import { NotFoundPage } from '@/components/layout/page-states'
import { Sheet } from '@/components/layout/sheet'

export const metadata: Metadata = { title: 'Not found' }

export default function NotFound() {
  return (
    <Sheet>
      <NotFoundPage />
    </Sheet>
  )
}
