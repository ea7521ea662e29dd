import { hexToLab } from '@/lib/color/srgb'
import { threadColors, TURN, VEILS, type ThreadColors } from './thread-model'

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

const round = (value: number): string => String(Math.round(value * 10) / 10)

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
 * A block of parallel threads, slightly twisted, with rounded ends: about seven elements whatever
 * its size. The mean of what it draws is the shade (tests/unit/components/wound-sample.test.tsx).
 */
export function Threads({ hex, block }: { hex: string; block: ThreadBlock }) {
  const colors = threadColors(hex, block.pitch)
  const lightness = hexToLab(hex)[0]
  const { x, y, width, pitch, count, rise } = block
  const rows = Array.from({ length: count }, (_, row) => row)
  const height = count * pitch
  return (
    <>
      {lightness > 90 || lightness < 10 ? (
        // Else white yarn would vanish on the white ground, and black on the black one.
        <path
          data-rim=""
          d={lines(block, 0.5, rows)}
          stroke="var(--yarn-card-edge, #c4c2be)"
          strokeWidth={round(pitch + 1.2)}
          strokeLinecap="round"
        />
      ) : null}
      <path
        d={lines(block, 0.5, rows)}
        stroke={colors.base}
        strokeWidth={round(pitch)}
        strokeLinecap="round"
      />
      <path
        d={`M${round(x)} ${round(y)}l${round(width)} ${round(-rise)}v${round(height)}l${round(-width)} ${round(rise)}z`}
        fill={colors.base}
      />
      <Veils block={block} rows={rows} colors={colors} />
    </>
  )
}

function Veils({
  block,
  rows,
  colors,
}: {
  block: ThreadBlock
  rows: readonly number[]
  colors: ThreadColors
}) {
  const { pitch, offset = 0 } = block
  const turn = pitch * TURN
  return (
    <>
      {VEILS.map((veil, index) =>
        veil.turn ? (
          <path
            key={index}
            d={turns(block, veil.at, rows, turn)}
            transform={`skewX(${-SLANT})`}
            stroke={veil.tone}
            strokeOpacity={colors.opacities[index]}
            strokeWidth={round(veil.width * pitch)}
            strokeDasharray={`${(veil.turn.to - veil.turn.from) * turn} ${(1 - veil.turn.to + veil.turn.from) * turn}`}
            strokeDashoffset={round(-veil.turn.from * turn)}
          />
        ) : (
          <path
            key={index}
            d={lines(block, veil.at, rows, OVER)}
            stroke={veil.tone}
            strokeOpacity={colors.opacities[index]}
            strokeWidth={round(veil.width * pitch)}
          />
        ),
      )}
      {colors.uneven > 0
        ? (['black', 'white'] as const).map((tone, index) => (
            <path
              key={tone}
              d={lines(
                block,
                0.5,
                rows.filter((row) => ((row + offset) * 7) % 3 === index),
                OVER,
              )}
              stroke={tone}
              strokeOpacity={colors.uneven}
              strokeWidth={round(pitch)}
            />
          ))
        : null}
    </>
  )
}
