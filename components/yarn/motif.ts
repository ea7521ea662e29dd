/** A two-colour motif: `true` is the contrast colour; it repeats across. */
export type Motif = readonly (readonly boolean[])[]

/** The longest float a knitter lets run behind the cloth, in stitches (common practice). */
export const LONGEST_FLOAT = 4

const COLUMNS = 8
const ROWS = 9

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

/** The same left to right and upside down, as a knitter can keep in the head; knittable floats. */
const holds = (motif: Motif): boolean => {
  const share = motif.flat().filter(Boolean).length / (COLUMNS * ROWS)
  const alike = motif.filter((row, index) => index > 0 && String(row) === String(motif[index - 1]))
  return (
    share > 0.36 &&
    share < 0.64 &&
    alike.length < 2 &&
    motif.every((row) => longestRun(row) <= LONGEST_FLOAT)
  )
}

/**
 * A small motif, eight stitches by nine rows, drawn from a seed: symmetrical both ways, with no
 * float longer than {@link LONGEST_FLOAT}.
 */
export function generateMotif(seed: number): Motif {
  const next = generator(seed)
  for (;;) {
    const half = Array.from({ length: (ROWS + 1) / 2 }, () => {
      const side = Array.from({ length: COLUMNS / 2 + 1 }, () => next() < 0.5)
      return Array.from(
        { length: COLUMNS },
        (_, column) => side[Math.min(column, COLUMNS - column)] ?? false,
      )
    })
    const motif = [...half, ...half.slice(0, -1).reverse()]
    if (holds(motif)) return motif
  }
}
