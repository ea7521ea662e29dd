import type { CombinationView, PlaceView } from '@/lib/combinations/present'
import type { Band } from '@/components/yarn/bands'

/** A place that holds a shade. */
export type FilledPlace = PlaceView & { shade: NonNullable<PlaceView['shade']> }

/** The places that hold a shade, in order. */
export const filled = (places: readonly PlaceView[]) =>
  places.filter((place): place is FilledPlace => place.shade !== null)

/** The five as bands for the card and the cloth, top to bottom. */
export const bandsOf = ({ places }: Pick<CombinationView, 'places'>): Band[] =>
  filled(places).map(({ shade, share }) => ({ hex: shade.hex, share, name: shade.label }))

const day = new Intl.DateTimeFormat('en-GB', { dateStyle: 'long', timeZone: 'UTC' })

/** "Kept by Anjali Fellgarth on 1 December 2026". */
export const keptInWords = ({ keptBy, keptAt }: Pick<CombinationView, 'keptBy' | 'keptAt'>) =>
  `Kept by ${keptBy ?? 'a former member'} on ${day.format(new Date(keptAt))}`

/** The five by name, top to bottom, as a sentence would list them. */
export const namesInWords = ({ places }: Pick<CombinationView, 'places'>) =>
  filled(places)
    .map(({ shade }) => shade.label)
    .join(', ')
