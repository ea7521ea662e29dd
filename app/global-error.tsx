'use client'

/** The last resort, when even the layout could not be drawn. */
export default function GlobalError({
  error,
  reset,
}: {
  error: Error & { digest?: string }
  reset: () => void
}) {
  return (
    <html lang="en-GB">
      <body style={{ fontFamily: 'sans-serif', margin: '3rem', maxWidth: '36rem' }}>
        <h1>Woadmap could not be drawn</h1>
        <p>Everything that was saved is still saved.</p>
        {error.digest ? <p>If it goes on, tell us reference {error.digest}.</p> : null}
        <button type="button" onClick={reset}>
          Try again
        </button>
      </body>
    </html>
  )
}
