import type { TogetherRow } from '@/lib/names/present'

const WIDTH = 440
const LEFT = 8
const RIGHT = 8
const FOOT = 22
const ROW = 9
/** A name is a thread so thick, and at most so long. */
const THREAD = { width: 22, height: 5 }

/** Names by their number of characters, each a short thread over a ruled scale. */
export function LengthRule({ rows }: { rows: readonly TogetherRow[] }) {
  const byLength = new Map<number, TogetherRow[]>()
  for (const row of rows) {
    const length = row.name.length
    byLength.set(length, [...(byLength.get(length) ?? []), row])
  }
  const most = Math.max(...byLength.keys())
  const scale = (WIDTH - LEFT - RIGHT) / (most + 1)
  const xOf = (length: number) => LEFT + length * scale
  const thread = Math.min(THREAD.width, 0.75 * scale)
  const highest = Math.max(...[...byLength.values()].map(({ length }) => length))
  const foot = highest * ROW + 6
  const ticks = Array.from({ length: Math.floor(most / 5) + 1 }, (_, at) => 5 * at)
  const sorted = [...rows].sort((one, other) => one.name.length - other.name.length)
  const [shortest, longest] = [sorted[0]!, sorted.at(-1)!]
  return (
    <figure>
      <svg
        viewBox={`0 0 ${WIDTH} ${foot + FOOT}`}
        width={WIDTH}
        height={foot + FOOT}
        fill="none"
        role="img"
        aria-label={`Names by length, from ${shortest.name} with ${shortest.name.length} characters to ${longest.name} with ${longest.name.length}`}
        className="h-auto max-w-full"
      >
        <path d={`M${LEFT} ${foot}H${WIDTH - RIGHT}`} stroke="var(--ink)" strokeWidth="0.75" />
        {ticks.map((tick) => (
          <g key={tick}>
            <path d={`M${xOf(tick)} ${foot}v4`} stroke="var(--ink)" strokeWidth="0.75" />
            <text
              x={xOf(tick)}
              y={foot + 17}
              textAnchor="middle"
              fontSize="12"
              fill="var(--ink-faint)"
            >
              {tick}
            </text>
          </g>
        ))}
        {[...byLength].flatMap(([length, those]) =>
          those.map(({ id, hex }, at) => (
            <rect
              key={id}
              x={xOf(length) - thread / 2}
              y={foot - (at + 1) * ROW}
              width={thread}
              height={THREAD.height}
              rx={THREAD.height / 2}
              fill={hex}
              stroke="var(--ink)"
              strokeWidth="0.5"
            />
          )),
        )}
      </svg>
      <figcaption className="mt-2 max-w-measure text-sm text-ink-soft">
        Names by their characters. Shortest: {shortest.name}; longest: {longest.name}.
      </figcaption>
    </figure>
  )
}
