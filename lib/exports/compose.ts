import {
  cardStrokes,
  tailStrokes,
  windBands,
  windingStrokes,
  type CardShape,
} from '@/components/yarn/card-strokes'
import type { Stroke } from '@/components/yarn/thread-strokes'

import type { PictureSize } from './constants'
import type { ExportCombination, ExportDescription } from './description'
import { fitText, outlines, settable, settableOr, widthOf, type Face } from './typeset'

/** The undyed ground and inks of what goes out; the interface's own, as sRGB. */
export const INKS = {
  ground: '#f7f6f4',
  card: '#fbfaf9',
  edge: '#c4c2be',
  hairline: '#a5a39f',
  ink: '#1c1b19',
  soft: '#51504d',
} as const

/** A rectangle in pixels. */
export interface Area {
  x: number
  y: number
  width: number
  height: number
}

/** Text set on one line: `x` of its left end, `y` of its baseline. */
export interface SetText {
  text: string
  face: Face
  size: number
  x: number
  y: number
  ink: string
}

/** A wrap card with its title written along its edge. */
export interface DrawnCard {
  area: Area
  shape: CardShape
  strokes: Stroke[]
  /** Its title, to be turned a quarter to the left about its left end; null where it has none. */
  edge: SetText | null
}

/** Where everything of a picture stands. */
export interface Composition {
  width: number
  height: number
  /** Where the photograph is tipped in; null where there is none. */
  photograph: Area | null
  card: DrawnCard
  title: SetText[]
  /** Of each shade: its label's lines, then its place and share. */
  names: SetText[][]
  foot: SetText[]
  /** From a band to its name. */
  leaders: Stroke[]
}

interface Plan {
  photograph: Area | null
  title: { x: number; y: number; width: number; sizes: number[]; most: number }
  /** Its height is what the title leaves of it, unless the title stands beside it. */
  card: Area
  below: boolean
  /** Where names end at the right. */
  end: number
  /** Of names, and of what stands under them. */
  name: [number, number]
  /** Null where something else says whose it is. */
  foot: { x: number; y: number; width: number; size: number } | null
}

/** What is drawn of a combination on the printed sheet, as {@link PICTURE_SIZES} are pictures. */
export const SHEET_SIZE = { width: 1056, height: 1056 } as const

const PLANS: Record<'post' | 'square' | 'link' | 'sheet', { tipped: Plan; bare: Plan }> = {
  sheet: {
    tipped: {
      photograph: { x: 0, y: 0, width: 1056, height: 520 },
      title: { x: 0, y: 560, width: 1056, sizes: [60, 52, 44, 38], most: 2 },
      card: { x: 0, y: 560, width: 640, height: 496 },
      below: true,
      end: 1056,
      name: [32, 21],
      foot: null,
    },
    bare: {
      photograph: null,
      title: { x: 0, y: 0, width: 1056, sizes: [60, 52, 44, 38], most: 2 },
      card: { x: 0, y: 0, width: 640, height: 1056 },
      below: true,
      end: 1056,
      name: [36, 22],
      foot: null,
    },
  },
  post: {
    tipped: {
      photograph: { x: 72, y: 72, width: 1056, height: 520 },
      title: { x: 72, y: 636, width: 1056, sizes: [64, 56, 48, 40], most: 2 },
      card: { x: 72, y: 636, width: 640, height: 744 },
      below: true,
      end: 1128,
      name: [36, 23],
      foot: { x: 72, y: 1444, width: 1056, size: 22 },
    },
    bare: {
      photograph: null,
      title: { x: 72, y: 76, width: 1056, sizes: [84, 72, 60, 50], most: 3 },
      card: { x: 72, y: 76, width: 660, height: 1304 },
      below: true,
      end: 1128,
      name: [42, 25],
      foot: { x: 72, y: 1444, width: 1056, size: 22 },
    },
  },
  square: {
    tipped: {
      photograph: { x: 60, y: 60, width: 960, height: 336 },
      title: { x: 60, y: 428, width: 960, sizes: [52, 46, 40, 34], most: 2 },
      card: { x: 60, y: 428, width: 600, height: 558 },
      below: true,
      end: 1020,
      name: [30, 20],
      foot: { x: 60, y: 1036, width: 960, size: 19 },
    },
    bare: {
      photograph: null,
      title: { x: 60, y: 60, width: 960, sizes: [68, 58, 48, 40], most: 2 },
      card: { x: 60, y: 60, width: 600, height: 926 },
      below: true,
      end: 1020,
      name: [36, 22],
      foot: { x: 60, y: 1036, width: 960, size: 19 },
    },
  },
  link: {
    tipped: {
      photograph: { x: 44, y: 44, width: 440, height: 542 },
      title: { x: 524, y: 40, width: 632, sizes: [44, 38, 32, 28], most: 2 },
      card: { x: 524, y: 40, width: 370, height: 496 },
      below: true,
      end: 1156,
      name: [25, 17],
      foot: { x: 524, y: 586, width: 632, size: 17 },
    },
    bare: {
      photograph: null,
      title: { x: 56, y: 52, width: 372, sizes: [60, 52, 44, 36], most: 5 },
      card: { x: 484, y: 52, width: 380, height: 526 },
      below: false,
      end: 1144,
      name: [28, 18],
      foot: { x: 56, y: 578, width: 372, size: 18 },
    },
  },
}

const planOf = (size: PictureSize | typeof SHEET_SIZE, tipped: boolean): Plan => {
  const { width, height } = size
  const shape = height > width ? 'post' : height === width ? 'square' : 'link'
  const kind = size === SHEET_SIZE ? 'sheet' : shape
  return PLANS[kind][tipped ? 'tipped' : 'bare']
}

/** What stands for a title whose letters no shipped face has. */
export const UNSETTABLE_TITLE = 'Five shades'

/** A combination's title as it can be set. */
export const titleIn = (combination: ExportCombination, face: Face): string =>
  settableOr(combination.title, face, UNSETTABLE_TITLE)

/** A shade's label as it can be set; else its place in the trade's notation. */
export const labelIn = (shade: { label: string; role: string }, face: Face): string =>
  settableOr(shade.label, face, shade.role)

/** Shares as whole per cents. */
export const percent = (share: number): string => `${Math.round(100 * share)} %`

/** Where everything of a combination's picture stands at a size. */
export function compose(
  { brand, line }: Pick<ExportDescription, 'brand' | 'line'>,
  combination: ExportCombination,
  size: PictureSize | typeof SHEET_SIZE,
): Composition {
  const tipped = combination.photograph?.bytes != null
  const plan = planOf(size, tipped)
  const title = fitText(titleIn(combination, 'title'), 'title', plan.title)
  const leading = title.size * 1.16
  const lines: SetText[] = title.lines.map((text, row) => ({
    text,
    face: 'title',
    size: title.size,
    x: plan.title.x,
    y: plan.title.y + title.size * 0.86 + row * leading,
    ink: INKS.ink,
  }))
  const above = plan.below ? title.lines.length * leading + title.size * 0.42 : 0
  const area = {
    ...plan.card,
    y: Math.round(plan.card.y + above),
    height: Math.round(plan.card.height - above),
  }
  const card = drawCard(combination, area)
  return {
    ...size,
    photograph: plan.photograph,
    card,
    title: lines,
    ...nameBands(combination, card, plan),
    foot: footOf(brand, line, combination, plan),
  }
}

/** The wrap card of a combination, as large as an area. */
export function drawCard(combination: ExportCombination, area: Area): DrawnCard {
  const { width, height } = area
  const head = Math.round(Math.min(64, height * 0.085))
  const pitch = Math.max(7, Math.min(13, Math.round(((height - 2 * head) / 54) * 2) / 2))
  const shape: CardShape = {
    width,
    height,
    margin: Math.round(Math.min(92, width * 0.17)),
    head,
    pitch,
    threads: Math.floor((height - 2 * head) / pitch),
    least: 3,
    rise: Math.round(pitch * 0.8),
    inset: pitch,
  }
  const bands = combination.shades.map(({ hex, share, label }) => ({ hex, share, name: label }))
  return {
    area,
    shape,
    strokes: [
      ...cardStrokes(shape, { card: INKS.card, edge: INKS.edge, ground: INKS.ground }),
      ...windingStrokes(shape, bands, INKS.edge),
      ...tailStrokes(shape, bands),
    ],
    edge: writeEdge(combination, shape),
  }
}

/** The title along the card's edge, from the bottom up, in the card's own frame. */
function writeEdge(combination: ExportCombination, shape: CardShape): SetText | null {
  const title = settable(combination.title, 'hand')
  if (!title) return null
  const largest = shape.margin * 0.46
  const { lines, size } = fitText(title, 'hand', {
    width: shape.height - shape.margin - shape.head,
    sizes: [1, 0.85, 0.72, 0.6, 0.5].map((part) => largest * part),
    most: 1,
  })
  return {
    text: lines[0] ?? '',
    face: 'hand',
    size,
    x: shape.margin / 2 + size * 0.32,
    y: shape.height - shape.head * 0.62,
    ink: INKS.soft,
  }
}

/** The names beside their bands, moved apart where bands are narrower than their names are tall. */
function nameBands(combination: ExportCombination, card: DrawnCard, plan: Plan) {
  const { area, shape } = card
  const [nameSize, noteSize] = plan.name
  const right = area.x + area.width
  const x = right + nameSize * 1.9
  const bands = windBands(
    shape,
    combination.shades.map(({ hex, share, label }) => ({ hex, share, name: label })),
  )
  const blocks = combination.shades.map((shade, index) => {
    const { y = 0, height = 0 } = bands[index] ?? {}
    const setting = fitText(labelIn(shade, 'title'), 'title', {
      width: plan.end - x,
      sizes: [nameSize, nameSize * 0.86, nameSize * 0.74],
      most: 2,
    })
    const note = `${shade.role} · ${percent(shade.share)}`
    const tall = setting.lines.length * setting.size * 1.14 + noteSize * 1.3
    return { setting, note, tall, aim: area.y + y + height / 2 - shape.rise }
  })
  const middles = spread(
    blocks.map(({ aim }) => aim),
    blocks.map(({ tall }) => tall + noteSize * 0.5),
    area.y,
    area.y + area.height,
  )
  const names: SetText[][] = []
  const leaders: Stroke[] = []
  blocks.forEach(({ setting, note, tall, aim }, index) => {
    const middle = middles[index]!
    const top = middle - tall / 2
    const label: SetText[] = setting.lines.map((text, row) => ({
      text,
      face: 'title',
      size: setting.size,
      x,
      y: top + setting.size * (0.84 + row * 1.14),
      ink: INKS.ink,
    }))
    const y = top + tall - noteSize * 0.22
    names.push([...label, { text: note, face: 'text', size: noteSize, x, y, ink: INKS.soft }])
    const [from, to] = [right + nameSize * 0.3, x - nameSize * 0.4]
    leaders.push({
      d: `M${from} ${aim}L${from + nameSize * 0.45} ${aim}L${to - nameSize * 0.3} ${middle}L${to} ${middle}`,
      stroke: INKS.hairline,
      width: 1.5,
      round: 'join',
    })
  })
  return { names, leaders }
}

/**
 * Middles as near their aims as they come without overlapping, in order, between two edges: where
 * blocks meet they form a heap about the mean of their aims.
 */
export function spread(
  aims: readonly number[],
  heights: readonly number[],
  low: number,
  high: number,
): number[] {
  interface Heap {
    tops: number[]
    members: number[]
    height: number
    start: number
  }
  const heaps: Heap[] = []
  aims.forEach((aim, index) => {
    const tall = heights[index] ?? 0
    let heap: Heap = {
      tops: [aim - tall / 2],
      members: [index],
      height: tall,
      start: aim - tall / 2,
    }
    for (;;) {
      heap.start = heap.tops.reduce((sum, top) => sum + top, 0) / heap.tops.length
      heap.start = Math.max(low, Math.min(heap.start, high - heap.height))
      const before = heaps.at(-1)
      if (!before || before.start + before.height <= heap.start) break
      heaps.pop()
      heap = {
        tops: [...before.tops, ...heap.tops.map((top) => top - before.height)],
        members: [...before.members, ...heap.members],
        height: before.height + heap.height,
        start: 0,
      }
    }
    heaps.push(heap)
  })
  const middles: number[] = []
  for (const { members, start } of heaps) {
    let at = start
    for (const index of members) {
      const tall = heights[index] ?? 0
      middles[index] = at + tall / 2
      at += tall
    }
  }
  return middles
}

/** Whose it is, and whose photograph. */
function footOf(
  brand: string,
  line: string,
  { photograph }: ExportCombination,
  { foot, photograph: tipped }: Plan,
): SetText[] {
  if (!foot) return []
  const own = [brand, line].flatMap((name) => settable(name, 'text') ?? [])
  const credit = tipped && photograph ? settable(`Photograph: ${photograph.credit}`, 'text') : null
  const half = credit ? (foot.width - foot.size) / 2 : foot.width
  const set = (text: string, y: number): SetText & { right: number } => {
    const { lines, size } = fitText(text, 'text', {
      width: half,
      sizes: [foot.size, foot.size * 0.86],
      most: 1,
    })
    const line = lines[0] ?? ''
    const right = foot.x + foot.width - widthOf(line, 'text', size)
    return { text: line, face: 'text', size, x: foot.x, y, ink: INKS.soft, right }
  }
  const texts: SetText[] = []
  if (own.length > 0) texts.push(plain(set(own.join(' · '), foot.y)))
  if (credit) {
    const { right, ...text } = set(credit, foot.y)
    texts.push({ ...text, x: right })
  }
  return texts
}

const plain = ({ right: _, ...text }: SetText & { right: number }): SetText => text

/** The outlines of a text as path data. */
export const outlinesOf = ({ text, face, size, x, y }: SetText): string =>
  outlines(text, face, size, x, y)
