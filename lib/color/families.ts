import { hueTurn, labToOklch, type Oklch } from './oklch'
import type { Lab } from './types'

/** How many hue families are chosen from where nobody says how many. */
const CHOSEN_COUNTS = { least: 5, most: 10 } as const
/** Shades to a hue family, in the mean, that a line should have before it is cut more finely. */
const TO_A_FAMILY = 4

/** OKLCH lightness and the chroma below which a colour of that lightness passes for neutral. */
const NEUTRAL_CHROMA: readonly (readonly [lightness: number, chroma: number])[] = [
  [0.2, 0.04],
  [0.45, 0.025],
  [0.86, 0.025],
  [0.94, 0.033],
]

/**
 * The OKLCH chroma below which a colour of this lightness passes for neutral: 0.025 in the middle,
 * more towards white, where undyed wool is, and towards black, where a hue hardly shows.
 * @source colour survey (see basic-terms.ts): 95 % of what is called grey has chroma up to 0.025, of
 * what is called white up to 0.033; towards black common practice
 */
export function neutralChroma(lightness: number): number {
  const after = NEUTRAL_CHROMA.findIndex(([at]) => at >= lightness)
  if (after === 0) return NEUTRAL_CHROMA[0]![1]
  if (after < 0) return NEUTRAL_CHROMA.at(-1)![1]
  const [l0, c0] = NEUTRAL_CHROMA[after - 1]!
  const [l1, c1] = NEUTRAL_CHROMA[after]!
  return c0 + ((c1 - c0) * (lightness - l0)) / (l1 - l0)
}

/** Whether a colour stands with the neutrals. */
export const isNeutral = ({ l, c }: Oklch): boolean => c < neutralChroma(l)

/** A hue on the circle with its weight. */
export interface WeightedHue {
  /** Degrees, any turn. */
  h: number
  /** Greater than 0. */
  weight: number
}

/** A cut of the hue circle into arcs. */
export interface HueCut {
  /** Which of the hues stand in each arc, by index, in the order of the circle. */
  arcs: number[][]
  /** Sum over all hues of weight × squared distance to the mean of their arc, degrees². */
  spread: number
}

/** Hues in the order of the circle, twice round, with the sums that give an arc's spread at once. */
interface Unrolled {
  order: number[]
  /** The spread of the arc of the hues from one place up to, not including, another. */
  spreadOf: (from: number, to: number) => number
}

function unroll(hues: readonly WeightedHue[]): Unrolled {
  const degrees = hues.map(({ h }) => ((h % 360) + 360) % 360)
  const order = degrees.map((_, at) => at).sort((a, b) => degrees[a]! - degrees[b]! || a - b)
  const places = 2 * order.length
  const weight = new Float64Array(places + 1)
  const first = new Float64Array(places + 1)
  const second = new Float64Array(places + 1)
  for (let at = 0; at < places; at++) {
    const index = order[at % order.length]!
    // About 0, so that the sums stay small and lose no digits.
    const x = degrees[index]! + (at < order.length ? -360 : 0)
    const w = hues[index]!.weight
    weight[at + 1] = weight[at]! + w
    first[at + 1] = first[at]! + w * x
    second[at + 1] = second[at]! + w * x * x
  }
  return {
    order,
    spreadOf: (from, to) => {
      const w = weight[to]! - weight[from]!
      const s = first[to]! - first[from]!
      return Math.max(0, second[to]! - second[from]! - (s * s) / w)
    },
  }
}

/** Where arcs begin, the last one's end besides, and their spread. */
interface Cuts {
  cuts: number[]
  spread: number
}

/**
 * The cheapest way from `lows[0]` to `lows[count]` (both ends fixed) by arcs whose ends lie within
 * `lows` and `highs`. Since the spread of arcs obeys the quadrangle inequality, the best beginning
 * of an arc never falls as its end rises: each layer is filled by halving.
 */
function cheapestCuts(
  spreadOf: Unrolled['spreadOf'],
  lows: readonly number[],
  highs: readonly number[],
): Cuts {
  const count = lows.length - 1
  let costs = Float64Array.of(0)
  const begins: Int32Array[] = []
  for (let layer = 1; layer <= count; layer++) {
    const [low, high] = [lows[layer]!, highs[layer]!]
    const [before, last] = [lows[layer - 1]!, highs[layer - 1]!]
    const former = costs
    const next = new Float64Array(high - low + 1).fill(Infinity)
    const begin = new Int32Array(high - low + 1)
    const fill = (from: number, to: number, least: number, most: number): void => {
      if (from > to) return
      const end = (from + to) >> 1
      let best = Infinity
      let at = least
      for (let start = least; start <= Math.min(most, end - 1); start++) {
        const cost = former[start - before]! + spreadOf(start, end)
        if (cost < best) {
          best = cost
          at = start
        }
      }
      next[end - low] = best
      begin[end - low] = at
      fill(from, end - 1, least, at)
      fill(end + 1, to, at, most)
    }
    fill(low, high, before, last)
    costs = next
    begins.push(begin)
  }
  const cuts = [lows[count]!]
  for (let layer = count; layer >= 1; layer--) {
    cuts.unshift(begins[layer - 1]![cuts[0]! - lows[layer]!]!)
  }
  return { cuts, spread: costs[0]! }
}

/**
 * Cuts the hue circle into `count` arcs at the optimum: the least sum of weight × squared distance
 * (shorter way round) to the arc's own mean that any `count` centres on the circle reach. Cells
 * about centres are arcs, and along an arc the distance is that of the unrolled line, so the
 * optimum over all rotations of the line is that of the circle.
 *
 * Not every rotation has to be tried: by the quadrangle inequality some optimum has exactly one cut
 * within each arc of the best cut of any one rotation. So one rotation is solved, then those that
 * begin within its smallest arc, each with its cuts held to one arc; and since the cuts of a
 * rotation lie between those of the ones before and after it, by halving.
 * @throws RangeError when `count` is not 1 up to the number of different hues, or a weight is not
 * positive
 * @source weighted k-means in one dimension by dynamic programming: Wang and Song, “Ckmeans.1d.dp”,
 * The R Journal 3/2 (2011); on the circle: Debnath and Song, IEEE/ACM TCBB (2021)
 * @remarks cost of the order of count × n log² n: 500 hues take about a millisecond
 */
export function cutHues(hues: readonly WeightedHue[], count: number): HueCut {
  const size = hues.length
  const bad = hues.find(({ h, weight }) => !Number.isFinite(h) || !(weight > 0))
  if (bad) throw new RangeError(`A hue of ${bad.h}° with weight ${bad.weight} cannot be cut.`)
  if (!Number.isInteger(count) || count < 1 || count > differentHues(hues)) {
    throw new RangeError(`${size} hues cannot be cut into ${count} arcs.`)
  }
  const { order, spreadOf } = unroll(hues)
  const inner = Array.from({ length: count - 1 }, (_, at) => at + 1)
  const first = cheapestCuts(
    spreadOf,
    [0, ...inner, size],
    [0, ...inner.map((at) => size - count + at), size],
  ).cuts
  const widths = first.slice(1).map((cut, at) => cut - first[at]!)
  const smallest = widths.indexOf(Math.min(...widths))
  // The cuts from that arc once round and one further.
  const held = Array.from({ length: count + 2 }, (_, at) => {
    const cut = smallest + at
    return first[cut % count]! + size * Math.floor(cut / count)
  })
  const cutFrom = (start: number, lows: readonly number[], highs: readonly number[]): Cuts =>
    cheapestCuts(
      spreadOf,
      [start, ...inner.map((at) => Math.max(lows[at]!, start + at)), start + size],
      [start, ...inner.map((at) => highs[at]!), start + size],
    )
  const low = cutFrom(held[0]!, held, held.slice(1))
  const high = cutFrom(held[1]!, held, held.slice(1))
  let best = high.spread < low.spread ? high : low
  const search = (before: Cuts, after: Cuts): void => {
    const start = (before.cuts[0]! + after.cuts[0]!) >> 1
    if (start === before.cuts[0]) return
    const found = cutFrom(start, before.cuts, after.cuts)
    if (found.spread < best.spread) best = found
    search(before, found)
    search(found, after)
  }
  search(low, high)
  const { cuts, spread } = best
  return {
    arcs: cuts.slice(1).map((to, at) => {
      const places = Array.from({ length: to - cuts[at]! }, (_, step) => cuts[at]! + step)
      return places.map((place) => order[place % size]!)
    }),
    spread,
  }
}

/** How many hues there are, the same one counted once. */
const differentHues = (hues: readonly WeightedHue[]): number =>
  new Set(hues.map(({ h }) => ((h % 360) + 360) % 360)).size

/**
 * Into how many families these hues are best cut: where the spread drops most sharply beyond what
 * it would for hues evenly round the circle, whose spread falls as 1 / count². From five to ten
 * where there are forty hues and more; with fewer, four to a family, and at last two.
 * @source the elbow of the spread, common practice; the even circle as its measure
 */
export function chooseCut(hues: readonly WeightedHue[]): HueCut {
  const size = hues.length
  const least = Math.max(1, Math.min(CHOSEN_COUNTS.least, size >> 1, differentHues(hues)))
  const most = Math.max(
    least,
    Math.min(CHOSEN_COUNTS.most, Math.floor(size / TO_A_FAMILY), differentHues(hues)),
  )
  const even = ({ spread, arcs }: HueCut) => spread * arcs.length ** 2
  let former = cutHues(hues, Math.max(1, least - 1))
  let best: { cut: HueCut; drop: number } | null = null
  for (let count = least; count <= most; count++) {
    const cut = cutHues(hues, count)
    const drop = cut.spread > 0 ? even(former) / even(cut) : Infinity
    if (!best || drop > best.drop) best = { cut, drop }
    former = cut
  }
  return best!.cut
}

/** Shades that belong together. */
export interface ShadeFamily {
  neutral: boolean
  /** By index among the shades, light to dark. */
  members: number[]
}

/**
 * Sorts shades into tonal families: the neutrals, when there are any, then the hue families, the
 * rest cut at the optimum in OKLCH hue weighted by chroma (a vivid shade says more of its hue than
 * a pale one).
 * @param count how many hue families; null chooses. Fewer when there are not so many hues.
 */
export function sortFamilies(labs: readonly Lab[], count: number | null): ShadeFamily[] {
  const colors = labs.map(labToOklch)
  const all = colors.map((_, at) => at)
  const neutral = all.filter((at) => isNeutral(colors[at]!))
  const dyed = all.filter((at) => !isNeutral(colors[at]!))
  const lightFirst = (members: number[]) =>
    members.sort((a, b) => labs[b]![0] - labs[a]![0] || a - b)
  const families: ShadeFamily[] = []
  if (neutral.length > 0) families.push({ neutral: true, members: lightFirst(neutral) })
  if (dyed.length === 0) return families
  const hues = dyed.map((at) => ({ h: colors[at]!.h, weight: colors[at]!.c }))
  const { arcs } =
    count === null ? chooseCut(hues) : cutHues(hues, Math.min(count, differentHues(hues)))
  const found = arcs.map((arc) => lightFirst(arc.map((place) => dyed[place]!)))
  const placed = found.map((members) => ({
    members,
    at: bookPlace(meanHue(members.map((at) => colors[at]!))!),
  }))
  placed.sort((a, b) => a.at - b.at)
  return [...families, ...placed.map(({ members }) => ({ neutral: false, members }))]
}

/** Where the circle is opened for the sample book: between purple and pink. */
const FIRST_HUE = 340

/** How far round the sample book a hue stands, from pink by red and blue to purple: 0–360. */
export const bookPlace = (hue: number): number => (((hue - FIRST_HUE) % 360) + 360) % 360

/** The mean hue of colours, weighted by chroma, in degrees; null when they have none. */
export function meanHue(colors: readonly Oklch[]): number | null {
  let [x, y] = [0, 0]
  for (const { c, h } of colors) {
    x += c * Math.cos((h * Math.PI) / 180)
    y += c * Math.sin((h * Math.PI) / 180)
  }
  return Math.hypot(x, y) < 1e-9 ? null : ((Math.atan2(y, x) * 180) / Math.PI + 360) % 360
}

/** How far apart two hues are the shorter way round, degrees. */
export const hueDistance = (one: number, other: number): number => Math.abs(hueTurn(one, other))
