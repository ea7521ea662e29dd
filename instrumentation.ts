/** Runs once before a server process answers: the first match would take many times longer cold. */
export async function register(): Promise<void> {
  const { warmUpReading } = await import('@/lib/photographs/warm-up')
  await warmUpReading()
}
