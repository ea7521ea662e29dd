/** A two-colour motif: `true` is the contrast colour; it repeats across. */
export type Motif = readonly (readonly boolean[])[]

/** The longest float a knitter lets run behind the cloth, in stitches (common practice). */
export const LONGEST_FLOAT = 4

/** How many stitches a motif repeats over. */
export const MOTIF_COLUMNS = 8
/** How deep a motif may be, in rows: odd, so that a middle row mirrors it. */
const DEPTHS = [15, 13, 11, 9, 7, 5, 3]
const TRIES = 60
/** The part of a motif that is in the contrast colour. */
const [LEAST, MOST] = [0.3, 0.62]

/** Mulberry32: a small generator with a 32-bit seed (common practice). */
function generator(seed: number): () => number {
  let state = seed >>> 0
  return () => {
    state = (state + 0x6d2b79f5) >>> 0
    let t = state
    t = Math.imul(t ^ (t >>> 15), t | 1)
    t ^= t + Math.imul(t ^ (t >>> 7), t | 61)
    return ((t ^ (t >>> 14)) >>> 0) / 4294967296
  }
}

/** A number from a text, so that the same five yarns always show the same motif. */
export const seedOf = (text: string): number =>
  [...text].reduce((seed, letter) => (Math.imul(seed, 31) + letter.charCodeAt(0)) | 0, 7)

/** The longest run of one colour in a row that repeats across. */
export function longestRun(row: readonly boolean[]): number {
  let longest = 0
  row.forEach((_, start) => {
    let run = 1
    while (run < row.length && row[(start + run) % row.length] === row[start]) run += 1
    longest = Math.max(longest, run)
  })
  return longest
}

/** Single stitches, for a yarn of which there is little. */
const SPOTS: Motif = [0, 2, 0].map((first) =>
  Array.from({ length: MOTIF_COLUMNS }, (_, column) => column % 4 === first),
)

/** How far a stitch is from the middle of a figure: what the figure's rings are. */
const METRICS: readonly ((dx: number, dy: number) => number)[] = [
  (dx, dy) => dx + dy, // diamonds
  (dx, dy) => Math.abs(dx - dy), // crosses
  (dx, dy) => Math.max(dx, dy), // squares
  (dx, dy) => dx + Math.ceil(dy / 2), // tall diamonds
]

/** The part of neighbouring stitches, across and up, that are of one colour. */
function evenness(motif: Motif): number {
  let alike = 0
  let pairs = 0
  motif.forEach((row, at) =>
    row.forEach((stitch, column) => {
      const above = motif[at - 1]?.[column]
      alike += Number(stitch === row[(column + 1) % row.length]) + Number(stitch === above)
      pairs += above === undefined ? 1 : 2
    }),
  )
  return alike / pairs
}

/** Knittable floats, neither colour lost, and a figure rather than checks or stripes. */
const holds = (motif: Motif): boolean => {
  const share = contrastOf(motif) / motif.length
  const even = evenness(motif)
  return (
    share >= LEAST &&
    share <= MOST &&
    even >= 0.4 &&
    even <= 0.62 &&
    motif.every((row) => longestRun(row) <= LONGEST_FLOAT)
  )
}

/** How many rows' worth of stitches there are of each yarn. */
export interface MotifRoom {
  contrast: number
  ground: number
}

/** How much of a motif is in the contrast colour, in rows' worth of stitches. */
export const contrastOf = (motif: Motif): number =>
  motif.flat().filter(Boolean).length / MOTIF_COLUMNS

/**
 * A motif of eight stitches, drawn from a seed: rings about a middle, the same left to right and
 * upside down, as a knitter can keep them in the head, every row in both colours with no float longer
 * than {@link LONGEST_FLOAT}. The deepest there is room for, or else three rows of single stitches;
 * null when there is not even room for those.
 */
export function generateMotif(seed: number, room: MotifRoom): Motif | null {
  const fits = (motif: Motif) => {
    const contrast = contrastOf(motif)
    return contrast <= room.contrast && motif.length - contrast <= room.ground
  }
  for (const depth of DEPTHS) {
    if (depth * LEAST > room.contrast || depth * (1 - MOST) > room.ground) continue
    const next = generator(seed + depth)
    const half = (depth - 1) / 2
    for (let attempt = 0; attempt < TRIES; attempt++) {
      const metric = METRICS[Math.floor(next() * METRICS.length)]!
      const rings = Array.from({ length: half + MOTIF_COLUMNS }, () => next() < 0.5)
      const motif = Array.from({ length: depth }, (_, row) =>
        Array.from({ length: MOTIF_COLUMNS }, (_, column) => {
          const dx = Math.min(column, MOTIF_COLUMNS - column)
          return rings[metric(dx, Math.abs(row - half))]!
        }),
      )
      if (fits(motif) && holds(motif)) return motif
    }
  }
  return fits(SPOTS) ? SPOTS : null
}
