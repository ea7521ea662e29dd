import { deltaE00 } from '@/lib/color/ciede2000'
import type { MatchShade } from '@/lib/color/match'
import { readPhotographColors } from '@/lib/color/photograph-colors'
import { solveChoice } from '@/lib/color/solve'
import type { Lab } from '@/lib/color/types'
import { decodePhotograph } from '@/lib/photographs/decode'
import sharp from '@/lib/photographs/sharp'
import { warmUpReading } from '@/lib/photographs/warm-up'

import type { Figure } from '../lib/figures.mjs'
import { dyedLine, seededRandom } from './line'
import { labsOf, mean, median, ms, timed, medianTimes } from './measure'
import { matchFile, photographs, shrinkAlone, trueFive, type Photograph } from './photographs'
import { bruteForce, randomChoice } from './random-choice'
import { againstVibrant } from './vibrant'

/** One line is one draw of luck: what is a mean is taken over a line of each. */
const SEEDS = [1, 2, 3, 4, 5]

/** Proofs and their time; each photograph's is the median of five. */
async function proofs(
  photos: Photograph[],
  sizes: number[],
  bar: { median: number; worst: number },
): Promise<Figure> {
  const times: number[] = []
  let certified = 0
  for (const size of sizes) {
    const line = dyedLine(size, SEEDS[0])
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

/** How strong the grain of an enlarged copy is: at 12 megapixels it comes to 2 to 3 MB a file. */
const GRAIN = 18

/**
 * Files of 12 megapixels and more: those that are so large, and enlarged copies, to which grain is
 * added. Without it a copy holds next to nothing to decode, as no camera's picture does.
 */
async function largeFiles(photos: Photograph[]): Promise<{ name: string; bytes: Buffer }[]> {
  const files = photos
    .filter(({ megapixels }) => megapixels >= 12)
    .map(({ name, bytes }) => ({ name, bytes }))
  const size = { width: 4000, height: 3000 }
  const noise = { type: 'gaussian', mean: 128, sigma: GRAIN } as const
  const grain = await sharp({ create: { ...size, channels: 3, background: '#808080', noise } })
    .png({ compressionLevel: 0 })
    .toBuffer()
  for (const { name, bytes } of photos) {
    if (!['nature/Dune.jpg', 'nature/Garden.jpg', 'nature/Storm.jpg'].includes(name)) continue
    const large = sharp(bytes)
      .resize({ ...size, fit: 'cover' })
      .composite([{ input: grain, blend: 'soft-light' }])
      .jpeg({ quality: 88 })
    files.push({ name: `${name} enlarged`, bytes: await large.toBuffer() })
  }
  return files
}

async function decodeToResult(photos: Photograph[], line: MatchShade[]): Promise<Figure> {
  const files = await largeFiles(photos)
  const ratios: number[] = []
  console.log('\nDecode to result, times as long as sharp alone')
  for (const { name, bytes } of files) {
    const [whole, alone] = await medianTimes(
      [() => matchFile(bytes, line), () => shrinkAlone(bytes)],
      9,
    )
    const ratio = whole! / alone!
    ratios.push(ratio)
    console.log(`  ${name.padEnd(46)} ${ratio.toFixed(2)}  (${(bytes.length / 1e6).toFixed(1)} MB)`)
  }
  const worst = Math.max(...ratios)
  return {
    what: `decode to result, ≥ 12 MP, 48 shades (${files.length} files)`,
    value: `worst ${worst.toFixed(2)} × sharp alone`,
    bar: '≤ 1.5 ×',
    met: worst <= 1.5,
  }
}

function toldApart(photos: Photograph[], lines: MatchShade[][]): Figure {
  const least = lines.flatMap((line) =>
    photos.map(({ colors }) => {
      const labs = labsOf(trueFive(colors, line), line)
      return Math.min(...labs.flatMap((a, i) => labs.slice(i + 1).map((b) => deltaE00(a, b))))
    }),
  )
  return {
    what: `five different shades, 48 shades (${lines.length} lines)`,
    value: `nearest pair of any picture ΔE00 ${Math.min(...least).toFixed(1)}`,
    bar: 'every pair ≥ 10, every picture',
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

async function steadiness(photos: Photograph[], lines: MatchShade[][]): Promise<Figure[]> {
  // WebP where something may be transparent, which a JPEG would fill with black.
  const copy = async (bytes: Buffer, { scale = 1, quality = 90 }) => {
    const { width, hasAlpha } = await sharp(bytes).metadata()
    const picture = sharp(bytes).resize(Math.round(width * scale))
    return (hasAlpha ? picture.webp({ quality }) : picture.jpeg({ quality })).toBuffer()
  }
  const copies = { 'half-size': { scale: 0.5 }, 'quality-60': { quality: 60 } }
  const figures: Figure[] = []
  for (const [name, how] of Object.entries(copies)) {
    const shifts = { photograph: [] as number[], drawn: [] as number[] }
    for (const { bytes, colors, group } of photos) {
      const { image } = await decodePhotograph(await copy(bytes, how))
      const copied = readPhotographColors(image)
      for (const line of lines) {
        const own = labsOf(trueFive(colors, line), line)
        shifts[group].push(shift(own, labsOf(trueFive(copied, line), line)) / own.length)
      }
    }
    const means = [mean(shifts.photograph), mean(shifts.drawn)]
    figures.push({
      what: `shift of the five for a ${name} copy, 48 shades (${lines.length} lines)`,
      value: `mean ΔE00: photographs ${means[0]!.toFixed(2)}, drawn ${means[1]!.toFixed(2)}; worst ${Math.max(...shifts.photograph, ...shifts.drawn).toFixed(2)}`,
      bar: 'mean ≤ 1, either',
      met: means.every((value) => value <= 1),
    })
  }
  return figures
}

/** The figures of the match, over real pictures and seeded lines; see DEVELOPERS.md. */
export async function benchMatch(): Promise<Figure[]> {
  await warmUpReading()
  const photos = await photographs()
  const lines48 = SEEDS.map((seed) => dyedLine(48, seed))
  const lines500 = SEEDS.map((seed) => dyedLine(500, seed))
  return [
    await proofs(photos, [24, 48, 60], { median: 10, worst: 50 }),
    await proofs(photos, [500], { median: 90, worst: 500 }),
    againstBruteForce(),
    await decodeToResult(photos, lines48[0]!),
    ...(await againstVibrant(photos, lines48, lines500)),
    toldApart(photos, lines48),
    ...(await steadiness(photos, lines48)),
  ]
}
