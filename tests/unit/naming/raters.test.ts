import { describe, expect, test } from 'vitest'

import { fleissKappa } from '@/scripts/lib/fleiss-kappa'
import { countSheets, readSheet, writeSheet, type Judged } from '@/scripts/lib/rater-sheets'

describe('Fleiss’ kappa', () => {
  test('is 0.210 for the worked example of ten subjects, five categories and fourteen raters', () => {
    // From memory: the example that goes with the measure in textbooks.
    const { observed, byChance, kappa } = fleissKappa([
      [0, 0, 0, 0, 14],
      [0, 2, 6, 4, 2],
      [0, 0, 3, 5, 6],
      [0, 3, 9, 2, 0],
      [2, 2, 8, 1, 1],
      [7, 7, 0, 0, 0],
      [3, 2, 6, 3, 0],
      [2, 5, 3, 2, 2],
      [6, 5, 2, 1, 0],
      [0, 2, 2, 3, 7],
    ])
    expect(observed).toBeCloseTo(0.378, 3)
    expect(byChance).toBeCloseTo(0.213, 3)
    expect(kappa).toBeCloseTo(0.21, 3)
  })

  test('is 1 where all agree, below 0 where they agree less than by chance, none where nothing differs', () => {
    expect(
      fleissKappa([
        [3, 0],
        [0, 3],
      ]).kappa,
    ).toBe(1)
    expect(
      fleissKappa([
        [1, 1],
        [1, 1],
      ]).kappa,
    ).toBe(-1)
    expect(fleissKappa([[3, 0]]).kappa).toBeNull()
  })

  test('needs every rater’s mark of every subject', () => {
    expect(() => fleissKappa([])).toThrow(RangeError)
    expect(() =>
      fleissKappa([
        [2, 1],
        [2, 0],
      ]),
    ).toThrow(RangeError)
  })
})

describe('raters’ sheets', () => {
  const blank = writeSheet('Two shades', [
    { shade: '11', hex: '#f0e8d8', names: ['By the whey', 'Purls of wisdom'] },
    { shade: '64', hex: '#2f6f9f', names: ['Wait and sea'] },
  ])
  const filled = (...marks: string[]): Judged[] => {
    let at = 0
    return readSheet(blank.replaceAll('|  |  |', () => `| ${marks[at++]} | by the way |`))
  }

  test('are read as they were written, and not before they are filled', () => {
    expect(filled('y', 'S', 'n')).toEqual([
      { shade: '11', name: 'By the whey', mark: 'y' },
      { shade: '11', name: 'Purls of wisdom', mark: 's' },
      { shade: '64', name: 'Wait and sea', mark: 'n' },
    ])
    expect(() => readSheet(blank)).toThrow('“By the whey”')
  })

  test('count a y only with the saying beside it', () => {
    expect(readSheet(blank.replaceAll('|  |  |', '| y |  |')).map(({ mark }) => mark)).toEqual([
      'g',
      'g',
      'g',
    ])
  })

  test('are counted by shade, by majority and by agreement', () => {
    const table = countSheets([filled('y', 'y', 'n'), filled('y', 'g', 'y'), filled('y', 's', 'y')])
    expect(table).toContain('| 11 | 2 | 1 | 1 | 1 | 2 |')
    expect(table).toContain('| 64 | 0 | 1 | 1 | 1 | 1 |')
    expect(table).toContain('marked y: 2 of 3.')
    // Of three pairs of raters: three agree on the first name, one on each of the others.
    expect(table).toContain('| y or not | 55.6 % |')
  })

  test('of different names are not counted together', () => {
    const other = filled('y', 'y', 'y').map((one) => ({ ...one, name: 'Sea you later' }))
    expect(() => countSheets([filled('y', 'y', 'y'), other])).toThrow(RangeError)
    expect(() => countSheets([filled('y', 'y', 'y')])).toThrow(RangeError)
  })
})
