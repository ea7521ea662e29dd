'use client'

import { Button } from '@/components/ui/button'
import { ErrorState } from '@/components/ui/states'

/** What Next.js hands to an error file. */
export interface ErrorPageProps {
  error: Error & { digest?: string }
  reset: () => void
}

/** A whole page that could not be read; the digest finds the line in the log. */
export function ErrorPage({ error, reset }: ErrorPageProps) {
  return (
    <ErrorState
      heading="h1"
      title="This page could not be read"
      action={
        <Button variant="primary" onClick={reset}>
          Read the page again
        </Button>
      }
    >
      <p>
        Everything that was saved is still saved. Try again in a moment
        {error.digest ? `; if it goes on, tell us reference ${error.digest}` : ''}.
      </p>
    </ErrorState>
  )
}
