import type { Metadata } from 'next'

import { ForbiddenPage } from '@/components/layout/page-states'

export const metadata: Metadata = { title: 'Not part of your role' }

export default function Forbidden() {
  return <ForbiddenPage frame="plain" />
}
