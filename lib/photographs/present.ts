import type { Actor } from '@/lib/auth/actor'
import { screenColor } from '@/lib/color/gamut'
import type { Lab } from '@/lib/color/types'
import type { Line, Photograph, Reading } from '@/models'

import type { StoredMatches } from './compute-matches'
import { derivativeName } from './keys'
import { canDeletePhotographs, canEditPhotograph, canRereadPhotograph } from './policy'
import type { Derivative, Licence, PhotographState } from './constants'

/** One copy for a `srcset`. */
export interface PictureSource {
  src: string
  /** Pixels. */
  width: number
}

/** A photograph as the studio shows it. */
export interface PhotographView {
  id: string
  title: string
  photographer: string
  licence: Licence | null
  licenceNote: string
  licenceUrl: string
  sourceUrl: string
  altText: string
  fileName: string
  state: PhotographState
  /** Why it could not be read, in words. */
  failure: string | null
  /** Pixels of the original, upright; null until read. */
  width: number | null
  height: number | null
  byteLength: number
  /** ISO 8601. */
  addedAt: string
  /** Our own copies, narrow before wide; empty while there are none. */
  sources: { avif: PictureSource[]; webp: PictureSource[] }
  /** For a browser that takes neither list; null while there is no copy. */
  fallbackSrc: string | null
  version: number
  /** The line's shades have changed since the stored matches were made. */
  stale: boolean
  canEdit: boolean
  canDelete: boolean
  canReread: boolean
}

/** Where a photograph's copies are. */
function pictureOf(
  { brandSlug }: Actor,
  photograph: Photograph,
): Pick<PhotographView, 'sources' | 'fallbackSrc'> {
  const path = `/api/brands/${brandSlug}/photographs/${photograph.id}/derivatives/`
  const sourcesOf = (format: Derivative['format']): PictureSource[] =>
    photograph.derivatives
      .filter((one) => one.format === format)
      .sort((a, b) => a.width - b.width)
      .map((one) => ({ src: path + derivativeName(photograph, one), width: one.width }))
  const webp = sourcesOf('webp')
  return {
    sources: { avif: sourcesOf('avif'), webp },
    fallbackSrc: (webp.findLast(({ width }) => width <= 960) ?? webp[0])?.src ?? null,
  }
}

/** A photograph with its reading's age, as its view. */
export function presentPhotograph(
  actor: Actor,
  line: Line,
  photograph: Photograph,
): PhotographView {
  const { reading } = photograph
  return {
    id: photograph.id,
    title: photograph.title,
    photographer: photograph.photographer,
    licence: photograph.licence,
    licenceNote: photograph.licenceNote,
    licenceUrl: photograph.licenceUrl,
    sourceUrl: photograph.sourceUrl,
    altText: photograph.altText,
    fileName: photograph.fileName,
    state: photograph.state,
    failure: photograph.failure,
    width: photograph.width,
    height: photograph.height,
    byteLength: photograph.byteLength,
    addedAt: photograph.createdAt.toISOString(),
    ...pictureOf(actor, photograph),
    version: photograph.version,
    stale: reading ? reading.shadesRevision !== line.shadesRevision : false,
    canEdit: canEditPhotograph(actor),
    canDelete: canDeletePhotographs(actor),
    canReread: canRereadPhotograph(actor),
  }
}

/** A photograph to choose for a combination. */
export type PhotographChoice = Pick<
  PhotographView,
  'id' | 'title' | 'photographer' | 'altText' | 'width' | 'height' | 'fallbackSrc'
>

/** A photograph as a choice: what its picture and its credit need. */
export function presentPhotographChoice(actor: Actor, photograph: Photograph): PhotographChoice {
  const { id, title, photographer, altText, width, height } = photograph
  const { fallbackSrc } = pictureOf(actor, photograph)
  return { id, title, photographer, altText, width, height, fallbackSrc }
}

/** A colour of a photograph worth offering for a lock. */
export interface StrikingColorView {
  lab: Lab
  /** As a screen shows it. */
  hex: string
}

/** What the match page needs of a photograph's reading. */
export interface ReadingView {
  matches: StoredMatches
  striking: StrikingColorView[]
}

/** A reading as its view. */
export const presentReading = ({ matches, striking }: Reading): ReadingView => ({
  matches: matches as StoredMatches,
  striking: striking.map(({ lab }) => ({ lab, hex: screenColor(lab).hex })),
})
