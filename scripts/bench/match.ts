import { existsSync, readdirSync, readFileSync } from 'node:fs'
import path from 'node:path'

import { Vibrant } from 'node-vibrant/node'

import { deltaE00 } from '@/lib/color/ciede2000'
import { isMatch, matchPhotograph, type Match, type MatchShade } from '@/lib/color/match'
import { readPhotographColors, type PhotographColors } from '@/lib/color/photograph-colors'
import { solveChoice } from '@/lib/color/solve'
import { srgbToLab } from '@/lib/color/srgb'
import type { Lab } from '@/lib/color/types'
import { decodePhotograph } from '@/lib/photographs/decode'
import sharp from '@/lib/photographs/sharp'
import { warmUpReading } from '@/lib/photographs/warm-up'

import type { Figure } from './index'
import { dyedLine, seededRandom } from './line'
import { bruteForce, randomChoice } from './random-choice'

const FOLDER = '/usr/share/backgrounds/mate'

interface Photograph {
  name: string
  bytes: Buffer
  megapixels: number
  colors: PhotographColors
}

const median = (values: number[]): number => {
  const sorted = [...values].sort((a, b) => a - b)
  const half = sorted.length >> 1
  return sorted.length % 2 ? sorted[half]! : (sorted[half - 1]! + sorted[half]!) / 2
}
const mean = (values: number[]): number => values.reduce((a, b) => a + b, 0) / values.length
const ms = (value: number): string => `${value.toFixed(value < 100 ? 1 : 0)} ms`

async function timed<T>(work: () => T | Promise<T>): Promise<[result: T, ms: number]> {
  const started = performance.now()
  const result = await work()
  return [result, performance.now() - started]
}

function trueFive(colors: PhotographColors, line: readonly MatchShade[]): Match {
  const match = matchPhotograph(colors, line, 'true')
  if (!isMatch(match)) throw new Error(match.unavailable)
  return match
}

/**
 * The photographs of Debian's mate-backgrounds: the JPEGs of nature/ and abstract/. Its PNGs and
 * desktop/ are drawn graphics.
 */
async function photographs(): Promise<Photograph[]> {
  const names = ['nature', 'abstract'].flatMap((folder) =>
    existsSync(path.join(FOLDER, folder))
      ? readdirSync(path.join(FOLDER, folder))
          .filter((name) => name.endsWith('.jpg'))
          .sort()
          .map((name) => path.join(folder, name))
      : [],
  )
  if (names.length === 0)
    throw new Error(`No photographs in ${FOLDER}: apt-get install mate-backgrounds`)
  const read: Photograph[] = []
  for (const name of names) {
    const bytes = readFileSync(path.join(FOLDER, name))
    const { image, width, height } = await decodePhotograph(bytes)
    const colors = readPhotographColors(image)
    read.push({ name: path.basename(name), bytes, megapixels: (width * height) / 1e6, colors })
  }
  return read
}

/** Proofs and their time; each photograph's is the median of five. */
async function proofs(
  photos: Photograph[],
  sizes: number[],
  bar: { median: number; worst: number },
): Promise<Figure> {
  const times: number[] = []
  let certified = 0
  for (const size of sizes) {
    const line = dyedLine(size)
    for (const { colors } of photos) {
      const runs: number[] = []
      for (let run = 0; run < 5; run++) {
        const [match, took] = await timed(() => trueFive(colors, line))
        runs.push(took)
        if (run === 0 && match.certified) certified++
      }
      times.push(median(runs))
    }
  }
  const worst = Math.max(...times)
  return {
    what: `certified optimum, ${sizes.join(', ')} shades`,
    value: `${certified} of ${times.length}; median ${ms(median(times))}, worst ${ms(worst)}`,
    bar: `every one; median ≤ ${bar.median} ms, worst ≤ ${bar.worst} ms`,
    met: certified === times.length && median(times) <= bar.median && worst <= bar.worst,
  }
}

function againstBruteForce(): Figure {
  const random = seededRandom(2026)
  const instances = 3000
  let differing = 0
  for (let n = 0; n < instances; n++) {
    const problem = randomChoice(random)
    const least = bruteForce(problem)
    const found = solveChoice(problem)
    const same = found ? found.certified && Math.abs(found.objective - least) <= 1e-9 : false
    if (found ? !same : least !== Infinity) differing++
  }
  return {
    what: 'equals brute force',
    value: `${differing} of ${instances} differ`,
    bar: 'none of 3000 differs',
    met: differing === 0,
  }
}

/** Ordinary files of 12 megapixels, beside those of the collection that are as large. */
async function largeFiles(photos: Photograph[]): Promise<{ name: string; bytes: Buffer }[]> {
  const large = photos.filter(({ megapixels }) => megapixels >= 12)
  const enlarged = photos.filter(({ name }) =>
    ['Dune.jpg', 'Garden.jpg', 'Storm.jpg'].includes(name),
  )
  return [
    ...large,
    ...(await Promise.all(
      enlarged.map(async ({ name, bytes }) => ({
        name: `${name} at 12 MP`,
        bytes: await sharp(bytes)
          .resize(4000, 3000, { fit: 'cover' })
          .jpeg({ quality: 88 })
          .toBuffer(),
      })),
    )),
  ]
}

async function decodeToResult(photos: Photograph[], line: MatchShade[]): Promise<Figure> {
  const ratios: number[] = []
  for (const { bytes } of await largeFiles(photos)) {
    const whole: number[] = []
    const alone: number[] = []
    for (let run = 0; run < 5; run++) {
      const [, sharpAlone] = await timed(() =>
        sharp(bytes).resize(320, 320, { fit: 'inside' }).raw().toBuffer(),
      )
      const [, all] = await timed(async () =>
        trueFive(readPhotographColors((await decodePhotograph(bytes)).image), line),
      )
      alone.push(sharpAlone)
      whole.push(all)
    }
    ratios.push(median(whole) / median(alone))
  }
  const worst = Math.max(...ratios)
  return {
    what: `decode to result, ≥ 12 MP, 48 shades (${ratios.length} files)`,
    value: `worst ${worst.toFixed(2)} × sharp alone, median ${median(ratios).toFixed(2)} ×`,
    bar: '≤ 1.5 ×',
    met: worst <= 1.5,
  }
}

/** node-vibrant's own swatches of a whole file, as shades of the line. */
async function vibrantFive(
  bytes: Buffer,
  lines: MatchShade[][],
): Promise<{ labs: Lab[][]; took: number }> {
  const [labs, took] = await timed(async () => {
    const palette = await Vibrant.from(bytes).getPalette()
    const swatches = Object.values(palette).flatMap((swatch) =>
      swatch ? [srgbToLab(swatch.r / 255, swatch.g / 255, swatch.b / 255)] : [],
    )
    return lines.map((line) =>
      swatches.map((swatch) => {
        let nearest = line[0]!
        for (const shade of line)
          if (deltaE00(swatch, shade.lab) < deltaE00(swatch, nearest.lab)) nearest = shade
        return nearest.lab
      }),
    )
  })
  return { labs, took }
}

const labsOf = (match: Match, line: readonly MatchShade[]): Lab[] =>
  match.places.map(({ shadeId }) => line.find(({ id }) => id === shadeId)!.lab)

const farness = ({ cells }: PhotographColors, labs: Lab[]): number =>
  cells.reduce(
    (sum, { lab, area }) => sum + area * Math.min(...labs.map((shade) => deltaE00(lab, shade))),
    0,
  )

/** What no five shades of the line can go below: mean ΔE00 alone minimised, without any wish. */
function leastFarness({ cells }: PhotographColors, line: readonly MatchShade[]): number {
  const options = line.length
  const cost = new Float64Array(options * cells.length)
  line.forEach(({ lab }, s) =>
    cells.forEach((cell, i) => {
      cost[s * cells.length + i] = cell.area * deltaE00(lab, cell.lab)
    }),
  )
  return solveChoice({
    cells: cells.length,
    options,
    cost,
    unary: new Float64Array(options),
    conflicts: new Uint8Array(options * options),
    count: 5,
    locked: [],
    excluded: [],
  })!.objective
}

async function againstVibrant(
  photos: Photograph[],
  lines: [MatchShade[], MatchShade[]],
): Promise<Figure[]> {
  const ratios: [number[], number[]] = [[], []]
  const floors: [number[], number[]] = [[], []]
  const speeds: number[] = []
  for (const { bytes, colors, megapixels } of photos) {
    const vibrant = await vibrantFive(bytes, lines)
    lines.forEach((line, at) => {
      const theirs = farness(colors, vibrant.labs[at]!)
      ratios[at]!.push(farness(colors, labsOf(trueFive(colors, line), line)) / theirs)
      floors[at]!.push(leastFarness(colors, line) / theirs)
    })
    if (megapixels >= 4) {
      const runs: number[] = []
      for (let run = 0; run < 3; run++) {
        const [, took] = await timed(async () =>
          trueFive(readPhotographColors((await decodePhotograph(bytes)).image), lines[0]),
        )
        runs.push(took)
      }
      speeds.push(vibrant.took / median(runs))
    }
  }
  const figure = (at: 0 | 1, bar: number): Figure => ({
    what: `ΔE00 against node-vibrant’s nearest shades, ${lines[at].length} shades`,
    value: `mean ratio ${mean(ratios[at]).toFixed(3)} (any five: ≥ ${mean(floors[at]).toFixed(3)}), worst ${Math.max(...ratios[at]).toFixed(3)}`,
    bar: `mean ≤ ${bar}, none over 1.02`,
    met: mean(ratios[at]) <= bar && Math.max(...ratios[at]) <= 1.02,
  })
  return [
    figure(0, 0.76),
    figure(1, 0.68),
    {
      what: `faster than node-vibrant, ≥ 4 MP (${speeds.length} files)`,
      value: `least ${Math.min(...speeds).toFixed(1)} ×, median ${median(speeds).toFixed(1)} ×`,
      bar: '≥ 8 ×',
      met: Math.min(...speeds) >= 8,
    },
  ]
}

function toldApart(photos: Photograph[], line: MatchShade[]): Figure {
  const least = photos.map(({ colors }) => {
    const labs = labsOf(trueFive(colors, line), line)
    return Math.min(...labs.flatMap((a, i) => labs.slice(i + 1).map((b) => deltaE00(a, b))))
  })
  return {
    what: 'five different shades, 48 shades',
    value: `nearest pair of any photograph ΔE00 ${Math.min(...least).toFixed(1)}`,
    bar: 'every pair ≥ 10, every photograph',
    met: Math.min(...least) >= 10,
  }
}

/** Mean ΔE00 between two fives, paired as well as they can be. */
function shift(a: Lab[], b: Lab[]): number {
  if (a.length === 0) return 0
  const [first, ...others] = a
  return Math.min(
    ...b.map(
      (lab, at) =>
        deltaE00(first!, lab) +
        shift(
          others,
          b.filter((_, i) => i !== at),
        ),
    ),
  )
}

async function steadiness(photos: Photograph[], line: MatchShade[]): Promise<Figure[]> {
  const copies = {
    'half-size': (bytes: Buffer, width: number) =>
      sharp(bytes)
        .resize(Math.round(width / 2))
        .jpeg({ quality: 90 })
        .toBuffer(),
    'quality-60': (bytes: Buffer) => sharp(bytes).jpeg({ quality: 60 }).toBuffer(),
  }
  const figures: Figure[] = []
  for (const [name, copy] of Object.entries(copies)) {
    const shifts: number[] = []
    for (const { bytes, colors } of photos) {
      const { width } = await sharp(bytes).metadata()
      const { image } = await decodePhotograph(await copy(bytes, width))
      const own = labsOf(trueFive(colors, line), line)
      const other = labsOf(trueFive(readPhotographColors(image), line), line)
      shifts.push(shift(own, other) / own.length)
    }
    figures.push({
      what: `shift of the five for a ${name} copy, 48 shades`,
      value: `mean ΔE00 ${mean(shifts).toFixed(2)}, worst ${Math.max(...shifts).toFixed(2)}`,
      bar: 'mean ≤ 1',
      met: mean(shifts) <= 1,
    })
  }
  return figures
}

/** The figures of the match, over real photographs and seeded lines; see DEVELOPERS.md. */
export async function benchMatch(): Promise<Figure[]> {
  await warmUpReading()
  const photos = await photographs()
  const line48 = dyedLine(48)
  const line500 = dyedLine(500)
  console.log(`${photos.length} photographs of mate-backgrounds (nature/*.jpg, abstract/*.jpg)`)
  return [
    await proofs(photos, [24, 48, 60], { median: 10, worst: 50 }),
    await proofs(photos, [500], { median: 90, worst: 500 }),
    againstBruteForce(),
    await decodeToResult(photos, line48),
    ...(await againstVibrant(photos, [line48, line500])),
    toldApart(photos, line48),
    ...(await steadiness(photos, line48)),
  ]
}
