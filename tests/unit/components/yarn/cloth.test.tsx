import { render, screen } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import fc from 'fast-check'
import { describe, expect, test } from 'vitest'

import { AsCloth } from '@/components/yarn/as-cloth'
import type { Band } from '@/components/yarn/bands'
import {
  KNIT,
  MARL,
  marlTurns,
  SHARE_TOLERANCE,
  sideStitches,
  squareRounds,
  strandedRows,
  stripeRows,
  type ClothRow,
} from '@/components/yarn/cloth-plan'
import { clothInWords, FABRIC_KINDS } from '@/components/yarn/cloth-words'
import { Fabric } from '@/components/yarn/fabric'
import { LONGEST_FLOAT, longestRun } from '@/components/yarn/motif'
import { GRAINS_PER_LEG } from '@/components/yarn/stitches'

const HEXES = ['#e3d6be', '#9fb46a', '#7c9a3f', '#2f6b3c', '#1c3a33']
const NAMES = ['Porridge', 'Lichen', 'Moss', 'Fern', 'Tarn']

/** Five colours with whole percents that sum to 100, each at least 2 as the editor gives them. */
const fives = fc
  .record({
    cuts: fc.array(fc.integer({ min: 0, max: 90 }), { minLength: 4, maxLength: 4 }),
    hexes: fc.shuffledSubarray(HEXES, { minLength: 5, maxLength: 5 }),
  })
  .map(({ cuts, hexes }): Band[] => {
    const edges = [0, ...cuts.toSorted((a, b) => a - b), 90]
    return hexes.map((hex, at) => ({
      hex,
      name: NAMES[at]!,
      share: (edges[at + 1]! - edges[at]! + 2) / 100,
    }))
  })

/** How much of all stitches each yarn has. */
function partsOf(stitches: readonly { band: number; count: number }[]): number[] {
  const parts = NAMES.map(() => 0)
  for (const { band, count } of stitches) parts[band]! += count
  const all = parts.reduce((sum, part) => sum + part, 0)
  return parts.map((part) => part / all)
}

const rowsAsStitches = (rows: readonly ClothRow[]) =>
  rows.flatMap(({ band, contrast }) => [
    { band, count: KNIT.columns - (contrast?.columns.length ?? 0) },
    ...(contrast ? [{ band: contrast.band, count: contrast.columns.length }] : []),
  ])

const COUNTED: Record<(typeof FABRIC_KINDS)[number], (bands: Band[]) => number[]> = {
  stripes: (bands) => partsOf(rowsAsStitches(stripeRows(bands))),
  stranded: (bands) => partsOf(rowsAsStitches(strandedRows(bands))),
  square: (bands) =>
    partsOf(squareRounds(bands).map((band, at) => ({ band, count: 4 * sideStitches(at + 1) }))),
  marled: (bands) =>
    partsOf(
      marlTurns(bands, MARL.columns * MARL.rows * 2 * GRAINS_PER_LEG).map((band) => ({
        band,
        count: 1,
      })),
    ),
}

describe('the share of each yarn in the cloth', () => {
  test.each(FABRIC_KINDS)('is its share within the tolerance, counted in stitches: %s', (kind) => {
    fc.assert(
      fc.property(fives, (bands) => {
        COUNTED[kind](bands).forEach((part, at) => {
          expect(Math.abs(part - bands[at]!.share)).toBeLessThanOrEqual(SHARE_TOLERANCE)
        })
      }),
      { numRuns: 300 },
    )
  })

  test('a piece of knitting is always as many rows long', () => {
    fc.assert(
      fc.property(fives, (bands) => {
        expect(stripeRows(bands)).toHaveLength(KNIT.rows)
        expect(strandedRows(bands)).toHaveLength(KNIT.rows)
      }),
    )
  })
})

describe('a stranded band', () => {
  test('always has a motif in two yarns whose floats are short, mirrored both ways', () => {
    fc.assert(
      fc.property(fives, (bands) => {
        const worked = strandedRows(bands).flatMap(({ contrast }) => (contrast ? [contrast] : []))
        expect(worked.length).toBeGreaterThanOrEqual(3)
        const motif = worked.map(({ columns }) =>
          Array.from({ length: KNIT.columns }, (_, column) => columns.includes(column)),
        )
        for (const row of motif) {
          expect(longestRun(row)).toBeLessThanOrEqual(LONGEST_FLOAT)
          expect(new Set(row).size).toBe(2)
        }
        expect(motif.toReversed()).toEqual(motif)
        for (const row of motif) expect(row.slice(1)).toEqual(row.slice(1).toReversed())
      }),
      { numRuns: 200 },
    )
  })

  test('is the same for the same colours, whatever they are called', () => {
    const bands = HEXES.map((hex, at) => ({ hex, share: 0.2, name: NAMES[at]! }))
    expect(strandedRows(bands)).toEqual(strandedRows(bands.map((band) => ({ ...band, name: 'x' }))))
  })

  test('is worked in the largest share and the yarn that stands out from it most', () => {
    const shares = [0.2, 0.2, 0.2, 0.3, 0.1]
    const rows = strandedRows(
      HEXES.map((hex, at) => ({ hex, share: shares[at]!, name: NAMES[at]! })),
    )
    const worked = rows.find(({ contrast }) => contrast)!
    expect([NAMES[worked.band], NAMES[worked.contrast!.band]]).toEqual(['Fern', 'Porridge'])
  })
})

const BANDS = HEXES.map((hex, at) => ({ hex, share: 0.2, name: NAMES[at]! }))

describe('the drawing', () => {
  test.each(FABRIC_KINDS)('has a name and at most 250 elements: %s', (kind) => {
    fc.assert(
      fc.property(fives, (bands) => {
        const { container, unmount } = render(<Fabric bands={bands} kind={kind} />)
        expect(container.querySelectorAll('*').length).toBeLessThanOrEqual(250)
        expect(screen.getByRole('img').getAttribute('aria-label')).toContain('Moss')
        unmount()
      }),
      { numRuns: 8 },
    )
  })

  test('its words count what is drawn', () => {
    expect(clothInWords('stripes', BANDS)).toBe(
      '40 rows from the top: 8 Porridge, 8 Lichen, 8 Moss, 8 Fern and 8 Tarn.',
    )
    expect(clothInWords('stranded', BANDS)).toMatch(
      /^A motif of \d+ rows in Tarn on Porridge, drawn from these colours; no float is longer than 4 stitches\. Above and below it stripes in /,
    )
    expect(clothInWords('square', BANDS)).toMatch(/^11 rounds of trebles from the centre: /)
    expect(clothInWords('marled', BANDS)).toContain('Lichen 20 %')
    expect(clothInWords('stranded', BANDS.slice(0, 1))).toBe(
      'A stranded band takes two yarns, of which there are a few rows each.',
    )
  })

  test('the ways of working are chosen by keyboard', async () => {
    render(<AsCloth bands={BANDS.map(({ hex, ...band }) => ({ color: hex, ...band }))} />)
    expect(screen.getByRole('img').getAttribute('aria-label')).toMatch(/^Stripes/)
    await userEvent.tab()
    await userEvent.keyboard('{ArrowRight}')
    expect(screen.getByRole<HTMLInputElement>('radio', { name: 'Stranded' }).checked).toBe(true)
    expect(screen.getByRole('img').getAttribute('aria-label')).toMatch(/^Stranded/)
    expect(screen.getByText(/no float is longer/)).toBeTruthy()
  })

  test('no yarn yet says what will stand here', () => {
    render(<AsCloth bands={[]} />)
    expect(screen.queryByRole('img')).toBeNull()
    expect(screen.getByText(/Put a shade in a place/)).toBeTruthy()
  })
})
