import { dayInWords } from '@/components/date-words'
import { isUnbuilt } from '@/lib/kits/constants'
import type { KitView } from '@/lib/kits/present'

/** "1 combination", "12 combinations". */
export const combinationsInWords = (count: number): string =>
  count === 1 ? '1 combination' : `${count} combinations`

/** "8.4 MB"; a megabyte is a million bytes. */
export const sizeInWords = (bytes: number): string =>
  bytes < 1e6 ? `${Math.max(1, Math.round(bytes / 1e3))} kB` : `${(bytes / 1e6).toFixed(1)} MB`

const minute = new Intl.DateTimeFormat('en-GB', {
  dateStyle: 'long',
  timeStyle: 'short',
  timeZone: 'UTC',
})

/** "20 March 2027 at 14:05 UTC, by Ottilie Fenn". */
export const askedInWords = ({ askedAt, askedBy }: Pick<KitView, 'askedAt' | 'askedBy'>): string =>
  `${minute.format(new Date(askedAt))} UTC, by ${askedBy ?? 'somebody who has left'}`

/** What a kit is called in a list, and by those who hear it: it has no name of its own. */
export const kitInWords = ({ count, askedAt }: Pick<KitView, 'count' | 'askedAt'>): string =>
  `Kit of ${combinationsInWords(count)}, ${dayInWords(askedAt)}`

/** The address of the form with the same combinations ticked. */
export const againHref = (kits: string, { selection }: Pick<KitView, 'selection'>): string =>
  `${kits}?combinations=${selection.join(',')}`

/** Whether a kit can be taken away. */
export const isThere = ({ state, expired }: Pick<KitView, 'state' | 'expired'>): boolean =>
  !isUnbuilt(state) && state === 'ready' && !expired
