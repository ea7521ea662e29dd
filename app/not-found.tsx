import type { Metadata } from 'next'

import { NotFoundPage } from '@/components/layout/page-states'
import { PlainPage } from '@/components/layout/plain-page'

export const metadata: Metadata = { title: 'Not found' }

export default function NotFound() {
  return (
    <PlainPage homeHref="/">
      <NotFoundPage />
    </PlainPage>
  )
}
