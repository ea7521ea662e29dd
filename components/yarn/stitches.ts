/** One knitted stitch is this wide and this high. */
export const STITCH = { width: 12, height: 9 } as const

const short = (value: number): string => String(Math.round(value * 10) / 10)

/** A drawing of a leg is mirrored for the right one: every x of its path changes its sign. */
interface Leg {
  left: string
  right: string
}

/** From the outer top of a stitch; the legs reach into the row below. */
const BODY: Leg = {
  left: 'c-.5-2.6 3.3-4.2 4.8-1.9l1.1 6.2c.3 2.4 .1 4.9-.2 7.3-3.9-2.3-5.5-6.9-5.7-11.6z',
  right: 'c.5-2.6-3.3-4.2-4.8-1.9l-1.1 6.2c-.3 2.4-.1 4.9 .2 7.3 3.9-2.3 5.5-6.9 5.7-11.6z',
}
/** The two plies of the yarn, twisted: short strokes across the leg. */
const TWIST: Leg = {
  left: 'm.6 2.2l3.6-2m-2.9 4.9l3.6-2m-2.5 4.7l2.8-1.6',
  right: 'm-.6 2.2l-3.6-2m2.9 4.9l-3.6-2m2.5 4.7l-2.8-1.6',
}
/** The light along the back of the leg. */
const LIGHT: Leg = { left: 'm2.1 .1l1.5 6.2', right: 'm-2.1 .1l-1.5 6.2' }

const rowOf =
  (leg: Leg) =>
  (columns: readonly number[]): string =>
    columns
      .map((column) => {
        const x = column * STITCH.width
        return `M${short(x + 0.3)} 1.1${leg.left}M${short(x + STITCH.width - 0.3)} 1.1${leg.right}`
      })
      .join('')

/** A row of knitted stitches: the outlines of those whose column is asked for. */
export const knitRow = rowOf(BODY)
/** The twist of their plies, as strokes. */
export const knitTwist = rowOf(TWIST)
/** The light on them, as strokes. */
export const knitLight = rowOf(LIGHT)

/** How many strokes a leg of marled yarn is laid from. */
export const GRAINS_PER_LEG = 4

/** One turn of marled yarn on a leg of a stitch, as a stroke: 0 at the top of the leg. */
export function legGrain(column: number, row: number, right: boolean, grain: number): string {
  const side = right ? -1 : 1
  const x = column * STITCH.width + (right ? STITCH.width : 0)
  const y = row * STITCH.height + grain * 3.1
  return `M${short(x - side)} ${short(y + 1.6)}l${7 * side} -2.9`
}

/** The height of a crocheted treble, the depth of a round. */
export const TREBLE = 13

/**
 * The trebles of one side of a round of a square, worked outwards: round 1 fans from the centre,
 * which lies at 0 0; the side is the upper one, its corners on the diagonals.
 */
export function trebles(
  round: number,
  count: number,
): { posts: string; tops: string; wraps: string } {
  const inner = (round - 1) * TREBLE
  const outer = round * TREBLE
  const posts: string[] = []
  const tops: string[] = []
  const wraps: string[] = []
  for (let stitch = 0; stitch < count; stitch++) {
    const along = (part: number, half: number) => -half + (2 * half * (stitch + part)) / count
    const head = outer - 4.6
    const [a, b] = [along(0.14, head), along(0.86, head)]
    const foot = along(0.5, inner + 1)
    const wide = round === 1 ? 0.6 : 2
    const mid = (a + b) / 2
    const level = (part: number) => inner + (head - inner) * part
    const at = (part: number) => foot + (mid - foot) * part
    posts.push(
      `M${short(foot - wide)} ${short(-inner + 1)}C${short(at(0.4) - 3)} ${short(-level(0.4))} ${short(a)} ${short(-level(0.7))} ${short(a)} ${short(-head)}L${short(b)} ${short(-head)}C${short(b)} ${short(-level(0.7))} ${short(at(0.4) + 3)} ${short(-level(0.4))} ${short(foot + wide)} ${short(-inner + 1)}z`,
    )
    wraps.push(
      `M${short(at(0.42) - 2.4)} ${short(-level(0.36))}l4.8 -2.6M${short(at(0.72) - 2.7)} ${short(-level(0.66))}l5.4 -2.6`,
    )
    const [c, d] = [along(0.02, outer - 2), along(0.98, outer - 2)]
    tops.push(
      `M${short(c)} ${short(-outer + 4)}C${short(c + 1)} ${short(-outer - 0.6)} ${short(d - 2)} ${short(-outer - 0.4)} ${short(d + 1)} ${short(-outer + 2)}C${short(d - 1)} ${short(-outer + 5.6)} ${short(c + 2)} ${short(-outer + 6)} ${short(c)} ${short(-outer + 4)}z`,
    )
  }
  return { posts: posts.join(''), tops: tops.join(''), wraps: wraps.join('') }
}
