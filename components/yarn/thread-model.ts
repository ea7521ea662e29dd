import { deltaE00 } from '@/lib/color/ciede2000'
import { decodeChannel, parseHex, srgbToLab } from '@/lib/color/srgb'

/*
 * A thread is drawn as its base colour under a few black and white veils: the groove between two
 * threads, the light along its back, the turns of its plies. The veils change the mean, so the base
 * is chosen such that the mean light of all of it is the shade's.
 */

/** A veil along every thread, in fractions of the thread's height and of one turn of its plies. */
export interface Veil {
  tone: 'black' | 'white'
  alpha: number
  /** The stroke's middle, 0 at the upper and 1 at the lower edge of the thread. */
  at: number
  width: number
  /** The part of each turn that is covered; the whole length when left out. */
  turn?: { from: number; to: number }
}

/** Veils from the bottom up, as they are drawn. */
export const VEILS: readonly Veil[] = [
  { tone: 'black', alpha: 0.18, at: 0.8, width: 0.36 },
  { tone: 'white', alpha: 0.2, at: 0.34, width: 0.34, turn: { from: 0.3, to: 0.86 } },
  { tone: 'black', alpha: 0.18, at: 0.48, width: 0.88, turn: { from: 0, to: 0.24 } },
  { tone: 'black', alpha: 0.38, at: 0.91, width: 0.22 },
]

/** Every third thread lies a little deeper, every third a little higher: this veil says so. */
export const UNEVEN = 0.05

/** The length of one turn of the plies, in thread heights. */
export const TURN = 1.15

/** How a shade is drawn: the base under the veils, and each veil's opacity. */
export interface ThreadColors {
  base: string
  /** One opacity for each of {@link VEILS}. */
  opacities: readonly number[]
  /** The opacity of the deeper threads' black veil and the higher ones' white one. */
  uneven: number
}

/** A part of the thread's surface: weight, and the veils over it as `scale · base + lift`. */
type Cell = readonly [weight: number, scale: number, lift: number]

const ACROSS = 20
const ALONG = 12
/** Screen pixels between those of a desk's and a telephone's screen, in units of the picture. */
const PIXEL = 0.7

/** Of a window around each of `count` places in a period of 1, the part inside [from, to). */
function smear(count: number, from: number, to: number, window: number): number[] {
  return Array.from({ length: count }, (_, index) => {
    const start = (index + 0.5) / count - window / 2
    let inside = 0
    for (const turn of [-1, 0, 1]) {
      const overlap = Math.min(start + window, to + turn) - Math.max(start, from + turn)
      inside += Math.max(0, overlap)
    }
    return inside / window
  })
}

/**
 * The thread's surface as the screen draws it: edges smeared over a pixel, since that smearing is
 * done on encoded values and darkens the mean. Places that look alike are taken together.
 */
function cellsOf(opacities: readonly number[], uneven: number, pitch: number): Cell[] {
  const window = Math.max(1 / ACROSS, PIXEL / pitch)
  const covers = VEILS.map(({ at, width, turn }) => ({
    across: smear(ACROSS, at - width / 2, at + width / 2, window),
    along: turn ? smear(ALONG, turn.from, turn.to, window / TURN) : null,
  }))
  const cells = new Map<number, [number, number, number]>()
  for (let u = 0; u < ALONG; u += 1) {
    for (let v = 0; v < ACROSS; v += 1) {
      let scale = 1
      let lift = 0
      VEILS.forEach((veil, index) => {
        const cover = covers[index]
        if (!cover) return
        const part = (cover.across[v] ?? 0) * (cover.along ? (cover.along[u] ?? 0) : 1)
        const alpha = (opacities[index] ?? 0) * part
        scale *= 1 - alpha
        lift = lift * (1 - alpha) + (veil.tone === 'white' ? alpha : 0)
      })
      // A third of the threads lie under a black veil, a third under a white one.
      scale *= 1 - (2 / 3) * uneven
      lift = lift * (1 - (2 / 3) * uneven) + uneven / 3
      const key = Math.round(scale * 25) * 100 + Math.round(lift * 25)
      const cell = cells.get(key) ?? [0, 0, 0]
      cells.set(key, [cell[0] + 1, cell[1] + scale, cell[2] + lift])
    }
  }
  return [...cells.values()].map(([count, scale, lift]) => [
    count / (ACROSS * ALONG),
    scale / count,
    lift / count,
  ])
}

const meanLight = (cells: readonly Cell[], base: number): number =>
  cells.reduce((sum, [weight, scale, lift]) => sum + weight * decodeChannel(scale * base + lift), 0)

/** The 8-bit base whose mean light comes nearest the aim; the mean grows with the base. */
function baseFor(cells: readonly Cell[], aim: number): number {
  let low = 0
  let high = 255
  while (high - low > 1) {
    const middle = (low + high) >> 1
    if (meanLight(cells, middle / 255) < aim) low = middle
    else high = middle
  }
  const miss = (value: number) => Math.abs(meanLight(cells, value / 255) - aim)
  return miss(low) <= miss(high) ? low : high
}

const encode = (light: number): number =>
  light <= 0.0031308 ? light * 12.92 : 1.055 * light ** (1 / 2.4) - 0.055

const TOLERANCE = 0.2
const cache = new Map<string, ThreadColors>()

/**
 * The base and veils that draw yarn of this shade in threads `pitch` pixels high: their mean, taken in linear light, is within
 * ΔE00 0.2 of it. Near white, near black and at the edge of the screen's gamut there is no room
 * for full veils, and they are thinned until the mean holds. Throws RangeError when `hex` is not a
 * colour.
 */
export function threadColors(hex: string, pitch: number): ThreadColors {
  const id = `${hex} ${pitch}`
  const known = cache.get(id)
  if (known) return known
  const channels = parseHex(hex)
  if (!channels) throw new RangeError(`“${hex}” is not a colour such as #7a8b4f.`)
  const shade = srgbToLab(...channels)
  const aims = channels.map(decodeChannel)
  // White veils look like chalk on dark yarn, and black ones like soot on pale yarn, long before
  // they upset the mean.
  const white = 0.45 + 0.55 * Math.min(1, shade[0] / 60)
  const black = 1 - 0.45 * Math.max(0, (shade[0] - 55) / 45)
  let drawn: ThreadColors = { base: hex, opacities: VEILS.map(() => 0), uneven: 0 }
  for (let strength = 1; strength > 0.04; strength *= 0.88) {
    const opacities = VEILS.map(
      (veil) =>
        Math.round(1000 * veil.alpha * strength * (veil.tone === 'white' ? white : black)) / 1000,
    )
    const uneven = Math.round(1000 * UNEVEN * strength * white) / 1000
    const cells = cellsOf(opacities, uneven, pitch)
    const bases = aims.map((aim) => baseFor(cells, aim))
    const [red = 0, green = 0, blue = 0] = bases.map((base) => encode(meanLight(cells, base / 255)))
    if (deltaE00(srgbToLab(red, green, blue), shade) > TOLERANCE) continue
    const base = `#${bases.map((value) => value.toString(16).padStart(2, '0')).join('')}`
    drawn = { base, opacities, uneven }
    break
  }
  if (cache.size > 4000) cache.clear()
  cache.set(id, drawn)
  return drawn
}
