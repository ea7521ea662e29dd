import { describe, expect, it, test } from 'vitest'

import { NAME_LIMITS } from '@/lib/names/constants'
import { readLines, readSheetOfIdeas, sameName } from '@/lib/names/read-idea-rows'

describe('names one a line', () => {
  it('are counted by the line, without the marks of a list and empty lines', () => {
    const { rows } = readLines(
      '\uFEFFThyme Will Tell\r\n\r\n- Olive and Let Live\n12. Moss  Likely \n7 Sins',
    )
    expect(rows.map(({ row, text }) => [row, text])).toEqual([
      [1, 'Thyme Will Tell'],
      [3, 'Olive and Let Live'],
      [4, 'Moss Likely'],
      [5, '7 Sins'],
    ])
  })

  it('say what is wrong with one and keep its words', () => {
    const long = 'x'.repeat(NAME_LIMITS.text + 1)
    const [row] = readLines(long).rows
    expect(row).toMatchObject({
      text: long,
      errors: [{ field: 'name', message: 'keep the name to 60 characters' }],
    })
  })

  test.each([
    ['nothing', ' \n\n', /no name in it/],
    ['too many', 'Moss\n'.repeat(NAME_LIMITS.atOnce + 1), /more than 1,000 names/],
  ])('are refused when there is %s', (_what, text, message) => {
    expect(() => readLines(text)).toThrow(message)
  })
})

describe('a file of names', () => {
  test.each([
    ['name,note,shade', 'Plum Job,The best there is,14'],
    ['Idea;Why;No.', 'Plum Job;The best there is;14'],
    ['Shade\tShade name\tComments', '14\tPlum Job\tThe best there is'],
  ])('is read by the words of its header: %s', (header, row) => {
    const read = readSheetOfIdeas(`${header}\n${row}\n`)
    expect(read.unread).toEqual([])
    expect(read.rows).toMatchObject([
      { row: 2, text: 'Plum Job', note: 'The best there is', number: '14', errors: [] },
    ])
  })

  it('needs names alone, and says which columns it passed over', () => {
    const read = readSheetOfIdeas('votes,name\n3,Plum Job\n')
    expect(read).toMatchObject({ columns: { name: 'name' }, unread: ['votes'] })
    expect(read.rows[0]).toMatchObject({ text: 'Plum Job', note: '', number: '' })
  })

  it('counts its rows as a spreadsheet does and tells what is wrong with each', () => {
    const { rows } = readSheetOfIdeas('name,note\nPlum Job,\n,\n,no name\nHip, Hip, Haw\n')
    expect(rows.map(({ row, errors }) => [row, errors.map(({ message }) => message)])).toEqual([
      [2, []],
      [4, ['write a name']],
      [5, [expect.stringMatching(/3 cells and the header 2/)]],
    ])
  })

  it('takes a shade as people write it', () => {
    const { rows } = readSheetOfIdeas(
      'name,shade\nPlum Job,No. 14\nMoss Likely,no 7b\nNot So,Nova\n',
    )
    expect(rows.map(({ number }) => number)).toEqual(['14', '7b', 'Nova'])
  })

  it('without a column of names says what its first row has', () => {
    expect(() => readSheetOfIdeas('Plum Job,best\nMoss Likely,green\n')).toThrow(
      /“name”.*Plum Job, best/,
    )
  })
})

test('a name is the same whatever its case, accents and punctuation', () => {
  expect(sameName('Thyme, Will Tell!')).toBe(sameName('thyme will téll'))
  expect(sameName('Thyme Will Tell')).not.toBe(sameName('Thyme Will'))
  expect(sameName('紫 ')).toBe('紫')
})
