import type { Metadata } from 'next'

import { ForbiddenPage } from '@/components/layout/page-states'
import { PlainPage } from '@/components/layout/plain-page'

export const metadata: Metadata = { title: 'Not part of your role' }

export default function Forbidden() {
  return (
    <PlainPage homeHref="/">
      <ForbiddenPage />
    </PlainPage>
  )
}
