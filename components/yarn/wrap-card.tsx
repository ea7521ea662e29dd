import { bandsInWords, shareOut, type Band } from './bands'
import { Threads } from './threads'

/** A band of a card; without a colour the card stays bare there. */
export type CardBand = Omit<Band, 'hex'> & { hex: string | null }

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

interface CardShape {
  width: number
  height: number
  /** The bare card at the left, where the title is written. */
  margin: number
  /** The bare card above and below the yarn. */
  head: number
  pitch: number
  threads: number
  least: number
  rise: number
}

const PORTRAIT = { width: 212, height: 316, margin: 38, head: 32 }
const SHAPES: Record<'portrait' | 'landscape' | 'compact', CardShape> = {
  portrait: { ...PORTRAIT, pitch: 4.5, threads: 55, least: 3, rise: 3 },
  landscape: {
    width: 320,
    height: 216,
    margin: 38,
    head: 24,
    pitch: 4.5,
    threads: 36,
    least: 2,
    rise: 4,
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
  },
}

/** How long and wide the winding is, and where it begins, in the card's own units. */
function windingOf({ width, height, margin, head, pitch, threads, rise }: CardShape, end: number) {
  const left = margin + 3
  return {
    left,
    width: width - left - pitch * 0.7 - end,
    top: head + (height - 2 * head - threads * pitch) / 2 + rise / 2,
  }
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
  const { width, height, threads, least, pitch } = SHAPES.portrait
  const winding = windingOf(SHAPES.portrait, 4)
  let thread = 0
  const edges = [0, ...shareOut(bands, threads, least).map((count) => (thread += count))]
  return {
    left: winding.left / width,
    right: (winding.left + winding.width) / width,
    edges: edges.map((at) => (winding.top + at * pitch) / height),
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
  const { width, height, pitch, rise } = shape
  const counts = bands.length > 0 ? shareOut(bands, shape.threads, shape.least) : []
  const { left, top, width: blockWidth } = windingOf(shape, compact ? 2 : 4)
  const blocks = bands.map((band, index) => ({
    band,
    count: counts[index] ?? 0,
    offset: counts.slice(0, index).reduce((sum, count) => sum + count, 0),
  }))
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
      <Card shape={shape} compact={compact} />
      {compact ? null : <Title title={title} shape={shape} />}
      <g data-yarn="" className={winds ? 'animate-wind-on motion-reduce:animate-none' : undefined}>
        {blocks.map(({ band, count, offset }, index) =>
          band.hex === null ? null : (
            <Threads
              key={index}
              hex={band.hex}
              block={{
                x: left,
                y: top + offset * pitch,
                width: blockWidth,
                pitch,
                count,
                rise,
                offset,
              }}
            />
          ),
        )}
        {compact ? null : <Tails shape={shape} bands={bands} left={left} top={top} />}
      </g>
    </svg>
  )
}

function Card({ shape, compact }: { shape: CardShape; compact: boolean }) {
  const { width, height, margin, head, pitch, threads } = shape
  const notches = Math.floor((threads * pitch) / (2 * pitch)) + 1
  const top = (height - notches * 2 * pitch) / 2
  const down = `l${-pitch * 0.7} ${pitch}l${pitch * 0.7} ${pitch}`.repeat(notches)
  const edge = 'var(--yarn-card-edge, #c4c2be)'
  return (
    <>
      <path
        d={`M2.5 .5H${width - 2.5}a2 2 0 0 1 2 2V${top}${down}V${height - 2.5}a2 2 0 0 1-2 2H2.5a2 2 0 0 1-2-2V2.5a2 2 0 0 1 2-2Z`}
        fill="var(--yarn-card, #faf9f8)"
        stroke={edge}
        strokeLinejoin="round"
      />
      <path
        d={`M${margin} ${head - 3}V${height - head + 3}`}
        stroke={edge}
        strokeWidth={compact ? 2 : 3}
        strokeLinecap="round"
      />
      {compact ? null : (
        <circle cx={margin / 2} cy={margin / 2} r="4.5" fill="var(--ground, #fff)" stroke={edge} />
      )}
    </>
  )
}

/** The first yarn comes in through a slit above the winding, the last goes out below it. */
function Tails({
  shape,
  bands,
  left,
  top,
}: {
  shape: CardShape
  bands: readonly CardBand[]
  left: number
  top: number
}) {
  const first = bands[0]?.hex
  const last = bands.at(-1)?.hex
  const { width, head, pitch, threads } = shape
  const bottom = top + threads * pitch
  const stroke = { strokeWidth: pitch * 0.8, strokeLinecap: 'round' as const }
  const near = left + (width - left) * 0.2
  const far = left + (width - left) * 0.72
  return (
    <>
      {first ? (
        <path
          d={`M${far} ${head * 0.45}q${-18} 2-30 ${top - head * 0.45}`}
          stroke={first}
          {...stroke}
        />
      ) : null}
      {last ? (
        <path
          d={`M${near + 26} ${bottom - 2}q${-4} ${head * 0.4}-24 ${head * 0.5}`}
          stroke={last}
          {...stroke}
        />
      ) : null}
    </>
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
