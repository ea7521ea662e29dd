import { shareOut, type Band } from './bands'
import { threadStrokes, type Stroke } from './thread-strokes'

/** A card and what is wound on it; lengths in the picture's own units. */
export interface CardShape {
  width: number
  height: number
  /** The bare card at the left, where the title is written. */
  margin: number
  /** The bare card above and below the yarn. */
  head: number
  /** The height of one thread. */
  pitch: number
  threads: number
  /** The fewest threads of a band. */
  least: number
  /** How much higher a thread ends at the right than it starts at the left. */
  rise: number
  /** How far the yarn stays from the card's right edge. */
  inset: number
}

/** What a card is made of. */
export interface CardColors {
  card: string
  edge: string
  /** Seen through the hole. */
  ground: string
}

/** A band of a card; without a colour the card stays bare there. */
export type CardBand = Omit<Band, 'hex'> & { hex: string | null }

/** One band as it lies on its card. */
export interface WoundBand {
  band: CardBand
  /** Of its first thread, at the left. */
  y: number
  height: number
  count: number
  /** Threads above it. */
  offset: number
}

/** How wide the winding is, and where it begins: its left edge, and its top at the left. */
export function windingOf(shape: CardShape): { left: number; width: number; top: number } {
  const { width, height, margin, head, threads, pitch, rise, inset } = shape
  const left = margin + pitch * (2 / 3)
  return {
    left,
    width: width - left - pitch * 0.7 - inset,
    top: head + (height - 2 * head - threads * pitch) / 2 + rise / 2,
  }
}

/** The bands as they lie on a card, top to bottom. */
export function windBands(shape: CardShape, bands: readonly CardBand[]): WoundBand[] {
  const counts = bands.length > 0 ? shareOut(bands, shape.threads, shape.least) : []
  const { top } = windingOf(shape)
  return bands.map((band, index) => {
    const count = counts[index] ?? 0
    const offset = counts.slice(0, index).reduce((sum, other) => sum + other, 0)
    return {
      band,
      count,
      offset,
      y: top + offset * shape.pitch,
      height: count * shape.pitch,
    }
  })
}

/** The bare card: its notched outline, the slit that the yarn goes through, the hole to tie it by. */
export function cardStrokes(shape: CardShape, { card, edge, ground }: CardColors): Stroke[] {
  const { width, height, margin, head, pitch, threads } = shape
  const notches = Math.floor(threads / 2) + 1
  const top = (height - notches * 2 * pitch) / 2
  const down = `l${-pitch * 0.7} ${pitch}l${pitch * 0.7} ${pitch}`.repeat(notches)
  const hole = margin * 0.12
  const strokes: Stroke[] = [
    {
      d: `M2.5 .5H${width - 2.5}a2 2 0 0 1 2 2V${top}${down}V${height - 2.5}a2 2 0 0 1-2 2H2.5a2 2 0 0 1-2-2V2.5a2 2 0 0 1 2-2Z`,
      fill: card,
      stroke: edge,
      width: 1,
      round: 'join',
    },
    {
      d: `M${margin} ${head - pitch * 0.7}V${height - head + pitch * 0.7}`,
      stroke: edge,
      width: pitch * 0.6,
      round: 'cap',
    },
  ]
  if (margin >= 20)
    strokes.push({
      d: `M${margin / 2 - hole} ${margin / 2}a${hole} ${hole} 0 1 0 ${2 * hole} 0a${hole} ${hole} 0 1 0 ${-2 * hole} 0z`,
      fill: ground,
      stroke: edge,
      width: 1,
    })
  return strokes
}

/** The yarn on a card, from the bottom up. @param rim as of {@link threadStrokes} */
export function windingStrokes(
  shape: CardShape,
  bands: readonly CardBand[],
  rim: string,
): Stroke[] {
  const { left, width } = windingOf(shape)
  const { pitch, rise } = shape
  return windBands(shape, bands).flatMap(({ band, y, count, offset }) =>
    band.hex === null
      ? []
      : threadStrokes(band.hex, { x: left, y, width, pitch, count, rise, offset }, rim),
  )
}

/** The first yarn comes in through a slit above the winding, the last goes out below it. */
export function tailStrokes(shape: CardShape, bands: readonly CardBand[]): Stroke[] {
  const { width, head, pitch, threads } = shape
  const { left, top } = windingOf(shape)
  const unit = pitch / 4.5
  const bottom = top + threads * pitch
  const near = left + (width - left) * 0.2
  const far = left + (width - left) * 0.72
  const drawn = { width: pitch * 0.8, round: 'cap' as const }
  const strokes: Stroke[] = []
  const first = bands[0]?.hex
  if (first)
    strokes.push({
      d: `M${far} ${head * 0.45}q${-18 * unit} ${2 * unit} ${-30 * unit} ${top - head * 0.45}`,
      stroke: first,
      ...drawn,
    })
  const last = bands.at(-1)?.hex
  if (last)
    strokes.push({
      d: `M${near + 26 * unit} ${bottom - 2 * unit}q${-4 * unit} ${head * 0.4} ${-24 * unit} ${head * 0.5}`,
      stroke: last,
      ...drawn,
    })
  return strokes
}
