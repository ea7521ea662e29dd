import type { CombinationView } from '@/lib/combinations/present'

const day = new Intl.DateTimeFormat('en-GB', { dateStyle: 'long', timeZone: 'UTC' })

/** "Kept by Anjali Fellgarth on 1 December 2026". */
export const keptInWords = ({ keptBy, keptAt }: Pick<CombinationView, 'keptBy' | 'keptAt'>) =>
  `Kept by ${keptBy ?? 'a former member'} on ${day.format(new Date(keptAt))}`
