import { bandsInWords } from './bands'
import {
  cardStrokes,
  tailStrokes,
  windBands,
  windingOf,
  windingStrokes,
  type CardBand,
  type CardShape,
} from './card-strokes'
import { Strokes } from './strokes'

/** Props of {@link WrapCard}. */
export interface WrapCardProps {
  /** Top to bottom, in the order given. */
  bands: readonly CardBand[]
  title: string
  orientation?: 'portrait' | 'landscape'
  /** The small card of a list: no title on it, no motion. */
  compact?: boolean
  /** The bands wind on when the card appears; give it a new key to wind again. */
  winds?: boolean
  className?: string
}

const COLORS = {
  card: 'var(--yarn-card, #faf9f8)',
  edge: 'var(--yarn-card-edge, #c4c2be)',
  ground: 'var(--ground, #fff)',
}

const PORTRAIT = { width: 212, height: 316, margin: 38, head: 32 }
const SHAPES: Record<'portrait' | 'landscape' | 'compact', CardShape> = {
  portrait: { ...PORTRAIT, pitch: 4.5, threads: 55, least: 3, rise: 3, inset: 4 },
  landscape: {
    width: 320,
    height: 216,
    margin: 38,
    head: 24,
    pitch: 4.5,
    threads: 36,
    least: 2,
    rise: 4,
    inset: 4,
  },
  compact: {
    width: 96,
    height: 104,
    margin: 9,
    head: 9,
    pitch: 3.5,
    threads: 24,
    least: 2,
    rise: 2,
    inset: 2,
  },
}

/**
 * Where the bands lie on the portrait card, for what is laid over it.
 * @returns fractions of the card's width, and of its height the edges: one more than bands
 */
export function portraitEdges(bands: readonly CardBand[]): {
  left: number
  right: number
  edges: number[]
} {
  const { width, height } = SHAPES.portrait
  const { left, width: wound, top } = windingOf(SHAPES.portrait)
  const ends = windBands(SHAPES.portrait, bands).map((band) => band.y + band.height)
  return {
    left: left / width,
    right: (left + wound) / width,
    edges: [top, ...ends].map((at) => at / height),
  }
}

/**
 * A combination: its yarns wound round one card as bands from top to bottom, each as tall as its
 * share. The yarn goes through a slit at the left, so that the card's edge stays bare for the
 * title.
 */
export function WrapCard({
  bands,
  title,
  orientation = 'portrait',
  compact = false,
  winds = !compact,
  className,
}: WrapCardProps) {
  const shape = SHAPES[compact ? 'compact' : orientation]
  const { width, height } = shape
  return (
    <svg
      viewBox={`0 0 ${width} ${height}`}
      width={width}
      height={height}
      fill="none"
      role="img"
      aria-label={`${title}: ${bandsInWords(bands)}`}
      className={className ? `h-auto ${className}` : 'h-auto max-w-full'}
    >
      <Strokes of={cardStrokes(shape, COLORS)} />
      {compact ? null : <Title title={title} shape={shape} />}
      <g data-yarn="" className={winds ? 'animate-wind-on motion-reduce:animate-none' : undefined}>
        <Strokes of={windingStrokes(shape, bands, COLORS.edge)} />
        {compact ? null : <Strokes of={tailStrokes(shape, bands)} />}
      </g>
    </svg>
  )
}

/** Long titles are written smaller, then cut; the whole title is in the picture's name. */
function Title({ title, shape }: { title: string; shape: CardShape }) {
  const room = shape.height - shape.margin - 24
  const size = Math.max(11, Math.min(15, room / (title.length * 0.5)))
  const fits = Math.floor(room / (size * 0.5))
  const text = title.length > fits ? `${title.slice(0, fits - 1).trimEnd()}…` : title
  return (
    <text
      transform={`translate(${shape.margin / 2 + size * 0.32} ${shape.height - 14}) rotate(-90)`}
      fill="var(--yarn-card-ink, #51504d)"
      fontSize={size}
      fontStyle="italic"
      style={{ fontFamily: 'var(--font-besley-ext), var(--font-besley), Georgia, serif' }}
    >
      {text}
    </text>
  )
}
