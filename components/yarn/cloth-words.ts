import { bandsInWords, type Band } from './bands'
import { KNIT, ROUNDS, squareRounds, strandedRows, stripeRows, type ClothRow } from './cloth-plan'
import { LONGEST_FLOAT } from './motif'

/** The ways yarns are worked into cloth. */
export const FABRIC_KINDS = ['stripes', 'stranded', 'square', 'marled'] as const
/** One of {@link FABRIC_KINDS}. */
export type FabricKind = (typeof FABRIC_KINDS)[number]

/** The kinds as choices. */
export const FABRIC_LABELS: Record<FabricKind, string> = {
  stripes: 'Stripes',
  stranded: 'Stranded',
  square: 'Crochet',
  marled: 'Marled',
}

const listed = new Intl.ListFormat('en-GB', { type: 'conjunction' })

/** Neighbouring entries that are the same, taken together. */
function runsOf(list: readonly number[]): { band: number; count: number }[] {
  const runs: { band: number; count: number }[] = []
  for (const band of list) {
    const last = runs.at(-1)
    if (last?.band === band) last.count += 1
    else runs.push({ band, count: 1 })
  }
  return runs
}

const hasContrast = (row: ClothRow) => row.contrast !== undefined

/** What is worked, in a sentence or two, for those who listen and for those who want to try it. */
export function clothInWords(kind: FabricKind, bands: readonly Band[]): string {
  const name = (band: number) => bands[band]!.name
  const counted = (runs: { band: number; count: number }[]) =>
    listed.format(runs.map(({ band, count }) => `${count} ${name(band)}`))
  switch (kind) {
    case 'stripes': {
      const rows = stripeRows(bands).map(({ band }) => band)
      return `${KNIT.rows} rows from the top: ${counted(runsOf(rows))}.`
    }
    case 'stranded': {
      const rows = strandedRows(bands)
      const worked = rows.filter(hasContrast)
      const [first] = worked
      if (!first) return 'A stranded band takes two yarns, of which there are a few rows each.'
      const stripes = rows.filter((row) => !hasContrast(row)).map(({ band }) => band)
      const others = [...new Set(stripes)].map(name)
      return (
        `A motif of ${worked.length} rows in ${name(first.contrast!.band)} on ${name(first.band)}, ` +
        `drawn from these colours; no float is longer than ${LONGEST_FLOAT} stitches. ` +
        `Above and below it stripes in ${listed.format(others)}.`
      )
    }
    case 'square':
      return `${ROUNDS} rounds of trebles from the centre: ${counted(runsOf(squareRounds(bands)))}.`
    case 'marled':
      return `All held together as one strand, each turn by its share: ${bandsInWords(bands)}.`
  }
}
