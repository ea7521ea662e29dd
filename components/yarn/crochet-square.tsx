import type { Band } from './bands'
import { ROUNDS, sideStitches } from './cloth-plan'
import { FRAME } from './knit-cloth'
import { TREBLE, trebles } from './stitches'

const SIDES = Array.from({ length: ROUNDS }, (_, at) => trebles(at + 1, sideStitches(at + 1)))

/** The space of two chains at the corner of a round. */
const corner = (round: number) => `M${-round * TREBLE + 5} ${-round * TREBLE + 5}h.1`

/** A flat square of trebles worked in rounds: one side drawn, and turned three times. */
export function CrochetSquare({
  rounds,
  bands,
  id,
}: {
  /** By round from the centre, the index of its yarn. */
  rounds: readonly number[]
  bands: readonly Band[]
  id: string
}) {
  return (
    <g transform={`translate(${FRAME.width / 2} ${FRAME.height / 2})`}>
      <defs>
        <g id={`${id}side`}>
          {rounds
            .map((band, at) => ({ hex: bands[band]!.hex, at }))
            .toReversed()
            .map(({ hex, at }) => {
              const { posts, tops, wraps } = SIDES[at]!
              const [inner, outer] = [at * TREBLE, (at + 1) * TREBLE]
              const ground = `M${-inner} ${-inner}L${-outer} ${-outer}H${outer}L${inner} ${-inner}z`
              return (
                <g key={at}>
                  <path d={ground} fill={hex} stroke={hex} />
                  <path d={ground} fill="#000" fillOpacity="0.6" />
                  <path d={posts} fill={hex} stroke="#000" strokeOpacity="0.3" strokeWidth="0.7" />
                  <path d={wraps} stroke="#000" strokeOpacity="0.2" strokeLinecap="round" />
                  <path d={tops} fill={hex} stroke="#000" strokeOpacity="0.36" strokeWidth="0.7" />
                  <path
                    d={corner(at + 1)}
                    stroke="#000"
                    strokeOpacity="0.5"
                    strokeWidth="5"
                    strokeLinecap="round"
                  />
                </g>
              )
            })}
        </g>
      </defs>
      {[0, 90, 180, 270].map((turn) => (
        <use key={turn} href={`#${id}side`} transform={`rotate(${turn})`} />
      ))}
    </g>
  )
}
