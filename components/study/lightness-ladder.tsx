import type { ShadeView, StudiedFamily } from '@/lib/shades/present'

import { spreadLabels } from './plot-layout'
import { showCount, showNumber } from './study-words'

const WIDTH = 132
/** Two units to one L*. */
const SCALE = 2
const TOP = 10
const HEIGHT = 2 * TOP + 100 * SCALE
const POST = 46
const RUNG = 24
const GAP = 12
/** With more rungs only the ends are labelled. */
const LABELLED = Math.floor((100 * SCALE) / GAP)
const TICKS = [100, 80, 60, 40, 20, 0]

const yOf = (lightness: number): number => TOP + (100 - lightness) * SCALE

/** How even a ladder is, in words. */
export function evennessInWords({ ladder, shades }: StudiedFamily): string {
  if (ladder.evenness !== null) return `${Math.round(100 * ladder.evenness)} % even`
  return shades.length < 3 ? 'too few to judge' : 'all equally light'
}

/** A family's shades as rungs at their lightness, ruled like a notebook figure. */
export function LightnessLadder({ family }: { family: StudiedFamily }) {
  const { name, shades } = family
  return (
    <figure className="w-33">
      <figcaption>
        <span className="block font-title leading-snug break-words">{name}</span>
        <span className="block text-sm text-ink-faint">
          {showCount(shades.length, 'shade')}, {evennessInWords(family)}
        </span>
      </figcaption>
      <svg
        viewBox={`0 0 ${WIDTH} ${HEIGHT}`}
        width={WIDTH}
        height={HEIGHT}
        fill="none"
        role="img"
        aria-label={`Lightness ladder of ${name}: ${describe(shades)}`}
        className="mt-2"
      >
        {TICKS.map((tick) => (
          <g key={tick}>
            <path d={`M24 ${yOf(tick)}H${WIDTH}`} stroke="var(--hairline)" />
            <text x="20" y={yOf(tick) + 4} textAnchor="end" fontSize="11" fill="var(--ink-faint)">
              {tick}
            </text>
          </g>
        ))}
        <path d={`M${POST} ${TOP}V${HEIGHT - TOP}`} stroke="var(--ink)" strokeWidth="0.75" />
        <Rungs shades={shades} />
      </svg>
    </figure>
  )
}

function describe(shades: readonly ShadeView[]): string {
  const ends = [shades[0]!, ...shades.slice(1).slice(-1)]
  return ends.map(({ label, lab }) => `${label} at L* ${showNumber(lab[0])}`).join(' down to ')
}

function Rungs({ shades }: { shades: readonly ShadeView[] }) {
  const labelled = shades.length <= LABELLED ? shades : [shades[0]!, shades.at(-1)!]
  const marks = labelled.map(({ lab }) => yOf(lab[0]))
  const places = spreadLabels(marks, GAP, TOP, HEIGHT - TOP)
  const end = POST + RUNG / 2
  return (
    <>
      {shades.map(({ id, hex, lab }) => (
        <rect
          key={id}
          x={POST - RUNG / 2}
          y={yOf(lab[0]) - 2.5}
          width={RUNG}
          height="5"
          rx="2.5"
          fill={hex}
          stroke="var(--ink)"
          strokeWidth="0.6"
        />
      ))}
      {labelled.map(({ id, number }, at) => (
        <g key={id}>
          <path
            d={`M${end + 1} ${marks[at]}L${end + 11} ${places[at]}h3`}
            stroke="var(--rule)"
            strokeWidth="0.6"
          />
          <text x={end + 17} y={places[at]! + 4} fontSize="11" fill="var(--ink)">
            {number.length > 9 ? `${number.slice(0, 8)}…` : number}
          </text>
        </g>
      ))}
    </>
  )
}
