import { shareOut } from '@/components/yarn/bands'
import { COMBINATION_LIMITS, type PlaceRole } from '@/lib/combinations/constants'

/** One of the five places while it is edited. */
export interface DraftPlace {
  /** Null while the place is empty. */
  shadeId: string | null
  /** 0 to 1, a whole number of percent; the five sum to 1. */
  share: number
  role: PlaceRole
  /** Nothing is put here, taken away or swapped until it is unlocked. */
  locked: boolean
}

/** A combination while it is edited: what is undone, saved and compared. */
export interface CombinationDraft {
  title: string
  story: string
  photographId: string | null
  /** Five, top to bottom of the wrap card; no shade stands in two. */
  places: DraftPlace[]
}

/** One change of a draft; places count from 0. */
export type DraftEdit =
  | { kind: 'place'; place: number; shadeId: string | null }
  | { kind: 'swap'; place: number; with: number }
  /** Moves the edge under a place: it takes that many percent, the place below it the rest. */
  | { kind: 'edge'; place: number; percent: number }
  /** Gives a place that many percent; the others share the rest as they did. */
  | { kind: 'share'; place: number; percent: number }
  | { kind: 'role'; place: number; role: PlaceRole }
  | { kind: 'lock'; place: number; locked: boolean }
  | { kind: 'title'; title: string }
  | { kind: 'story'; story: string }
  | { kind: 'photograph'; photographId: string | null }
  /** Fills the empty places, each with what is given for it. */
  | { kind: 'complete'; shadeIds: readonly (string | null)[] }

/** The least share of a place, in percent. */
export const LEAST_PERCENT = COMBINATION_LIMITS.leastPercent

const PLACES = COMBINATION_LIMITS.places

/** A share as it is shown: a whole number of percent. */
export const percentOf = (share: number): number => Math.round(share * 100)

/** The most a place can have while the others have the least. */
export const MOST_PERCENT = 100 - (PLACES - 1) * LEAST_PERCENT

/** Shares as whole percents that sum to 100, each at least LEAST_PERCENT. */
export function wholePercents(shares: readonly number[]): number[] {
  return shareOut(
    shares.map((share) => ({ share })),
    100,
    LEAST_PERCENT,
  )
}

/** What a draft is made from: a combination as the server shows it. */
export interface DraftSource {
  title: string
  story: string
  photographId: string | null
  places: readonly {
    role: PlaceRole
    share: number
    locked: boolean
    shade: { id: string } | null
  }[]
}

/** A combination as a draft, its shares as whole percents. */
export function draftOf({ title, story, photographId, places }: DraftSource): CombinationDraft {
  const percents = wholePercents(places.map(({ share }) => share))
  return {
    title,
    story,
    photographId,
    places: places.map(({ role, locked, shade }, at) => ({
      shadeId: shade?.id ?? null,
      share: percents[at]! / 100,
      role,
      locked,
    })),
  }
}

/** The draft after an edit; the very same when the edit changes nothing or a lock forbids it. */
export function applyEdit(draft: CombinationDraft, edit: DraftEdit): CombinationDraft {
  switch (edit.kind) {
    case 'title':
      return edit.title === draft.title ? draft : { ...draft, title: edit.title }
    case 'story':
      return edit.story === draft.story ? draft : { ...draft, story: edit.story }
    case 'photograph':
      return edit.photographId === draft.photographId
        ? draft
        : { ...draft, photographId: edit.photographId }
    default: {
      const places = editPlaces(draft.places, edit)
      return places === draft.places ? draft : { ...draft, places }
    }
  }
}

type PlacesEdit = Exclude<DraftEdit, { kind: 'title' | 'story' | 'photograph' }>

function editPlaces(places: DraftPlace[], edit: PlacesEdit): DraftPlace[] {
  switch (edit.kind) {
    case 'place':
      return putShade(places, edit.place, edit.shadeId)
    case 'swap':
      return swapShades(places, edit.place, edit.with)
    case 'edge':
      return moveEdge(places, edit.place, edit.percent)
    case 'share':
      return giveShare(places, edit.place, edit.percent)
    case 'role':
      return giveRole(places, edit.place, edit.role)
    case 'lock':
      return places[edit.place]?.locked === edit.locked || !places[edit.place]
        ? places
        : places.map((one, at) => (at === edit.place ? { ...one, locked: edit.locked } : one))
    case 'complete':
      return fill(places, edit.shadeIds)
  }
}

/** A shade that stands elsewhere already changes places with what is here. */
function putShade(places: DraftPlace[], at: number, shadeId: string | null): DraftPlace[] {
  const target = places[at]
  if (!target || target.locked || target.shadeId === shadeId) return places
  const from = shadeId === null ? -1 : places.findIndex((one) => one.shadeId === shadeId)
  if (from >= 0) return swapShades(places, from, at)
  return places.map((one, index) => (index === at ? { ...one, shadeId } : one))
}

/** The shades change places; share and role stay with the place. */
function swapShades(places: DraftPlace[], one: number, other: number): DraftPlace[] {
  const [first, second] = [places[one], places[other]]
  if (!first || !second || first.locked || second.locked || first.shadeId === second.shadeId) {
    return places
  }
  return places.map((place, at) =>
    at === one
      ? { ...place, shadeId: second.shadeId }
      : at === other
        ? { ...place, shadeId: first.shadeId }
        : place,
  )
}

const within = (percent: number, most: number): number =>
  Math.max(LEAST_PERCENT, Math.min(most, Math.round(percent)))

function withPercents(places: DraftPlace[], percents: readonly number[]): DraftPlace[] {
  if (places.every(({ share }, at) => percentOf(share) === percents[at])) return places
  return places.map((place, at) => ({ ...place, share: percents[at]! / 100 }))
}

function moveEdge(places: DraftPlace[], at: number, percent: number): DraftPlace[] {
  const percents = places.map(({ share }) => percentOf(share))
  const [upper, lower] = [percents[at], percents[at + 1]]
  if (upper === undefined || lower === undefined || Number.isNaN(percent)) return places
  const both = upper + lower
  percents[at] = within(percent, both - LEAST_PERCENT)
  percents[at + 1] = both - percents[at]
  return withPercents(places, percents)
}

function giveShare(places: DraftPlace[], at: number, percent: number): DraftPlace[] {
  if (!places[at] || Number.isNaN(percent)) return places
  const given = within(percent, MOST_PERCENT)
  const others = places.filter((_, index) => index !== at)
  const rest = shareOut(
    others.map(({ share }) => ({ share })),
    100 - given,
    LEAST_PERCENT,
  )
  rest.splice(at, 0, given)
  return withPercents(places, rest)
}

/** Who had the role takes the one that is given up, so that the five stay different. */
function giveRole(places: DraftPlace[], at: number, role: PlaceRole): DraftPlace[] {
  const target = places[at]
  if (!target || target.role === role) return places
  return places.map((place, index) =>
    index === at
      ? { ...place, role }
      : place.role === role
        ? { ...place, role: target.role }
        : place,
  )
}

function fill(places: DraftPlace[], shadeIds: readonly (string | null)[]): DraftPlace[] {
  const used = new Set(places.map(({ shadeId }) => shadeId))
  let changed = false
  const filled = places.map((place, at) => {
    const shadeId = shadeIds[at] ?? null
    if (place.shadeId !== null || place.locked || shadeId === null || used.has(shadeId)) {
      return place
    }
    used.add(shadeId)
    changed = true
    return { ...place, shadeId }
  })
  return changed ? filled : places
}
