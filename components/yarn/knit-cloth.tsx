import { hexToLab } from '@/lib/color/srgb'
import { shareOut, type Band } from './bands'
import { generateMotif, seedOf } from './motif'
import { knitRow, STITCH } from './stitches'

const COLUMNS = 16
const ROWS = 24

/** A row of knitting: its yarn, and the stitches worked with a second one. */
export interface ClothRow {
  hex: string
  contrast?: { hex: string; columns: readonly number[] }
}

/** Stripes as deep as the shares. */
export function stripeRows(bands: readonly Band[]): ClothRow[] {
  const counts = bands.length > 0 ? shareOut(bands, ROWS, 2) : []
  return bands.flatMap((band, index) =>
    Array.from({ length: counts[index] ?? 0 }, () => ({ hex: band.hex })),
  )
}

/**
 * A motif in the yarn of the largest share and the one that differs most from it in lightness
 * (stranded knitting is read by lightness), between stripes of the others.
 */
export function strandedRows(bands: readonly Band[]): ClothRow[] {
  const main = bands.reduce<Band | undefined>(
    (best, band) => (best && best.share >= band.share ? best : band),
    undefined,
  )
  if (!main) return []
  const lightness = (band: Band) => hexToLab(band.hex)[0]
  const far = (band: Band) => Math.abs(lightness(band) - lightness(main))
  const [contrast = main, ...rest] = bands
    .filter((band) => band !== main)
    .sort((a, b) => far(b) - far(a))
  const motif = generateMotif(seedOf(bands.map((band) => band.hex).join()))
  const plain = (band: Band, count: number): ClothRow[] =>
    Array.from({ length: count }, () => ({ hex: band.hex }))
  const edge = rest.flatMap((band, index) => plain(band, index === 0 ? 2 : 1))
  const pattern = motif.map((row) => ({
    hex: main.hex,
    contrast: {
      hex: contrast.hex,
      columns: Array.from({ length: COLUMNS }, (_, column) => column).filter(
        (column) => row[column % row.length],
      ),
    },
  }))
  const block = [...edge, ...plain(main, 1), ...pattern, ...plain(main, 1), ...edge.toReversed()]
  const border = Math.max(0, ROWS - block.length)
  return [
    ...plain(contrast, Math.floor(border / 2)),
    ...block,
    ...plain(contrast, Math.ceil(border / 2)),
  ]
}

/** Stocking stitch, row by row from the top. */
export function KnitCloth({
  rows,
  id,
  label,
  className,
}: {
  rows: readonly ClothRow[]
  id: string
  label: string
  className: string
}) {
  const width = COLUMNS * STITCH.width
  const height = rows.length * STITCH.height
  const all = Array.from({ length: COLUMNS }, (_, column) => column)
  return (
    <svg
      viewBox={`0 0 ${width} ${height}`}
      width={width}
      height={height}
      role="img"
      aria-label={label}
      className={className}
    >
      <defs>
        <path id={`${id}row`} d={knitRow(all)} />
      </defs>
      <rect width={width} height={height} fill="#1b1a19" />
      <g stroke="#000" strokeOpacity="0.34" strokeWidth="0.8">
        {rows.map((row, index) => (
          <g key={index} transform={`translate(0 ${Math.round(index * STITCH.height * 10) / 10})`}>
            <use href={`#${id}row`} fill={row.hex} />
            {row.contrast ? (
              <path d={knitRow(row.contrast.columns)} fill={row.contrast.hex} />
            ) : null}
          </g>
        ))}
      </g>
    </svg>
  )
}
