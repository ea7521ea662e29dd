import type { Someone } from '@/lib/names/present'

const minute = new Intl.DateTimeFormat('en-GB', {
  dateStyle: 'medium',
  timeStyle: 'short',
  timeZone: 'UTC',
})

/** "20 Mar 2027, 14:05 UTC". */
export const minuteInWords = (at: string): string => `${minute.format(new Date(at))} UTC`

/** Their name, or that they have left. */
export const nameOf = (person: Someone): string => person?.name ?? 'Somebody who has left'
