import type { DraftPlace } from '@/components/combinations/draft'
import type { ShadeOf } from '@/components/combinations/shade-of'
import type { Clash, ClashKind } from '@/lib/color/clashes'
import type { Related, RelationKind } from '@/lib/color/relations'
import type { ShadeView } from '@/lib/shades/present'

const listed = new Intl.ListFormat('en-GB', { type: 'conjunction' })

/** "Fern", "Fern and Moss", "Fern, Moss and Tarn". */
export const inList = (names: readonly string[]): string => listed.format(names)

/** What stands in each of the five places. */
export const shadesIn = (places: readonly DraftPlace[], shadeOf: ShadeOf): (ShadeView | null)[] =>
  places.map(({ shadeId }) => shadeOf(shadeId))

/** What clashes are called, and what they mean for the work. */
export const CLASH_WORDS: Record<ClashKind, { name: string; means: string }> = {
  twins: {
    name: 'Near-twins',
    means: 'In the cloth they are one colour, and beside each other a mistake.',
  },
  muddy: {
    name: 'Muddy in value',
    means: 'As light as each other: a motif in these two does not read from across a room.',
  },
  protan: { name: 'Lost to protan vision', means: 'Who lacks long-wave cones sees one colour.' },
  deutan: { name: 'Lost to deutan vision', means: 'Who lacks middle-wave cones sees one colour.' },
  tritan: { name: 'Lost to tritan vision', means: 'Who lacks short-wave cones sees one colour.' },
}

/** A clash seen from one of its places: "near-twin of Fern". */
export function clashFrom(place: number, { kind, first, second }: Clash, nameOf: NameOf): string {
  const other = nameOf(first === place ? second : first)
  switch (kind) {
    case 'twins':
      return `near-twin of ${other}`
    case 'muddy':
      return `muddy with ${other}`
    default:
      return `lost beside ${other} to ${kind} vision`
  }
}

/** What stands in a place, by name. */
export type NameOf = (place: number) => string

/** The relations as choices. */
export const RELATION_LABELS: Record<RelationKind, { label: string; hint: string }> = {
  near: { label: 'Near hues', hint: 'Neighbours on the hue circle, turning as they darken' },
  opposite: { label: 'Opposite hues', hint: 'Two sides of the hue circle, across from each other' },
  family: { label: 'One family', hint: 'One hue from light to dark' },
  'three-way': { label: 'Three-way', hint: 'Three hues, a third of the circle apart' },
}

/** Why these five belong together. */
export function relationInWords({ kind, places }: Related, nameOf: NameOf): string {
  const sides: string[][] = []
  places.forEach(({ side }, at) => (sides[side] ??= []).push(nameOf(at)))
  switch (kind) {
    case 'near':
      return 'Five neighbours on the hue circle: the hue turns as the shades darken, step by step.'
    case 'family':
      return 'One hue from light to dark, in steps as even as the line allows.'
    case 'opposite':
      return `${inList(sides[0] ?? [])} on one side of the hue circle, ${inList(sides[1] ?? [])} across from ${(sides[0] ?? []).length > 1 ? 'them' : 'it'}.`
    case 'three-way':
      return `Three hues a third of the circle apart: ${sides.map(inList).join('; ')}.`
  }
}

/** Who stands off the hue asked of it, worst first; null when nobody does to speak of. */
export function strainInWords({ strained, places }: Related, nameOf: NameOf): string | null {
  if (!strained) return null
  const [worst] = places
    .map(({ hueOff }, at) => ({ at, hueOff: hueOff ?? 0 }))
    .sort((a, b) => b.hueOff - a.hueOff)
  return `${nameOf(worst!.at)} stands ${Math.round(worst!.hueOff)}° off its hue: with what is in place, the line has no better.`
}
