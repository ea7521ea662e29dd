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
  { tone: 'black', alpha: 0.2, at: 0.86, width: 0.28 },
  { tone: 'white', alpha: 0.2, at: 0.36, width: 0.34, turn: { from: 0.3, to: 0.86 } },
  { tone: 'black', alpha: 0.2, at: 0.5, width: 0.92, turn: { from: 0, to: 0.24 } },
  { tone: 'black', alpha: 0.42, at: 1, width: 0.26 },
]

/** Every third thread lies a little deeper, every third a little higher: this veil says so. */
export const UNEVEN = 0.055

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

const ACROSS = 16
const ALONG = 10
const BLUR = 4 // sixteenths of a thread that one screen pixel smears over, at a 4 px thread

function cellsOf(opacities: readonly number[], uneven: number): Cell[] {
  const cells = new Map<string, [number, number, number]>()
  for (let u = 0; u < ALONG; u += 1) {
    const along = (u + 0.5) / ALONG
    const column = Array.from({ length: ACROSS }, (_, v) => {
      const across = (v + 0.5) / ACROSS
      let scale = 1
      let lift = 0
      VEILS.forEach((veil, index) => {
        const distance = Math.abs(across - veil.at)
        if (Math.min(distance, 1 - distance) * 2 > veil.width) return
        if (veil.turn && (along < veil.turn.from || along >= veil.turn.to)) return
        const alpha = opacities[index] ?? 0
        scale *= 1 - alpha
        lift = lift * (1 - alpha) + (veil.tone === 'white' ? alpha : 0)
      })
      return [scale, lift] as const
    })
    for (let v = 0; v < ACROSS; v += 1) {
      let scale = 0
      let lift = 0
      for (let k = 0; k < BLUR; k += 1) {
        const [s, l] = column[(v + k) % ACROSS] ?? [1, 0]
        scale += s / BLUR
        lift += l / BLUR
      }
      for (const [depth, light] of [
        [0, 0],
        [uneven, 0],
        [uneven, uneven],
      ] as const) {
        const s = scale * (1 - depth)
        const l = lift * (1 - depth) + light
        const key = `${s.toFixed(3)} ${l.toFixed(3)}`
        const cell = cells.get(key)
        if (cell) cell[0] += 1
        else cells.set(key, [1, s, l])
      }
    }
  }
  const total = ACROSS * ALONG * 3
  return [...cells.values()].map(([count, scale, lift]) => [count / total, scale, lift])
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

const TOLERANCE = 0.3
const cache = new Map<string, ThreadColors>()

/**
 * The base and veils that draw yarn of this shade: their mean, taken in linear light, is within
 * ΔE00 0.3 of it. Near white, near black and at the edge of the screen's gamut there is no room
 * for full veils, and they are thinned until the mean holds. Throws RangeError when `hex` is not a
 * colour.
 */
export function threadColors(hex: string): ThreadColors {
  const known = cache.get(hex)
  if (known) return known
  const channels = parseHex(hex)
  if (!channels) throw new RangeError(`“${hex}” is not a colour such as #7a8b4f.`)
  const shade = srgbToLab(...channels)
  const aims = channels.map(decodeChannel)
  // White veils look like chalk on dark yarn long before they upset the mean.
  const light = 0.45 + 0.55 * Math.min(1, shade[0] / 60)
  let drawn: ThreadColors = { base: hex, opacities: VEILS.map(() => 0), uneven: 0 }
  for (let strength = 1; strength > 0.04; strength *= 0.88) {
    const opacities = VEILS.map(
      (veil) =>
        Math.round(1000 * veil.alpha * strength * (veil.tone === 'white' ? light : 1)) / 1000,
    )
    const uneven = Math.round(1000 * UNEVEN * strength * light) / 1000
    const cells = cellsOf(opacities, uneven)
    const bases = aims.map((aim) => baseFor(cells, aim))
    const [red = 0, green = 0, blue = 0] = bases.map((base) => encode(meanLight(cells, base / 255)))
    if (deltaE00(srgbToLab(red, green, blue), shade) > TOLERANCE) continue
    const base = `#${bases.map((value) => value.toString(16).padStart(2, '0')).join('')}`
    drawn = { base, opacities, uneven }
    break
  }
  if (cache.size > 4000) cache.clear()
  cache.set(hex, drawn)
  return drawn
}
