import type { Lab } from '@/lib/color/types'
import type { ReadingKind } from '@/lib/color/readings'
import type { ShadeView } from '@/lib/shades/present'

/** What a match page needs of a shade. */
export type MatchShadeView = Pick<
  ShadeView,
  'id' | 'number' | 'name' | 'label' | 'lab' | 'hex' | 'inGamut'
>

/** A colour read from the picture, with the line's nearest shades. */
export interface TouchedColor {
  lab: Lab
  css: string
}

/** The readings as the page calls them. */
export const READING_LABELS: Record<ReadingKind, string> = {
  true: 'True',
  accent: 'With the accent',
  contrast: 'Value contrast',
  family: 'One family',
  quiet: 'Quiet',
}

/** What each reading is for, in a sentence. */
export const READING_WORDS: Record<ReadingKind, string> = {
  true: 'The five that come closest to the whole picture.',
  accent: 'The same, with the most striking colour that the true reading leaves out.',
  contrast: 'Five that step clearly from light to dark, for stranded work.',
  family: 'Five of the picture’s strongest hue.',
  quiet: 'The picture spoken low: the line’s muted shades only.',
}

/** What no other five do, where these are proved best: "No other five of your 40 shades …". */
export const READING_PROOF: Record<ReadingKind, string> = {
  true: 'come closer to this photograph',
  accent: 'come closer to this photograph with its accent among them',
  contrast: 'come closer to this photograph and step as clearly from light to dark',
  family: 'come closer to this photograph within one family of colour',
  quiet: 'come closer to the quieted photograph with muted ones only',
}
