import type { Band } from './bands'
import { KNIT, type ClothRow } from './cloth-plan'
import { knitLight, knitRow, knitTwist, STITCH } from './stitches'

/** How large a piece of cloth is drawn, whatever it is worked in. */
export const FRAME = {
  width: KNIT.columns * STITCH.width,
  height: KNIT.rows * STITCH.height,
} as const

const ALL = Array.from({ length: KNIT.columns }, (_, column) => column)
const BODY = knitRow(ALL)
const TWIST = knitTwist(ALL)
const LIGHT = knitLight(ALL)

/** Stocking stitch, row by row from the top: five elements a row at most. */
export function KnitCloth({
  rows,
  bands,
  id,
}: {
  rows: readonly ClothRow[]
  bands: readonly Band[]
  id: string
}) {
  return (
    <>
      <defs>
        <path id={`${id}row`} d={BODY} />
        <g id={`${id}lie`} fill="none" strokeLinecap="round">
          <path d={BODY} stroke="#000" strokeOpacity="0.42" strokeWidth="0.8" />
          <path d={TWIST} stroke="#000" strokeOpacity="0.13" strokeWidth="0.6" />
          <path d={LIGHT} stroke="#fff" strokeOpacity="0.2" strokeWidth="1.6" />
        </g>
      </defs>
      {rows.map(({ band, contrast }, index) => (
        <g key={index} transform={`translate(0 ${index * STITCH.height})`}>
          <rect width={FRAME.width} height={STITCH.height + 4} fill={bands[band]!.hex} />
          <rect width={FRAME.width} height={STITCH.height + 4} fill="#000" fillOpacity="0.6" />
          <use href={`#${id}row`} fill={bands[band]!.hex} />
          {contrast ? (
            <path d={knitRow(contrast.columns)} fill={bands[contrast.band]!.hex} />
          ) : null}
          <use href={`#${id}lie`} />
        </g>
      ))}
    </>
  )
}
