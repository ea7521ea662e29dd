/** Runs once before a server process answers: the first match would take many times longer cold. */
export async function register(): Promise<void> {
  // Next.js puts this in while building, and leaves what follows out of what runs elsewhere.
  // eslint-disable-next-line no-restricted-properties
  if (process.env.NEXT_RUNTIME !== 'nodejs') return
  const { warmUpReading } = await import('@/lib/photographs/warm-up')
  await warmUpReading()
}
