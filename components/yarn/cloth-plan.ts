import { hexToLab } from '@/lib/color/srgb'
import { shareOut, type Band } from './bands'
import { contrastOf, generateMotif, MOTIF_COLUMNS, seedOf } from './motif'

/** How many stitches a piece of knitting is wide, and how many rows long. */
export const KNIT = { columns: 24, rows: 40 } as const
/** How many rounds a crocheted square has. */
export const ROUNDS = 11
/** A piece of marled knitting: the yarns are held together, so its stitches are large. */
export const MARL = { columns: 14, rows: 19 } as const

/**
 * How far the part of the stitches that a yarn has may be from its share, since rows and rounds are
 * whole: about one row of knitting, or the second round of a square.
 */
export const SHARE_TOLERANCE = 0.03

/** A row of knitting: its yarn by index, and the stitches worked with a second one. */
export interface ClothRow {
  band: number
  contrast?: { band: number; columns: readonly number[] }
}

const plain = (band: number, count: number): ClothRow[] =>
  Array.from({ length: count }, () => ({ band }))

/** The shares brought to a sum of 1; equal ones when there is nothing to share by. */
function sharesOf(bands: readonly Band[]): number[] {
  const weights = bands.map(({ share }) => Math.max(0, share) || 0)
  const whole = weights.reduce((sum, weight) => sum + weight, 0)
  return weights.map((weight) => (whole > 0 ? weight / whole : 1 / bands.length))
}

/** Stripes as deep as the shares. */
export function stripeRows(bands: readonly Band[]): ClothRow[] {
  const counts = bands.length > 0 ? shareOut(bands, KNIT.rows, 1) : []
  return counts.flatMap((count, band) => plain(band, count))
}

/** The yarn of the largest share, and the one that stands out from it most in lightness. */
function strandedPair(bands: readonly Band[]): [number, number] {
  const shares = sharesOf(bands)
  const main = shares.indexOf(Math.max(...shares))
  const lightness = bands.map(({ hex }) => hexToLab(hex)[0])
  // A thread of a yarn is not enough to work a motif with, unless there is no other.
  const least = Math.min(0.1, ...shares.toSorted((a, b) => b - a).slice(1, 2))
  const others = shares.flatMap((share, band) => (band !== main && share >= least ? [band] : []))
  const far = (band: number) => Math.abs(lightness[band]! - lightness[main]!)
  return [main, others.reduce((best, band) => (far(band) > far(best) ? band : best))]
}

/**
 * A stranded band in two yarns between stripes of the others, mirrored about it as far as whole rows
 * go: the largest share and the one that differs most from it in lightness, since stranded knitting
 * is read by lightness. The band is as deep as both shares allow; its motif comes from the colours,
 * so that the same five always show the same one.
 */
export function strandedRows(bands: readonly Band[]): ClothRow[] {
  if (bands.length < 2) return stripeRows(bands)
  const rooms = sharesOf(bands).map((share) => share * KNIT.rows)
  const [main, contrast] = strandedPair(bands)
  const seed = seedOf(bands.map(({ hex }) => hex).join())
  const motif = generateMotif(seed, { contrast: rooms[contrast]!, ground: rooms[main]! }) ?? []
  const worked = motif.map((row): ClothRow => {
    const columns = Array.from({ length: KNIT.columns }, (_, column) => column)
    return {
      band: main,
      contrast: { band: contrast, columns: columns.filter((at) => row[at % MOTIF_COLUMNS]) },
    }
  })
  const inContrast = contrastOf(motif)
  rooms[contrast]! -= inContrast
  rooms[main]! -= motif.length - inContrast
  const counts = plainRows(rooms, KNIT.rows - motif.length, [main, contrast])
  // From the band outwards: its ground, the others, the contrast at the edge.
  const others = [...bands.keys()].filter((at) => at !== main && at !== contrast)
  const { above, below } = mirrored([main, ...others, contrast], counts)
  return [...above, ...worked, ...below]
}

/** Plain rows for what is left of each share; those not in the motif have one at least. */
function plainRows(rooms: readonly number[], total: number, inMotif: readonly number[]): number[] {
  const least = rooms.map((_, at) => (inMotif.includes(at) ? 0 : 1))
  const more = rooms.map((room, at) => ({ share: Math.max(0, room - least[at]!) }))
  const left = least.reduce<number>((rest, count) => rest - count, total)
  return shareOut(more, left, 0).map((count, at) => count + least[at]!)
}

/** Half of each yarn's rows on either side; odd ones by turns. */
function mirrored(order: readonly number[], counts: readonly number[]) {
  const above: ClothRow[] = []
  const below: ClothRow[] = []
  let odd = 0
  for (const band of order) {
    const count = counts[band]!
    const up = count % 2 === 0 ? count / 2 : Math.floor(count / 2) + (odd++ % 2)
    above.unshift(...plain(band, up))
    below.push(...plain(band, count - up))
  }
  return { above, below }
}

/** How many trebles one side of a round has: four more in every round, as the area grows. */
export const sideStitches = (round: number): number => 4 * round - 2

/**
 * Gives every size to one of those who are owed, so that the most by which any comes short or over is
 * least, or no more than `enough`: depth first, the largest size first and to whom most is owed, cut
 * by the best so far.
 */
function shareSizes(sizes: readonly number[], owed: readonly number[], enough: number): number[] {
  const left = [...owed]
  const order = [...owed.keys()]
  const chosen: number[] = []
  let best: number[] = []
  let least = Infinity
  const choose = (rest: number) => {
    if (least <= enough) return
    const size = sizes[chosen.length]
    if (size === undefined) {
      least = Math.max(...left.map(Math.abs))
      best = [...chosen]
      return
    }
    for (const to of order.toSorted((a, b) => left[b]! - left[a]! || a - b)) {
      // A hair less, so that one as good as the best is not looked for again.
      const fits = (value: number) => value > -least + 1e-9 && value < least + rest - size - 1e-9
      left[to]! -= size
      chosen.push(to)
      if (left.every(fits)) choose(rest - size)
      chosen.pop()
      left[to]! += size
    }
  }
  choose(sizes.reduce((sum, size) => sum + size, 0))
  return best
}

/**
 * The yarn of each round of a square, from the centre. Whole rounds only, so a yarn may come back
 * further in; of all ways to give the rounds their yarns the one truest to the shares, or the first
 * within a hundredth of them.
 */
export function squareRounds(bands: readonly Band[]): number[] {
  if (bands.length === 0) return []
  const sizes = Array.from({ length: ROUNDS }, (_, at) => sideStitches(ROUNDS - at))
  const all = sizes.reduce((sum, size) => sum + size, 0)
  const owed = sharesOf(bands).map((share) => share * all)
  return shareSizes(sizes, owed, all / 100).toReversed()
}

/** The yarns of a marled strand in the order in which its turns show them, each by its share. */
export function marlTurns(bands: readonly Band[], count: number): number[] {
  if (bands.length === 0) return []
  const shares = sharesOf(bands)
  const shown = shares.map(() => 0)
  return Array.from({ length: count }, (_, turn) => {
    const owed = shares.map((share, band) => share * (turn + 1) - shown[band]!)
    const band = owed.indexOf(Math.max(...owed))
    shown[band]! += 1
    return band
  })
}
