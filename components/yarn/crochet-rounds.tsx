import { shareOut, type Band } from './bands'

const ROUNDS = 9
const STEP = 11
const CENTRE = ROUNDS * STEP + 8

const at = (radius: number, angle: number): string =>
  `${(CENTRE + radius * Math.sin(angle)).toFixed(1)} ${(CENTRE - radius * Math.cos(angle)).toFixed(1)}`

/** One round of stitches: each a V whose point sits in the round before. */
function round(index: number): string {
  const stitches = 6 * (index + 1)
  const inner = index * STEP + 3
  const outer = inner + STEP
  return Array.from({ length: stitches }, (_, stitch) => {
    const middle = ((stitch + 0.5 + (index % 2) * 0.25) / stitches) * 2 * Math.PI
    const half = Math.PI / stitches
    return `M${at(outer, middle - half * 0.55)}L${at(inner, middle)}L${at(outer, middle + half * 0.55)}`
  }).join('')
}

/** A flat circle in double crochet: six stitches more in every round. */
export function CrochetRounds({
  bands,
  label,
  className,
}: {
  bands: readonly Band[]
  id: string
  label: string
  className: string
}) {
  const counts = bands.length > 0 ? shareOut(bands, ROUNDS, 1) : []
  const hexes = bands.flatMap((band, index) =>
    Array.from({ length: counts[index] ?? 0 }, () => band.hex),
  )
  const size = CENTRE * 2
  return (
    <svg
      viewBox={`0 0 ${size} ${size}`}
      width={size}
      height={size}
      fill="none"
      role="img"
      aria-label={label}
      className={className}
    >
      {hexes
        .map((hex, index) => ({ hex, index }))
        .toReversed()
        .map(({ hex, index }) => (
          <g key={index}>
            <circle
              cx={CENTRE}
              cy={CENTRE}
              r={index * STEP + 4 + STEP / 2}
              stroke={hex}
              strokeWidth={STEP + 2}
            />
            <circle
              cx={CENTRE}
              cy={CENTRE}
              r={index * STEP + 4 + STEP / 2}
              stroke="#000"
              strokeOpacity="0.45"
              strokeWidth={STEP + 2}
            />
            <path
              d={round(index)}
              stroke="#000"
              strokeOpacity="0.4"
              strokeWidth="5.6"
              strokeLinejoin="round"
              strokeLinecap="round"
            />
            <path
              d={round(index)}
              stroke={hex}
              strokeWidth="4.4"
              strokeLinejoin="round"
              strokeLinecap="round"
            />
          </g>
        ))}
    </svg>
  )
}
