import type { Instrumentation } from 'next'

/**
 * Runs once before a server process answers: it must speak to the database as the role that sees
 * one brand at a time, and the first match and the first name would take many times longer cold.
 */
export async function register(): Promise<void> {
  // Next.js puts this in while building, and leaves what follows out of what runs elsewhere.
  // eslint-disable-next-line no-restricted-properties
  if (process.env.NEXT_RUNTIME !== 'nodejs') return
  const [{ watchRequests }, { requireHeldRole }, { warmUpReading }, { warmUpNames }] =
    await Promise.all([
      import('@/lib/server/http-log'),
      import('@/lib/server/held-role'),
      import('@/lib/photographs/warm-up'),
      import('@/lib/names/warm-up'),
    ])
  watchRequests()
  requireHeldRole()
  await warmUpReading()
  warmUpNames()
}

/** Runs for every error that no page, route or action has dealt with. */
export const onRequestError: Instrumentation.onRequestError = async (...told) => {
  // eslint-disable-next-line no-restricted-properties
  if (process.env.NEXT_RUNTIME !== 'nodejs') return
  const { logRequestError } = await import('@/lib/server/log-request-error')
  await logRequestError(...told)
}
