import { chromaOf, hueOf, type Lab } from '@/lib/color/types'
import type { StudiedFamily, StudiedGap } from '@/lib/shades/present'

import { outlineOf, type PlotPoint } from './plot-layout'

const WIDTH = 420
const TALLEST = 480
/** Round the shades, for the families' names. */
const MARGIN = { x: 58, y: 24 }

/** Where Lab lies in the figure. */
interface Frame {
  at: (lab: Lab) => PlotPoint
  /** Lengths to one unit of Lab. */
  scale: number
  height: number
  origin: PlotPoint
}

function frameOf(labs: readonly Lab[]): Frame {
  // The neutral point is always in the picture, and a grey line does not fill it.
  const span = (axis: 1 | 2) => {
    const values = labs.map((lab) => lab[axis])
    return { low: Math.min(-10, ...values), high: Math.max(10, ...values) }
  }
  const [a, b] = [span(1), span(2)]
  const scale = Math.min(
    (WIDTH - 2 * MARGIN.x) / (a.high - a.low),
    (TALLEST - 2 * MARGIN.y) / (b.high - b.low),
  )
  const left = (WIDTH - (a.high - a.low) * scale) / 2
  return {
    at: (lab) => [left + (lab[1] - a.low) * scale, MARGIN.y + (b.high - lab[2]) * scale],
    scale,
    height: (b.high - b.low) * scale + 2 * MARGIN.y,
    origin: [left - a.low * scale, MARGIN.y + b.high * scale],
  }
}

/** Keeps words readable over lines. */
const HALO = { stroke: 'var(--paper)', strokeWidth: 3, paintOrder: 'stroke' } as const

/** How gaps are called, in the figure and in the list. */
export const gapLetter = (index: number): string => String.fromCharCode(65 + index)

/** The shades on the a*b* plane with their families outlined, and the gaps as crosses. */
export function ColorPlane({
  families,
  gaps,
}: {
  families: readonly StudiedFamily[]
  gaps: readonly StudiedGap[]
}) {
  const labs = families.flatMap(({ shades }) => shades.map(({ lab }) => lab))
  const frame = frameOf([...labs, ...gaps.map(({ lab }) => lab)])
  const { at, height } = frame
  const marks = [...labs, ...gaps.map(({ lab }) => lab)].map(at)
  return (
    <svg
      viewBox={`0 0 ${WIDTH} ${height.toFixed(0)}`}
      fill="none"
      role="img"
      aria-label={`The shades on the a*b* plane: ${families.map(({ name, shades }) => `${name} ${shades.length}`).join(', ')}. Chroma reaches ${Math.round(Math.max(...labs.map(chromaOf)))}.`}
      className="mx-auto block h-auto w-full max-w-144"
    >
      <Paper frame={frame} most={Math.max(20, ...labs.map(chromaOf))} />
      {families.map(({ id, shades }) => (
        <path
          key={id ?? 'none'}
          d={`M${outlineOf(shades.map(({ lab }) => at(lab)))
            .map((point) => point.map((value) => value.toFixed(1)).join(' '))
            .join('L')}Z`}
          stroke="var(--ink)"
          strokeWidth="0.6"
          strokeLinejoin="round"
        />
      ))}
      {families.flatMap(({ shades }) =>
        shades.map(({ id, hex, lab, label, number }) => {
          const [x, y] = at(lab)
          return (
            <circle
              key={id}
              cx={x.toFixed(1)}
              cy={y.toFixed(1)}
              r="4"
              fill={hex}
              stroke="var(--ink)"
              strokeWidth="0.6"
            >
              <title>{label.endsWith(number) ? label : `${label}, No. ${number}`}</title>
            </circle>
          )
        }),
      )}
      {families.length > 1 ? <FamilyNames families={families} marks={marks} frame={frame} /> : null}
      <GapMarks points={gaps.map(({ lab }) => at(lab))} />
    </svg>
  )
}

/** Axes through the neutral point and rings of chroma about it. */
function Paper({ frame: { origin, scale, height }, most }: { frame: Frame; most: number }) {
  const [x0, y0] = origin
  const rings = Array.from({ length: Math.ceil(most / 20) }, (_, at) => 20 * (at + 1))
  const ends = [
    { text: '+a*', x: WIDTH - 2, y: y0 - 4, anchor: 'end' },
    { text: '−a*', x: 2, y: y0 - 4, anchor: 'start' },
    { text: '+b*', x: x0 - 4, y: 10, anchor: 'end' },
    { text: '−b*', x: x0 - 4, y: height - 3, anchor: 'end' },
  ] as const
  // Half-way between two axes, where the rings can be read.
  const slant = Math.SQRT1_2 * scale
  return (
    <>
      <path d={`M0 ${y0}H${WIDTH}M${x0} 0V${height}`} stroke="var(--rule)" strokeWidth="0.75" />
      {ends.map(({ text, x, y, anchor }) => (
        <text key={text} x={x} y={y} textAnchor={anchor} fontSize="10" fill="var(--ink-faint)">
          {text}
        </text>
      ))}
      {rings.map((chroma) => (
        <g key={chroma}>
          <circle cx={x0} cy={y0} r={chroma * scale} stroke="var(--hairline)" />
          <text
            x={x0 - chroma * slant}
            y={y0 + chroma * slant + 3}
            textAnchor="middle"
            fontSize="9"
            fill="var(--ink-faint)"
            {...HALO}
          >
            {chroma}
          </text>
        </g>
      ))}
    </>
  )
}

/** Of the type that families' names are set in: a letter's width at most, and a line's height. */
const TYPE = { width: 7.3, height: 13 }
/** How far from the place it would have a name may go, outward and round, the nearest first. */
const WAYS = [0, 14, 30, 50]
  .flatMap((out) =>
    [0, 15, -15, 35, -35, 60, -60, 90, -90, 130, -130, 180].map((round) => ({ out, round })),
  )
  .sort((one, other) => one.out + Math.abs(one.round) / 2 - other.out - Math.abs(other.round) / 2)

/** Each family's name beyond its fullest shade, on the side it lies on, where nothing else is. */
function FamilyNames({
  families,
  marks,
  frame: { at, scale, height, origin },
}: {
  families: readonly StudiedFamily[]
  /** What no name may cover. */
  marks: readonly PlotPoint[]
  frame: Frame
}) {
  const names: { key: string; name: string; x: number; y: number; width: number }[] = []
  for (const { id, name, shades } of families) {
    const sum = (axis: 1 | 2) => shades.reduce((total, { lab }) => total + lab[axis], 0)
    const hue = hueOf([0, sum(1), sum(2)])
    const reach = Math.max(...shades.map(({ lab }) => chromaOf(lab))) + 12 / scale
    const width = name.length * TYPE.width
    const boxes = WAYS.map(({ out, round }) => {
      const angle = ((hue + round) * Math.PI) / 180
      const beyond = reach + out / scale
      const [x, y] = at([0, beyond * Math.cos(angle), beyond * Math.sin(angle)])
      const left = x >= origin[0] ? x : x - width
      return {
        x: Math.max(2, Math.min(left, WIDTH - 2 - width)),
        y: Math.max(TYPE.height, Math.min(y + TYPE.height / 3, height - 4)),
      }
    })
    const free = boxes.find(
      ({ x, y }) =>
        marks.every(
          ([mx, my]) => mx < x - 6 || mx > x + width + 6 || my > y + 7 || my < y - TYPE.height - 3,
        ) &&
        names.every(
          (other) =>
            other.x > x + width || other.x + other.width < x || Math.abs(other.y - y) > TYPE.height,
        ),
    )
    names.push({ key: id ?? 'none', name, width, ...(free ?? boxes[0]!) })
  }
  return names.map(({ key, name, x, y, width }) => (
    <text
      key={key}
      // Set from the side that faces its shades, since the width is an estimate.
      x={(x + width / 2 >= origin[0] ? x : x + width).toFixed(1)}
      y={y.toFixed(1)}
      textAnchor={x + width / 2 >= origin[0] ? 'start' : 'end'}
      fontSize="12"
      fill="var(--ink)"
      {...HALO}
      style={{ fontFamily: 'var(--font-besley-ext), var(--font-besley), Georgia, serif' }}
    >
      {name}
    </text>
  ))
}

/** Where a letter may stand by its cross. */
const CORNERS: readonly PlotPoint[] = [
  [5, -5],
  [5, 13],
  [-13, -5],
  [-13, 13],
]

/** Crosses, each with its letter where no other letter is. */
function GapMarks({ points }: { points: readonly PlotPoint[] }) {
  const letters: PlotPoint[] = []
  for (const [x, y] of points) {
    const corners = CORNERS.map(([dx, dy]): PlotPoint => [x + dx, y + dy])
    const free = corners.find(([cx, cy]) =>
      letters.every(([lx, ly]) => Math.abs(lx - cx) > 10 || Math.abs(ly - cy) > 12),
    )
    letters.push(free ?? corners[0]!)
  }
  const crosses = points.map(([x, y]) => `M${x - 5} ${y}h10M${x} ${y - 5}v10`).join('')
  return (
    <>
      <path d={crosses} stroke="var(--paper)" strokeWidth="3" />
      <path d={crosses} stroke="var(--ink)" strokeWidth="1.5" />
      {letters.map(([x, y], index) => (
        <text key={index} x={x} y={y} fontSize="11" fontWeight="600" fill="var(--ink)" {...HALO}>
          {gapLetter(index)}
        </text>
      ))}
    </>
  )
}
