'use client'

import { ErrorPage, type ErrorPageProps } from '@/components/layout/error-page'
import { Sheet } from '@/components/layout/sheet'

export default function PageError(props: ErrorPageProps) {
  return (
    <Sheet>
      <ErrorPage {...props} />
    </Sheet>
  )
}
