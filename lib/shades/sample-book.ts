import { chromaOf, hueOf, type Lab } from '@/lib/color/types'

/** Below this C*ab a shade of yarn reads as white, grey, brown-grey or black. @source common practice */
const NEUTRAL_CHROMA = 8

/**
 * Where each hue family ends, in degrees of h*ab: families stand about the unique hues (red 24°,
 * yellow 90°, green 162°, blue 246°) and half-way between neighbours, and end half-way again.
 * @source unique hues in CIELAB as commonly given; the halving is common practice
 */
const HUE_FAMILIES: readonly (readonly [end: number, name: string])[] = [
  [40.5, 'Reds'],
  [73.5, 'Oranges and browns'],
  [108, 'Yellows'],
  [144, 'Yellow-greens'],
  [183, 'Greens'],
  [225, 'Turquoises'],
  [280.5, 'Blues'],
  [349.5, 'Violets'],
  [Infinity, 'Reds'],
]

/** The families of the sample book, in its order. */
export const BOOK_FAMILIES: readonly string[] = [
  'Neutrals',
  ...new Set(HUE_FAMILIES.map(([, name]) => name)),
]

/** The family a colour stands in. */
export function bookFamily(lab: Lab): string {
  if (chromaOf(lab) < NEUTRAL_CHROMA) return 'Neutrals'
  const hue = hueOf(lab)
  return HUE_FAMILIES.find(([end]) => hue < end)![1]
}

/**
 * The family of a row of shades as its place among BOOK_FAMILIES, in SQL. The index shades_book is
 * over this expression: one that is changed is right without it, and fast again with a new one.
 */
export const BOOK_FAMILY_SQL = `CASE
  WHEN lab_a * lab_a + lab_b * lab_b < ${NEUTRAL_CHROMA ** 2} THEN 0
  ${HUE_FAMILIES.slice(0, -1)
    .map(
      ([end, name]) =>
        `WHEN 180 + atan2d(-lab_b, -lab_a) < ${end} THEN ${BOOK_FAMILIES.indexOf(name)}`,
    )
    .join('\n  ')}
  ELSE ${BOOK_FAMILIES.indexOf(HUE_FAMILIES.at(-1)![1])} END`

/** Shades in book order, put together by family. */
export function bookGroups<T extends { lab: Lab }>(
  ordered: readonly T[],
): { family: string; shades: T[] }[] {
  const groups: { family: string; shades: T[] }[] = []
  for (const shade of ordered) {
    const family = bookFamily(shade.lab)
    const last = groups.at(-1)
    if (last?.family === family) last.shades.push(shade)
    else groups.push({ family, shades: [shade] })
  }
  return groups
}
