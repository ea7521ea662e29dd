import { deltaE00 } from '@/lib/color/ciede2000'
import {
  bookPlace,
  cutHues,
  hueDistance,
  isNeutral,
  meanHue,
  sortFamilies,
} from '@/lib/color/families'
import { nameFamilies } from '@/lib/color/family-names'
import { labToOklch } from '@/lib/color/oklch'
import type { Lab } from '@/lib/color/types'

/** A family as an arrangement holds it; its place is that in the list. */
export interface ArrangedFamily {
  id: string
  name: string
  /** A person gave the name; no computation changes it. */
  nameGiven: boolean
  neutral: boolean
}

/** A shade as an arrangement holds it. */
export interface ArrangedShade {
  id: string
  number: string
  name: string | null
  lab: Lab
  /** Null before it was placed. */
  familyId: string | null
  /** A person put it where it is; no computation moves it. */
  pinned: boolean
  /** Place in the order people gave its family; null where it goes by lightness. */
  position: number | null
}

/** The families of a line, in order, and which shade stands where. */
export interface Arrangement {
  families: readonly ArrangedFamily[]
  shades: readonly ArrangedShade[]
}

/** What gives new families their ids. */
export type MakeId = () => string

/** The shades of a family as the sample book shows them: in the given order, else light to dark. */
export const shadesOf = ({ shades }: Arrangement, familyId: string): ArrangedShade[] =>
  shades
    .filter((shade) => shade.familyId === familyId)
    .sort(
      (one, other) =>
        (one.position ?? Infinity) - (other.position ?? Infinity) ||
        other.lab[0] - one.lab[0] ||
        one.id.localeCompare(other.id),
    )

/** The same arrangement without families in which no shade stands. */
export function withoutEmpty({ families, shades }: Arrangement): Arrangement {
  const held = new Set(shades.map(({ familyId }) => familyId))
  return { families: families.filter(({ id }) => held.has(id)), shades }
}

/** The same arrangement with some shades in another family, where they go by lightness. */
export function withMoved(
  { families, shades }: Arrangement,
  shadeIds: ReadonlySet<string>,
  familyId: string,
  pinned?: boolean,
): Arrangement {
  return {
    families,
    shades: shades.map((shade) => {
      if (!shadeIds.has(shade.id)) return shade
      const position = shade.familyId === familyId ? shade.position : null
      return { ...shade, familyId, position, pinned: pinned ?? shade.pinned }
    }),
  }
}

/** The same arrangement with names from their colours for these families. */
export function withNames(
  { families, shades }: Arrangement,
  isNamed: (family: ArrangedFamily) => boolean,
): Arrangement {
  const named = families.filter(isNamed)
  const names = nameFamilies(
    named.map(({ id, neutral }) => ({
      neutral,
      labs: shades.filter(({ familyId }) => familyId === id).map(({ lab }) => lab),
    })),
    families.filter((family) => !isNamed(family)).map(({ name }) => name),
  )
  const byId = new Map(named.map(({ id }, at) => [id, names[at]!]))
  return {
    families: families.map((family) => ({ ...family, name: byId.get(family.id) ?? family.name })),
    shades,
  }
}

/** Neutral families first, the others round the hues. */
function byHue({ families, shades }: Arrangement): ArrangedFamily[] {
  const place = new Map(
    families.map(({ id, neutral }) => {
      const colors = shades
        .filter((shade) => shade.familyId === id)
        .map(({ lab }) => labToOklch(lab))
      return [id, neutral ? -1 : bookPlace(meanHue(colors) ?? 0)]
    }),
  )
  return [...families].sort((one, other) => place.get(one.id)! - place.get(other.id)!)
}

/**
 * Sorts a line into families anew. Pinned shades stay in their family and are left out of the cut;
 * the others are sorted at the optimum. Each new family is the former one with which it shares most
 * shades, if any: it keeps that one's id, and its name if a person gave it. Where it shares
 * none, or as many with two, the pinned shades nearest to it in hue decide.
 * @param count how many hue families; null chooses
 */
export function sortAnew(former: Arrangement, count: number | null, makeId: MakeId): Arrangement {
  const pinned = former.shades.filter(({ pinned: isPinned }) => isPinned)
  const free = former.shades.filter(({ pinned: isPinned }) => !isPinned)
  const sorted = sortFamilies(
    free.map(({ lab }) => lab),
    count,
  ).map(({ neutral, members }) => {
    const shades = members.map((at) => free[at]!)
    return { neutral, shades, hue: meanHue(shades.map(({ lab }) => labToOklch(lab))) }
  })

  const shared = sorted.map(({ shades }) => {
    const counts = new Map<string, number>()
    for (const { familyId } of shades) {
      if (familyId !== null) counts.set(familyId, (counts.get(familyId) ?? 0) + 1)
    }
    return counts
  })
  const claims = sorted.map(() => new Map<string, number>())
  for (const { lab, familyId } of pinned) {
    const color = labToOklch(lab)
    const nearest = sorted
      .map(({ neutral, hue }, at) => ({ neutral, at, off: hueDistance(hue ?? 0, color.h) }))
      .filter(({ neutral }) => neutral === isNeutral(color))
      .sort((one, other) => one.off - other.off)[0]
    if (!nearest || familyId === null) continue
    const counts = claims[nearest.at]!
    counts.set(familyId, (counts.get(familyId) ?? 0) + 1)
  }
  const pairs = sorted
    .flatMap(({ neutral }, at) =>
      former.families.flatMap((family, place) =>
        family.neutral === neutral
          ? [
              {
                at,
                family,
                place,
                shares: shared[at]!.get(family.id) ?? 0,
                claim: claims[at]!.get(family.id) ?? 0,
              },
            ]
          : [],
      ),
    )
    .filter(({ shares, claim }) => shares + claim > 0)
    .sort(
      (one, other) =>
        other.shares - one.shares ||
        other.claim - one.claim ||
        one.place - other.place ||
        one.at - other.at,
    )
  const heirs = new Map<number, ArrangedFamily>()
  const inherited = new Set<string>()
  for (const { at, family } of pairs) {
    if (heirs.has(at) || inherited.has(family.id)) continue
    heirs.set(at, family)
    inherited.add(family.id)
  }

  const found = sorted.map(
    ({ neutral }, at): ArrangedFamily =>
      heirs.get(at) ?? { id: makeId(), name: '', nameGiven: false, neutral },
  )
  const stands = new Map(
    sorted.flatMap(({ shades }, at) => shades.map(({ id }) => [id, found[at]!.id] as const)),
  )
  const held = new Set(pinned.map(({ familyId }) => familyId))
  const next: Arrangement = {
    families: [...found, ...former.families.filter(({ id }) => held.has(id) && !inherited.has(id))],
    shades: former.shades.map((shade) => {
      const familyId = stands.get(shade.id) ?? shade.familyId
      return familyId === shade.familyId ? shade : { ...shade, familyId, position: null }
    }),
  }
  const ordered = { families: byHue(next), shades: next.shades }
  return withNames(ordered, ({ nameGiven }) => !nameGiven)
}

/**
 * Places the shades that are in no family into that of their nearest shade (CIEDE2000). A line
 * without families is sorted whole.
 */
export function placeNew(arrangement: Arrangement, makeId: MakeId): Arrangement {
  const known = new Set(arrangement.families.map(({ id }) => id))
  const placed = arrangement.shades.filter(
    ({ familyId }) => familyId !== null && known.has(familyId),
  )
  if (placed.length === 0) return sortAnew({ ...arrangement, families: [] }, null, makeId)
  return {
    families: arrangement.families,
    shades: arrangement.shades.map((shade) => {
      if (shade.familyId !== null && known.has(shade.familyId)) return shade
      let nearest: { familyId: string | null; difference: number } | null = null
      for (const { lab, familyId } of placed) {
        const difference = deltaE00(shade.lab, lab)
        if (!nearest || difference < nearest.difference) nearest = { familyId, difference }
      }
      return { ...shade, familyId: nearest!.familyId, pinned: false, position: null }
    }),
  }
}

/**
 * Which shades of a family part from it when it is split in two: the smaller arc of its best cut in
 * hue; of neutrals, and of shades of one hue, the darker ones about the widest step of lightness.
 * Pinned shades stay. Empty when fewer than two shades could part.
 */
export function partOf(arrangement: Arrangement, family: ArrangedFamily): ArrangedShade[] {
  const shades = shadesOf(arrangement, family.id).sort((one, other) => other.lab[0] - one.lab[0])
  const free = shades.filter(({ pinned }) => !pinned)
  if (shades.length < 2 || free.length === 0) return []
  const hues = shades.map(({ lab }) => {
    const { h, c } = labToOklch(lab)
    return { h, weight: c }
  })
  const byHues = !family.neutral && new Set(hues.map(({ h }) => h)).size > 1
  let parts: ArrangedShade[][]
  if (byHues) {
    parts = cutHues(hues, 2).arcs.map((arc) => arc.map((at) => shades[at]!))
  } else {
    const steps = shades.slice(1).map(({ lab }, at) => shades[at]!.lab[0] - lab[0])
    const cut = steps.indexOf(Math.max(...steps)) + 1
    parts = [shades.slice(0, cut), shades.slice(cut)]
  }
  const parting = parts
    .map((part) => part.filter(({ pinned }) => !pinned))
    .filter((part) => part.length > 0 && part.length < shades.length)
    .sort((one, other) => one.length - other.length)
  return parting[0] ?? []
}
