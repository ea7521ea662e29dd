import type { ThreadBlock } from './thread-strokes'
import { Threads } from './threads'

/** How large a sample is drawn: in a ledger row, in a picker, alone. */
export type SampleSize = 'row' | 'card' | 'large'

interface SampleShape {
  width: number
  height: number
  block: ThreadBlock
  /** The bare card above and below the yarn. */
  card?: { margin: number; inset: number }
}

const SHAPES: Record<SampleSize, SampleShape> = {
  row: {
    width: 84,
    height: 46,
    block: { x: 3, y: 4, width: 78, pitch: 4, count: 10, rise: 2 },
  },
  card: {
    width: 148,
    height: 104,
    block: { x: 8, y: 19, width: 132, pitch: 5, count: 14, rise: 3 },
    card: { margin: 14, inset: 2 },
  },
  large: {
    width: 300,
    height: 208,
    block: { x: 14, y: 37, width: 272, pitch: 8, count: 18, rise: 5 },
    card: { margin: 27, inset: 3 },
  },
}

/**
 * A shade as yarn wound on card. Where its name stands beside it, leave `label` out and the picture
 * is silent; it scales by class.
 */
export function WoundSample({
  hex,
  size = 'row',
  label,
  className,
}: {
  hex: string
  size?: SampleSize
  label?: string
  className?: string
}) {
  const { width, height, block, card } = SHAPES[size]
  return (
    <svg
      width={width}
      height={height}
      viewBox={`0 0 ${width} ${height}`}
      fill="none"
      className={className ? `shrink-0 ${className}` : 'shrink-0'}
      {...(label ? { role: 'img', 'aria-label': label } : { 'aria-hidden': true })}
    >
      {card ? <CardStrip width={width} height={height} block={block} card={card} /> : null}
      <g data-yarn="">
        <Threads hex={hex} block={block} />
      </g>
    </svg>
  )
}

/** The card under the yarn, with a notch for every second thread and a hole to tie it by. */
function CardStrip({
  width,
  height,
  block,
  card,
}: {
  width: number
  height: number
  block: ThreadBlock
  card: { margin: number; inset: number }
}) {
  const { inset, margin } = card
  const tooth = block.pitch
  const notches = Math.ceil((height - 2 * margin) / (2 * tooth))
  const top = (height - notches * 2 * tooth) / 2
  const down = `l${-tooth * 0.7} ${tooth}l${tooth * 0.7} ${tooth}`.repeat(notches)
  const up = `l${tooth * 0.7} ${-tooth}l${-tooth * 0.7} ${-tooth}`.repeat(notches)
  const right = width - inset - 0.5
  const left = inset + 0.5
  return (
    <>
      <path
        d={`M${left} .5H${right}V${top}${down}V${height - 0.5}H${left}V${height - top}${up}Z`}
        fill="var(--yarn-card, #faf9f8)"
        stroke="var(--yarn-card-edge, #c4c2be)"
        strokeLinejoin="round"
      />
      <circle
        cx={width / 2}
        cy={margin * 0.48}
        r={margin * 0.16}
        fill="var(--ground, #fff)"
        stroke="var(--yarn-card-edge, #c4c2be)"
      />
    </>
  )
}
