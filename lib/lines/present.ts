import type { Line } from '@/models'

import { YARN_WEIGHTS } from './constants'
import type { CreateLineValues } from './schema'

/** Yards in a metre. @source International yard and pound agreement, 1959: 1 yd = 0.9144 m */
const YARDS_PER_METRE = 1 / 0.9144
/** Ounces in a gram. @source the same: 1 lb = 453.59237 g, 16 oz to the pound */
const OUNCES_PER_GRAM = 16 / 453.59237

/** A line as the studio shows it. */
export interface LineView {
  id: string
  slug: string
  name: string
  version: number
  shadesRevision: number
  /** "70 % wool, 30 % silk". */
  fibreContent: string
  /** "100 g (3.5 oz)". */
  weight: string
  /** "225 m (246 yd)". */
  length: string
  /** "Light (3), 3-ply". */
  yarn: string
  /** "22 stitches and 30 rows to 10 cm on 4 mm". */
  gauge: string
  /** "£21.50". */
  price: string
  /** "20 March 2027", or null while undecided. */
  launchDate: string | null
  /** The form's values as they stand. */
  values: Omit<CreateLineValues, 'requestKey'>
}

const longDate = new Intl.DateTimeFormat('en-GB', { dateStyle: 'long', timeZone: 'UTC' })
const twoPlaces = (value: number) => Number(value.toFixed(2)).toString()

/** A line row as its view. */
export function presentLine(line: Line): LineView {
  const metres = line.lengthUnit === 'm' ? line.length : line.length / YARDS_PER_METRE
  return {
    id: line.id,
    slug: line.slug,
    name: line.name,
    version: line.version,
    shadesRevision: line.shadesRevision,
    fibreContent: line.fibres.map(({ fibre, percent }) => `${percent} % ${fibre}`).join(', '),
    weight: `${twoPlaces(line.netGrams)} g (${(line.netGrams * OUNCES_PER_GRAM).toFixed(1)} oz)`,
    length: `${Math.round(metres)} m (${Math.round(metres * YARDS_PER_METRE)} yd)`,
    yarn: `${YARN_WEIGHTS[line.weightNumber]} (${line.weightNumber}), ${line.ply}-ply`,
    gauge: `${twoPlaces(line.gaugeStitches)} stitches and ${twoPlaces(line.gaugeRows)} rows to 10 cm on ${twoPlaces(line.needleMm)} mm`,
    price: new Intl.NumberFormat('en-GB', { style: 'currency', currency: line.currency }).format(
      line.priceMinor / 100,
    ),
    launchDate: line.launchDate && longDate.format(new Date(line.launchDate)),
    values: {
      name: line.name,
      fibres: line.fibres,
      ply: line.ply,
      weightNumber: line.weightNumber,
      netGrams: line.netGrams,
      length: line.length,
      lengthUnit: line.lengthUnit,
      needleMm: line.needleMm,
      gaugeStitches: line.gaugeStitches,
      gaugeRows: line.gaugeRows,
      currency: line.currency as CreateLineValues['currency'],
      price: line.priceMinor / 100,
      launchDate: line.launchDate ?? '',
    },
  }
}

/** A line's place in the left margin: itself, its sisters, and the chapters this role may open. */
export interface LineChapters {
  line: { name: string; href: string }
  lines: { name: string; href: string }[]
  chapters: { label: string; href: string; note: string }[]
}

/** The chapters of a line with how much stands in each. @param lines all lines of the brand */
export function presentChapters(
  brandSlug: string,
  line: Pick<Line, 'slug' | 'name'>,
  lines: readonly Pick<Line, 'slug' | 'name'>[],
  counts: {
    shades: number
    photographs?: number
    combinations?: number
    names?: number
    kits?: number
  },
): LineChapters {
  const hrefOf = (slug: string) => `/${brandSlug}/lines/${slug}`
  const home = hrefOf(line.slug)
  const chapters = [
    { label: 'Shades', at: 'shades', count: counts.shades },
    { label: 'Photographs', at: 'photographs', count: counts.photographs },
    { label: 'Combinations', at: 'combinations', count: counts.combinations },
    { label: 'Names', at: 'names', count: counts.names },
    { label: 'Kits', at: 'kits', count: counts.kits },
  ]
  return {
    line: { name: line.name, href: home },
    lines: lines.map(({ slug, name }) => ({ name, href: hrefOf(slug) })),
    chapters: chapters
      .filter(({ count }) => count !== undefined)
      .map(({ label, at, count }) => ({ label, href: `${home}/${at}`, note: String(count) })),
  }
}
