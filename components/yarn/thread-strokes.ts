import { hexToLab } from '@/lib/color/srgb'
import { threadColors, TURN, VEILS } from './thread-model'

/** Where a block of threads lies; lengths in the picture's own units. */
export interface ThreadBlock {
  x: number
  y: number
  width: number
  /** The height of one thread. */
  pitch: number
  count: number
  /** How much higher a thread ends at the right than it starts at the left. */
  rise: number
  /** Where in the card's winding this block starts, so that no two bands lie alike. */
  offset?: number
}

/** A path and how it is drawn, for a page, an SVG file or a PDF alike. */
export interface Stroke {
  /** SVG path data of the commands M, L, H, V, A, Q, Z and their relatives. */
  d: string
  fill?: string
  stroke?: string
  width?: number
  opacity?: number
  round?: 'cap' | 'join'
  /** Lengths of dash and gap, and how far into them the path starts. */
  dash?: { lengths: readonly [number, number]; offset: number }
  /** Degrees of skewX. */
  skew?: number
}

const round = (value: number): number => Math.round(value * 10) / 10

const SLANT = 42
const TAN = Math.tan((SLANT * Math.PI) / 180)

/** How far the veils reach into the rounded ends, in thread heights. */
const OVER = 0.2

/** One subpath a thread, all at the same height within their threads. */
function lines(
  { x, y, width, pitch, rise }: ThreadBlock,
  at: number,
  rows: readonly number[],
  over = 0,
) {
  const left = round(x - over * pitch)
  const run = `l${round(width + 2 * over * pitch)} ${round(-rise)}`
  return rows.map((row) => `M${left} ${round(y + (row + at) * pitch)}${run}`).join('')
}

/**
 * The same for dashed veils, in the slanted frame that turns a dash into one turn of the plies.
 * Threads start at different places in their turn, or the plies would line up into twill.
 */
function turns(block: ThreadBlock, at: number, rows: readonly number[], turn: number) {
  const { x, y, width, pitch, rise, offset = 0 } = block
  return rows
    .map((row) => {
      const top = y + (row + at) * pitch
      const start = (((row + offset) * 0.618) % 1) * turn - pitch * OVER
      // The slant moves a point by its height; moving it back keeps the thread inside the block.
      const left = x + top * TAN + start
      return `M${round(left)} ${round(top)}l${round(width + pitch * OVER - start - rise * TAN)} ${round(-rise)}`
    })
    .join('')
}

/**
 * A block of parallel threads, slightly twisted, with rounded ends, from the bottom up: about seven
 * paths whatever its size. The mean of what they draw is the shade.
 * @param rim the line round yarn that would vanish on a white or black ground
 */
export function threadStrokes(hex: string, block: ThreadBlock, rim: string): Stroke[] {
  const colors = threadColors(hex, block.pitch)
  const lightness = hexToLab(hex)[0]
  const { x, y, width, pitch, count, rise, offset = 0 } = block
  const rows = Array.from({ length: count }, (_, row) => row)
  const turn = pitch * TURN
  const strokes: Stroke[] = []
  if (lightness > 90 || lightness < 10)
    strokes.push({
      d: lines(block, 0.5, rows),
      stroke: rim,
      width: round(pitch + 1.2),
      round: 'cap',
    })
  strokes.push(
    { d: lines(block, 0.5, rows), stroke: colors.base, width: round(pitch), round: 'cap' },
    {
      d: `M${round(x)} ${round(y)}l${round(width)} ${round(-rise)}v${round(count * pitch)}l${round(-width)} ${round(rise)}z`,
      fill: colors.base,
    },
  )
  VEILS.forEach((veil, index) => {
    const veiled = {
      stroke: veil.tone,
      opacity: colors.opacities[index] ?? 0,
      width: round(veil.width * pitch),
    }
    if (!veil.turn) {
      strokes.push({ d: lines(block, veil.at, rows, OVER), ...veiled })
      return
    }
    const { from, to } = veil.turn
    strokes.push({
      d: turns(block, veil.at, rows, turn),
      ...veiled,
      dash: { lengths: [(to - from) * turn, (1 - to + from) * turn], offset: round(-from * turn) },
      skew: -SLANT,
    })
  })
  if (colors.uneven > 0) {
    ;(['black', 'white'] as const).forEach((tone, index) => {
      const some = rows.filter((row) => ((row + offset) * 7) % 3 === index)
      strokes.push({
        d: lines(block, 0.5, some, OVER),
        stroke: tone,
        opacity: colors.uneven,
        width: round(pitch),
      })
    })
  }
  return strokes
}
