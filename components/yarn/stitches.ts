/** One knitted stitch is this wide and this high. */
export const STITCH = { width: 12, height: 9.5 } as const

/** The two legs of a knitted stitch, from the top left of its cell; they reach into the row below. */
const LEGS = 'c-.5-2.2 2.9-3.6 4.2-1.5l1.5 6.8c.3 2 .2 4.2-.1 6.2-3.6-2.4-5.2-6.8-5.6-11.5z'

/** A row of knitted stitches: the outlines of those whose column is asked for. */
export function knitRow(columns: readonly number[]): string {
  return columns
    .map((column) => {
      const x = column * STITCH.width
      return `M${x + 0.3} 1.1${LEGS}M${x + STITCH.width - 0.3} 1.1${mirrored}`
    })
    .join('')
}

const mirrored = 'c.5-2.2-2.9-3.6-4.2-1.5l-1.5 6.8c-.3 2-.2 4.2.1 6.2 3.6-2.4 5.2-6.8 5.6-11.5z'
