import type { CombinationView } from '@/lib/combinations/present'
import type { Band } from '@/components/yarn/bands'

/** The five as bands for the card and the cloth, top to bottom. */
export const bandsOf = ({ places }: Pick<CombinationView, 'places'>): Band[] =>
  places.map(({ shade, share }) => ({ hex: shade.hex, share, name: shade.label }))

const day = new Intl.DateTimeFormat('en-GB', { dateStyle: 'long', timeZone: 'UTC' })

/** "Kept by Anjali Fellgarth on 1 December 2026". */
export const keptInWords = ({ keptBy, keptAt }: Pick<CombinationView, 'keptBy' | 'keptAt'>) =>
  `Kept by ${keptBy ?? 'a former member'} on ${day.format(new Date(keptAt))}`

/** The five by name, top to bottom, as a sentence would list them. */
export const namesInWords = ({ places }: Pick<CombinationView, 'places'>) =>
  places.map(({ shade }) => shade.label).join(', ')
