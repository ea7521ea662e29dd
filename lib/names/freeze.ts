import type { NamingSettings } from '@/models'

/** A day, yyyy-mm-dd, as the label printer's date is meant: UTC. */
export const dayOf = (moment: Date): string => moment.toISOString().slice(0, 10)

/**
 * Whether approved names of a line are locked: an owner has frozen them, or the label printer's day
 * has come, whether or not the hourly job has noted it yet.
 */
export function isFrozen(
  settings: Pick<NamingSettings, 'frozenAt' | 'printOn'> | null,
  now = new Date(),
): boolean {
  if (!settings) return false
  const { frozenAt, printOn } = settings
  return frozenAt !== null || (printOn !== null && printOn <= dayOf(now))
}
