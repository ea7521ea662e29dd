import { dayInWords } from '@/components/date-words'
import type { CombinationView } from '@/lib/combinations/present'

/** "Kept by Anjali Fellgarth on 1 December 2026". */
export const keptInWords = ({ keptBy, keptAt }: Pick<CombinationView, 'keptBy' | 'keptAt'>) =>
  `Kept by ${keptBy ?? 'a former member'} on ${dayInWords(keptAt)}`
