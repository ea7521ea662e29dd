import type { Metadata } from 'next'

import { NotFoundPage } from '@/components/layout/page-states'

export const metadata: Metadata = { title: 'Not found' }

export default function NotFound() {
  return <NotFoundPage frame="sheet" />
}
