import type { Actor } from '@/lib/auth/actor'
import type { ReadingKind } from '@/lib/color/readings'
import { presentShade, type ShadeView } from '@/lib/shades/present'

import { canDeleteCombination, canEditCombination, canRenameCombination } from './policy'
import type { KeptCombination } from './queries'
import type { Lane, PlaceRole } from './constants'

/** One of the five places of a kept combination. */
export interface PlaceView {
  place: number
  role: PlaceRole
  /** 0 to 1; the five sum to 1. */
  share: number
  locked: boolean
  /** Null where the place is still empty. */
  shade: ShadeView | null
  /** The shade was deleted from the line since; it stays here as it was. */
  gone: boolean
}

/** A kept combination as the studio shows it. */
export interface CombinationView {
  id: string
  title: string
  /** What the five tell; may be empty. */
  story: string
  lane: Lane
  version: number
  reading: ReadingKind | null
  /** ISO 8601. */
  keptAt: string
  /** Null when that person's account is gone. */
  keptBy: string | null
  places: PlaceView[]
  photographId: string | null
  /** Null when there is none, and when it was deleted. */
  photograph: { id: string; title: string; photographer: string } | null
  /** May change its title. */
  canRename: boolean
  /** May change everything else too. */
  canEdit: boolean
  canDelete: boolean
}

/** A kept combination as its view. */
export function presentCombination(
  actor: Actor,
  { combination, keptBy }: KeptCombination,
): CombinationView {
  const { photograph } = combination
  return {
    id: combination.id,
    title: combination.title,
    story: combination.story,
    lane: combination.lane,
    version: combination.version,
    reading: combination.reading,
    keptAt: combination.createdAt.toISOString(),
    keptBy,
    places: (combination.places ?? []).map(({ place, role, share, locked, shade }) => ({
      place,
      role,
      share,
      locked,
      shade: shade ? presentShade(shade) : null,
      gone: shade ? shade.deletedAt !== null : false,
    })),
    photographId: combination.photographId,
    photograph: photograph
      ? { id: photograph.id, title: photograph.title, photographer: photograph.photographer }
      : null,
    canRename: canRenameCombination(actor),
    canEdit: canEditCombination(actor),
    canDelete: canDeleteCombination(actor),
  }
}

/** A shade on the board, sent once however many combinations hold it. */
export interface BoardShade {
  id: string
  label: string
  hex: string
  familyId: string | null
}

/** A combination on the board; numbers are indices into the board's lists. */
export interface BoardCard {
  id: string
  title: string
  lane: Lane
  /** Top to bottom; null for an empty place. Shares are 0 to 1. */
  places: [shade: number | null, share: number][]
  photograph: number | null
  /** Null when that person's account is gone. */
  author: number | null
}

/** A line's board, compact: cards lane by lane, each top to bottom. */
export interface BoardView {
  /** Goes up with every change to a combination of the line. */
  revision: number
  cards: BoardCard[]
  shades: BoardShade[]
  families: { id: string; name: string }[]
  photographs: { id: string; title: string }[]
  authors: { id: string; name: string }[]
}
