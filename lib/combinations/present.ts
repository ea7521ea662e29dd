import type { Actor } from '@/lib/auth/actor'
import type { ReadingKind } from '@/lib/color/readings'
import { presentShade, type ShadeView } from '@/lib/shades/present'

import { canDeleteCombination, canRenameCombination, canReorderCombination } from './policy'
import type { KeptCombination } from './queries'
import { PLACE_ROLES, type PlaceRole } from './constants'

/** One of the five places of a kept combination. */
export interface PlaceView {
  place: number
  role: PlaceRole
  /** 0 to 1; the five sum to 1. */
  share: number
  shade: ShadeView
  /** The shade was deleted from the line since; it stays here as it was. */
  gone: boolean
}

/** A kept combination as the studio shows it. */
export interface CombinationView {
  id: string
  title: string
  version: number
  reading: ReadingKind | null
  /** ISO 8601. */
  keptAt: string
  /** Null when that person's account is gone. */
  keptBy: string | null
  places: PlaceView[]
  photograph: { id: string; title: string; photographer: string } | null
  canRename: boolean
  canReorder: boolean
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
    version: combination.version,
    reading: combination.reading,
    keptAt: combination.createdAt.toISOString(),
    keptBy,
    places: (combination.places ?? []).map(({ place, share, shade }) => ({
      place,
      role: PLACE_ROLES[place - 1]!,
      share,
      shade: presentShade(shade!),
      gone: shade!.deletedAt !== null,
    })),
    photograph: photograph
      ? { id: photograph.id, title: photograph.title, photographer: photograph.photographer }
      : null,
    canRename: canRenameCombination(actor),
    canReorder: canReorderCombination(actor),
    canDelete: canDeleteCombination(actor),
  }
}
