import { Vibrant } from 'node-vibrant/node'

import { deltaE00 } from '@/lib/color/ciede2000'
import { DEFAULT_APART, type MatchShade } from '@/lib/color/match'
import type { PhotographColors } from '@/lib/color/photograph-colors'
import { solveChoice } from '@/lib/color/solve'
import { srgbToLab } from '@/lib/color/srgb'
import type { Lab } from '@/lib/color/types'

import type { Figure } from '../lib/figures.mjs'
import { labsOf, mean, median, medianTimes } from './measure'
import { matchFile, shrinkAlone, trueFive, type Photograph } from './photographs'

/** node-vibrant's swatches of a whole file as it comes: up to six, at its own settings. */
async function swatchesOf(bytes: Buffer): Promise<Lab[]> {
  const palette = await Vibrant.from(bytes).getPalette()
  return Object.values(palette).flatMap((swatch) =>
    swatch ? [srgbToLab(swatch.r / 255, swatch.g / 255, swatch.b / 255)] : [],
  )
}

/** Each swatch as the shade nearest to it; two that are nearest to one shade are one. */
function nearestShades(swatches: Lab[], line: readonly MatchShade[]): Lab[] {
  const nearest = swatches.map((swatch) => {
    const far = line.map(({ lab }) => deltaE00(swatch, lab))
    return line[far.indexOf(Math.min(...far))]!.lab
  })
  return [...new Set(nearest)]
}

/** Mean ΔE00 by area from a photograph's cells to the nearest of these shades. */
const farness = ({ cells }: PhotographColors, labs: Lab[]): number =>
  cells.reduce(
    (sum, { lab, area }) => sum + area * Math.min(...labs.map((shade) => deltaE00(lab, shade))),
    0,
  )

/**
 * What no five shades of the line can go below that stand `apart` from each other: mean ΔE00 alone
 * minimised, without any wish besides.
 */
function leastFarness({ cells }: PhotographColors, line: readonly MatchShade[], apart = 0): number {
  const options = line.length
  const cost = new Float64Array(options * cells.length)
  line.forEach(({ lab }, s) =>
    cells.forEach((cell, i) => {
      cost[s * cells.length + i] = cell.area * deltaE00(lab, cell.lab)
    }),
  )
  const conflicts = new Uint8Array(options * options)
  line.forEach((one, a) =>
    line.forEach((other, b) => {
      if (a !== b && deltaE00(one.lab, other.lab) < apart) conflicts[a * options + b] = 1
    }),
  )
  return solveChoice({
    cells: cells.length,
    options,
    cost,
    unary: new Float64Array(options),
    conflicts,
    count: 5,
    locked: [],
    excluded: [],
  })!.objective
}

/** One photograph against one size of line: means over the lines, as ratios to node-vibrant. */
interface Ratio {
  ours: number
  /** In the one line where it is worst. */
  worst: number
  /** The same match without “apart”. */
  apartFree: number
  /** The least that any five shades reach. */
  floor: number
  /** Different shades that node-vibrant comes to. */
  shades: number
}

function ratioOf(colors: PhotographColors, swatches: Lab[], lines: MatchShade[][]): Ratio {
  const each = lines.map((line) => {
    const nearest = nearestShades(swatches, line)
    const theirs = farness(colors, nearest)
    const ours = (apart?: number) =>
      farness(colors, labsOf(trueFive(colors, line, apart), line)) / theirs
    return {
      ours: ours(),
      apartFree: ours(0),
      floor: leastFarness(colors, line) / theirs,
      shades: nearest.length,
    }
  })
  const over = (key: 'ours' | 'apartFree' | 'floor' | 'shades') => mean(each.map((one) => one[key]))
  return {
    ours: over('ours'),
    worst: Math.max(...each.map(({ ours }) => ours)),
    apartFree: over('apartFree'),
    floor: over('floor'),
    shades: over('shades'),
  }
}

const two = (value: number) => value.toFixed(2)
const three = (value: number) => value.toFixed(3)

/** The least mean, over the lines, that any five reach which stand as far apart as ours must. */
function leastApart({ colors, bytes }: Photograph, lines: MatchShade[][]): Promise<number> {
  return swatchesOf(bytes).then((swatches) =>
    mean(
      lines.map(
        (line) =>
          leastFarness(colors, line, DEFAULT_APART) /
          farness(colors, nearestShades(swatches, line)),
      ),
    ),
  )
}

/** How near the five come beside node-vibrant's, over several lines of one size. */
async function nearness(
  photos: Photograph[],
  lines: MatchShade[][],
  bar: number,
): Promise<Figure[]> {
  const size = lines[0]!.length
  const rows: { photo: Photograph; ratio: Ratio }[] = []
  const without: string[] = []
  for (const photo of photos) {
    const swatches = await swatchesOf(photo.bytes)
    if (swatches.length === 0) without.push(photo.name)
    else rows.push({ photo, ratio: ratioOf(photo.colors, swatches, lines) })
  }
  console.log(`\nMean ΔE00 against node-vibrant, ${size} shades, mean of ${lines.length} lines`)
  for (const { photo, ratio } of rows)
    console.log(
      `  ${photo.name.padEnd(46)} ${two(ratio.ours)}  worst line ${two(ratio.worst)}  apart 0 ${two(ratio.apartFree)}  any five ≥ ${two(ratio.floor)}  its shades ${ratio.shades.toFixed(1)}`,
    )
  if (without.length > 0)
    console.log(`  no ratio, node-vibrant finds no colour: ${without.join(', ')}`)
  const of = (group: Photograph['group'] | null, key: keyof Ratio) =>
    mean(rows.filter(({ photo }) => !group || photo.group === group).map(({ ratio }) => ratio[key]))
  const worst = rows.reduce((a, b) => (b.ratio.ours > a.ratio.ours ? b : a))
  const least = await leastApart(worst.photo, lines)
  return [
    {
      what: `ΔE00 against node-vibrant’s nearest, ${size} shades (${rows.length} pictures)`,
      value: `mean ratio ${three(of(null, 'ours'))}: photographs ${three(of('photograph', 'ours'))}, drawn ${three(of('drawn', 'ours'))}; any five ≥ ${three(of(null, 'floor'))}`,
      bar: `mean ≤ ${bar}`,
      met: of(null, 'floor') > bar ? 'out of reach' : of(null, 'ours') <= bar,
    },
    {
      what: `  of which “apart” and “presence” cost, ${size} shades`,
      value: `${(100 * (of(null, 'ours') / of(null, 'floor') - 1)).toFixed(1)} % over the nearest five of all`,
      bar: '≤ 6 % (our own bar)',
      met: of(null, 'ours') / of(null, 'floor') <= 1.06,
    },
    {
      what: `  the worst picture, ${size} shades`,
      value: `${worst.photo.name} ${three(worst.ratio.ours)}, any five so far apart ≥ ${three(least)}; any in one line ${three(Math.max(...rows.map(({ ratio }) => ratio.worst)))}`,
      bar: 'none over 1.02',
      met: least > 1.02 ? 'out of reach' : worst.ratio.ours <= 1.02,
    },
  ]
}

async function speed(photos: Photograph[], line: MatchShade[]): Promise<Figure> {
  const ratios: number[] = []
  const bound: number[] = []
  console.log('\nTimes as long as a match of 48 shades that node-vibrant takes, ≥ 4 MP')
  for (const { name, bytes, megapixels } of photos) {
    if (megapixels < 4) continue
    const vibrant = async () => nearestShades(await swatchesOf(bytes), line)
    const match = () => matchFile(bytes, line)
    const times = await medianTimes([vibrant, match, () => shrinkAlone(bytes)], 7)
    const [theirs, ours, alone] = times as [number, number, number]
    // Where even sharp alone is not 8 times as fast, the bar is to add next to nothing to it.
    if (theirs / alone < 8) bound.push(ours / alone)
    else ratios.push(theirs / ours)
    console.log(
      `  ${name.padEnd(46)} ${(theirs / ours).toFixed(1)}  (sharp alone would be ${(theirs / alone).toFixed(1)})`,
    )
  }
  return {
    what: `faster than node-vibrant, ≥ 4 MP (${ratios.length} files; ${bound.length} that sharp alone cannot)`,
    value: `least ${Math.min(...ratios).toFixed(1)} ×, median ${median(ratios).toFixed(1)} ×; those ${Math.max(...bound).toFixed(2)} × sharp alone`,
    bar: '≥ 8 ×; those ≤ 1.1 ×',
    met: Math.min(...ratios) >= 8 && Math.max(0, ...bound) <= 1.1,
  }
}

/** The five beside what node-vibrant's swatches come to in the same line. */
export async function againstVibrant(
  photos: Photograph[],
  lines48: MatchShade[][],
  lines500: MatchShade[][],
): Promise<Figure[]> {
  return [
    ...(await nearness(photos, lines48, 0.76)),
    ...(await nearness(photos, lines500, 0.68)),
    await speed(photos, lines48[0]!),
  ]
}
