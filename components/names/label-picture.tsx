import { cn } from '@/components/ui/cn'
import type { LabelSetting, SetName } from '@/lib/naming/label'

const MM_PER_POINT = 25.4 / 72
/** Of the paper about the room for the name, mm. */
const MARGIN = 4
/** How far apart the lines of a name stand, in its size. */
const LEADING = 1.16
/** From a line's foot up to the top of its capitals, in its size. */
const CAPITALS = 0.72
/** What stands under the name, pt, and how much room a letter of it takes in its size. */
const SMALL = 6.5
const SMALL_LETTER = 0.5
/** The room for a dye lot that is stamped on later, its words included, mm. */
const DYE_LOT = 22

const TITLE = 'var(--font-besley-ext), var(--font-besley), Georgia, serif'
const BODY = 'var(--font-hanken-ext), var(--font-hanken), system-ui, sans-serif'

/** Words in lines of so many letters at most; one that is longer has a line of its own. */
function breakWords(text: string, letters: number): string[] {
  const lines: string[] = []
  for (const word of text.split(/\s+/).filter(Boolean)) {
    const last = lines.at(-1)
    if (last !== undefined && last.length + 1 + word.length <= letters)
      lines[lines.length - 1] = `${last} ${word}`
    else lines.push(word)
  }
  return lines
}

const millimetres = (value: number): string => `${Number(value.toFixed(1))} mm`

function inWords({ lines, over }: SetName, { width, size }: LabelSetting, number: string): string {
  const set = lines.map(({ text }) => text).join(' / ')
  const fits = over > 0 ? `, ${millimetres(over)} too wide` : ''
  return `Ball band with ${millimetres(width)} for the name in ${size} pt: ${set || 'no name'}${fits}, No. ${number}`
}

/**
 * The ball band as a drawing whose unit is the millimetre, the name in the letters it is printed
 * in: at `scale` 1 it has its true size on paper. A name that is too wide stands out over the
 * edges. `measured` draws the room for the name under it.
 */
export function LabelPicture({
  set,
  setting,
  number,
  fibre,
  care,
  scale = 1,
  measured = true,
  className,
}: {
  set: SetName
  setting: LabelSetting
  number: string
  /** "80 % wool, 20 % silk" */
  fibre: string
  /** In words; may be empty. */
  care: string
  scale?: number
  measured?: boolean
  className?: string
}) {
  const { width } = setting
  const size = setting.size * MM_PER_POINT
  const small = SMALL * MM_PER_POINT
  const lead = small * 1.3
  const letters = Math.floor(width / (small * SMALL_LETTER))
  const hasRoomForLot = (4 + number.length) * small * SMALL_LETTER + DYE_LOT <= width
  const told = [fibre, care].flatMap((text) => breakWords(text, letters))

  const rows = Math.max(1, set.lines.length)
  const top = MARGIN + CAPITALS * size
  const toName = top + (rows - 1) * LEADING * size + 0.3 * size
  const numberAt = toName + 0.25 * size + small
  const toldAt = numberAt + 1.5 * lead
  const height = (told.length > 0 ? toldAt + (told.length - 1) * lead : numberAt) + MARGIN
  const sideways = MARGIN + Math.max(0, set.over / 2 - MARGIN + 0.5)
  const whole = { width: width + 2 * sideways, height: height + (measured ? 5.5 : 0.4) }
  const middle = width / 2

  return (
    <svg
      role="img"
      aria-label={inWords(set, setting, number)}
      viewBox={`${-sideways} -0.2 ${whole.width} ${whole.height}`}
      width={`${whole.width * scale}mm`}
      height={`${whole.height * scale}mm`}
      className={cn('h-auto max-w-full', className)}
    >
      <rect
        x={-MARGIN}
        width={width + 2 * MARGIN}
        height={height}
        fill="var(--yarn-card, #faf9f8)"
        stroke="var(--yarn-card-edge, #c4c2be)"
        strokeWidth={0.2}
      />
      <g fill="var(--ink, #222)" textAnchor="middle" style={{ fontVariantLigatures: 'none' }}>
        {set.lines.map(({ text, width: wide }, at) => (
          <text
            key={at}
            x={middle}
            y={top + at * LEADING * size}
            // Whatever face is there yet, the line is as wide as it will be printed.
            {...(wide > 0 ? { textLength: wide, lengthAdjust: 'spacingAndGlyphs' } : {})}
            style={{ fontFamily: TITLE, fontWeight: 400, fontSize: `${size}px` }}
          >
            {text}
          </text>
        ))}
        <g style={{ fontFamily: BODY, fontSize: `${small}px` }}>
          <text x={0} y={numberAt} textAnchor="start" fontWeight={600}>
            No. {number}
          </text>
          {hasRoomForLot ? (
            <>
              <text x={width - 14} y={numberAt} textAnchor="end">
                Dye lot
              </text>
              <path
                d={`M${width - 13} ${numberAt + 0.3}h13`}
                stroke="var(--rule, #888)"
                strokeWidth={0.15}
              />
            </>
          ) : null}
          {told.map((line, at) => (
            <text key={at} x={0} y={toldAt + at * lead} textAnchor="start">
              {line}
            </text>
          ))}
        </g>
      </g>
      {measured ? (
        <g stroke="var(--rule, #888)" strokeWidth={0.15}>
          <path d={`M0 1V${toName}M${width} 1V${toName}`} strokeDasharray="0.8 0.8" />
          <path
            d={`M0 ${height + 2.2}H${width}M0 ${height + 1.2}v2M${width} ${height + 1.2}v2`}
            fill="none"
          />
          <text
            x={middle}
            y={height + 4.9}
            textAnchor="middle"
            stroke="none"
            fill="var(--ink-faint, #777)"
            style={{ fontFamily: BODY, fontSize: `${small}px` }}
          >
            {millimetres(width)}
          </text>
        </g>
      ) : null}
    </svg>
  )
}
