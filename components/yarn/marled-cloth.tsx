import type { Band } from './bands'
import { MARL, marlTurns } from './cloth-plan'
import { FRAME } from './knit-cloth'
import { GRAINS_PER_LEG, knitRow, legGrain, STITCH } from './stitches'

const SCALE = FRAME.width / (MARL.columns * STITCH.width)
const STRAND_TURNS = 50
const STRAND = { bottom: 38, left: 4, pitch: (FRAME.width - 20) / STRAND_TURNS }

const ALL = Array.from({ length: MARL.columns }, (_, column) => column)
const ROWS = Array.from({ length: MARL.rows }, (_, row) => row)
const BODY = knitRow(ALL)

/** The strokes of each yarn over the whole piece, leg by leg along the rows. */
function grainsOf(bands: readonly Band[]): string[] {
  const turns = marlTurns(bands, MARL.rows * MARL.columns * 2 * GRAINS_PER_LEG)
  const paths = bands.map(() => [] as string[])
  turns.forEach((band, turn) => {
    const grain = turn % GRAINS_PER_LEG
    const leg = Math.floor(turn / GRAINS_PER_LEG)
    const column = Math.floor(leg / 2) % MARL.columns
    const row = Math.floor(leg / 2 / MARL.columns)
    paths[band]!.push(legGrain(column, row, leg % 2 === 1, grain))
  })
  return paths.map((path) => path.join(''))
}

/** The turns of each yarn along the strand, slanted as they are twisted. */
function turnsOf(bands: readonly Band[]): string[] {
  const paths = bands.map(() => [] as string[])
  marlTurns(bands, STRAND_TURNS).forEach((band, turn) => {
    const x = Math.round((turn * STRAND.pitch + STRAND.left) * 10) / 10
    paths[band]!.push(`M${x} ${STRAND.bottom}c3.5-.6 4-5 6-10s2.5-9.4 6-10`)
  })
  return paths.map((path) => path.join(''))
}

/** The five held together as one strand, and the cloth it makes: two elements a yarn and a row. */
export function MarledCloth({ bands, id }: { bands: readonly Band[]; id: string }) {
  const width = MARL.columns * STITCH.width
  const strand = `M8 ${STRAND.bottom - 10}H${FRAME.width - 8}`
  return (
    <>
      <defs>
        <path id={`${id}marl`} d={BODY} />
        <clipPath id={`${id}legs`}>
          {ROWS.map((row) => (
            <use key={row} href={`#${id}marl`} y={row * STITCH.height} />
          ))}
        </clipPath>
      </defs>
      <g strokeLinecap="round">
        <path d={strand} stroke="#2c2a28" strokeWidth="19" />
        {turnsOf(bands).map((turns, band) => (
          <path key={band} d={turns} stroke={bands[band]!.hex} strokeWidth={STRAND.pitch - 0.2} />
        ))}
        <path
          d={strand}
          stroke="#fff"
          strokeOpacity="0.14"
          strokeWidth="5"
          transform="translate(0 -4)"
        />
        <path
          d={strand}
          stroke="#000"
          strokeOpacity="0.2"
          strokeWidth="5"
          transform="translate(0 8)"
        />
      </g>
      <g transform={`translate(0 ${STRAND.bottom + 16}) scale(${SCALE})`}>
        <rect width={width} height={MARL.rows * STITCH.height - 1} fill="#2c2a28" />
        <g clipPath={`url(#${id}legs)`} strokeWidth="3.2">
          {grainsOf(bands).map((grains, band) => (
            <path key={band} d={grains} stroke={bands[band]!.hex} />
          ))}
        </g>
        <g stroke="#000" strokeOpacity="0.5" strokeWidth="0.7">
          {ROWS.map((row) => (
            <use key={row} href={`#${id}marl`} y={row * STITCH.height} />
          ))}
        </g>
      </g>
    </>
  )
}
