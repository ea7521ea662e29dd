'use client'

import { ErrorPage, type ErrorPageProps } from '@/components/layout/error-page'
import { PlainPage } from '@/components/layout/plain-page'

export default function PageError(props: ErrorPageProps) {
  return (
    <PlainPage homeHref="/">
      <ErrorPage {...props} />
    </PlainPage>
  )
}
