import { chromaOf, hueOf, type Lab } from '@/lib/color/types'
import type { StudiedFamily, StudiedGap } from '@/lib/shades/present'

import { outlineOf, spreadLabels, type PlotPoint } from './plot-layout'

const SIZE = 420
const MIDDLE = SIZE / 2
/** From the middle to where the outermost ring is. */
const REACH = 160

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
  const most = Math.max(20, ...labs.map(chromaOf))
  const rings = Array.from({ length: Math.ceil(most / 20) }, (_, at) => 20 * (at + 1))
  const scale = REACH / rings.at(-1)!
  const at = ([, a, b]: Lab): PlotPoint => [MIDDLE + a * scale, MIDDLE - b * scale]
  return (
    <svg
      viewBox={`0 0 ${SIZE} ${SIZE}`}
      fill="none"
      role="img"
      aria-label={`The shades on the a*b* plane: ${families.map(({ name, shades }) => `${name} ${shades.length}`).join(', ')}. Chroma reaches ${Math.round(most)}.`}
      className="mx-auto block h-auto w-full max-w-144"
    >
      {rings.map((chroma) => (
        <g key={chroma}>
          <circle cx={MIDDLE} cy={MIDDLE} r={chroma * scale} stroke="var(--hairline)" />
          <text
            x={MIDDLE + 3}
            y={MIDDLE + chroma * scale - 3}
            fontSize="10"
            fill="var(--ink-faint)"
          >
            {chroma}
          </text>
        </g>
      ))}
      <Axes />
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
      {families.length > 1 ? <FamilyNames families={families} scale={scale} at={at} /> : null}
      {gaps.map(({ lab, number }, index) => {
        const [x, y] = at(lab)
        return (
          <g key={number}>
            <path
              d={`M${x - 6} ${y}h12M${x} ${y - 6}v12`}
              stroke="var(--sheet)"
              strokeWidth="3.5"
            />
            <path d={`M${x - 6} ${y}h12M${x} ${y - 6}v12`} stroke="var(--ink)" strokeWidth="1.5" />
            <text
              x={x + 5}
              y={y - 5}
              fontSize="12"
              fontWeight="600"
              fill="var(--ink)"
              stroke="var(--sheet)"
              strokeWidth="3"
              paintOrder="stroke"
            >
              {gapLetter(index)}
            </text>
          </g>
        )
      })}
    </svg>
  )
}

function Axes() {
  const ends = [
    { text: '+a*', x: SIZE - 4, y: MIDDLE - 5, anchor: 'end' },
    { text: '−a*', x: 4, y: MIDDLE - 5, anchor: 'start' },
    { text: '+b*', x: MIDDLE + 5, y: 12, anchor: 'start' },
    { text: '−b*', x: MIDDLE + 5, y: SIZE - 4, anchor: 'start' },
  ] as const
  return (
    <>
      <path d={`M4 ${MIDDLE}H${SIZE - 4}M${MIDDLE} 4V${SIZE - 4}`} stroke="var(--rule)" />
      {ends.map(({ text, x, y, anchor }) => (
        <text key={text} x={x} y={y} textAnchor={anchor} fontSize="11" fill="var(--ink-faint)">
          {text}
        </text>
      ))}
    </>
  )
}

/** Each family's name beyond its fullest shade, on the side it lies on. */
function FamilyNames({
  families,
  scale,
  at,
}: {
  families: readonly StudiedFamily[]
  scale: number
  at: (lab: Lab) => PlotPoint
}) {
  const placed = families.map(({ id, name, shades }) => {
    const sum = (axis: 1 | 2) => shades.reduce((total, { lab }) => total + lab[axis], 0)
    const middle: Lab = [0, sum(1) / shades.length, sum(2) / shades.length]
    const angle = (hueOf(middle) * Math.PI) / 180
    const beyond = Math.max(...shades.map(({ lab }) => chromaOf(lab))) + 12 / scale
    const [x, y] = at([0, beyond * Math.cos(angle), beyond * Math.sin(angle)])
    return { key: id ?? 'none', name, x, y, isRight: x >= MIDDLE }
  })
  return [true, false].map((side) => {
    const names = placed.filter(({ isRight }) => isRight === side)
    const heights = spreadLabels(
      names.map(({ y }) => y),
      15,
      14,
      SIZE - 10,
    )
    return names.map(({ key, name, x }, index) => {
      const room = name.length * 6.5
      const left = side ? Math.min(x, SIZE - 4 - room) : Math.max(x, 4 + room)
      return (
        <text
          key={key}
          x={left.toFixed(1)}
          y={(heights[index]! + 4).toFixed(1)}
          textAnchor={side ? 'start' : 'end'}
          fontSize="13"
          fill="var(--ink)"
          stroke="var(--sheet)"
          strokeWidth="4"
          paintOrder="stroke"
          style={{ fontFamily: 'var(--font-besley-ext), var(--font-besley), Georgia, serif' }}
        >
          {name}
        </text>
      )
    })
  })
}
