import fc from 'fast-check'
import { describe, expect, it, test } from 'vitest'

import {
  neutraliseCell,
  parseSheet,
  restoreCell,
  sniffDelimiter,
  writeCsv,
} from '@/lib/shades/csv-text'

describe('a CSV file', () => {
  test.each([
    ['a byte-order mark', '\uFEFFnumber,name\r\n1,Moss\r\n'],
    ['semicolons', 'number;name\n1;Moss\n'],
    ['tabs', 'number\tname\n1\tMoss'],
    ['old Mac line ends', 'number,name\r1,Moss\r'],
    ['mixed line ends', 'number,name\r\n1,Moss\n'],
    ['quotes', '"number","name"\n"1","Moss"'],
  ])('is read with %s', (_what, text) => {
    const sheet = parseSheet(text)
    expect(sheet.header).toEqual(['number', 'name'])
    expect(sheet.rows).toEqual([{ row: 2, cells: ['1', 'Moss'] }])
  })

  it('may hold delimiters, line breaks and doubled quotes within quotes', () => {
    const { rows } = parseSheet('number,name\n1,"Dry Stone,\r\n""Wet"" Day"\n2,Moss\n')
    expect(rows).toEqual([
      { row: 2, cells: ['1', 'Dry Stone,\r\n"Wet" Day'] },
      { row: 3, cells: ['2', 'Moss'] },
    ])
  })

  it('counts blank rows as a spreadsheet does, and leaves them out', () => {
    expect(parseSheet('number,name\n\n;,\n , \n1,Moss\n').rows.at(-1)?.row).toBe(5)
    expect(parseSheet('number,name\n\n , \n1,Moss\n\n').rows.map(({ row }) => row)).toEqual([4])
  })

  test.each([
    ['', /first row is empty/],
    ['  \n1,2', /first row is empty/],
    ['number,name\n', /no shade in it/],
    ['number,name\n1,"Moss\n2,Fern', /quotation marks do not match/],
    ['number,name\n1,"Moss"y\n', /quotation marks do not match near line 2/],
  ])('is refused in words when it is %j', (text, words) => {
    expect(() => parseSheet(text)).toThrow(words)
  })

  it('takes 5,000 rows and refuses one more', () => {
    const rows = (count: number) => `number\n${'1\n'.repeat(count)}`
    expect(parseSheet(rows(5_000)).rows).toHaveLength(5_000)
    expect(() => parseSheet(rows(5_001))).toThrow(/more than 5,000 rows/)
  })

  it('has its delimiter found outside quotes', () => {
    expect(sniffDelimiter('"a,b,c";d\n1,2,3,4')).toBe(';')
    expect(sniffDelimiter('number')).toBe(',')
  })
})

describe('text that a spreadsheet would take for a formula', () => {
  test.each(['=1+1', '+4', '-4', '@SUM(A1)', '\t=1', '\r=1', '\n=1', "'=1", "''@x"])(
    'goes out disarmed: %s',
    (text) => {
      expect(neutraliseCell(text)).toMatch(/^'/)
      expect(restoreCell(neutraliseCell(text))).toBe(text)
    },
  )

  it('and any other text come back as they went out', () => {
    const text = fc.oneof(
      fc.string({ unit: 'binary' }),
      fc.string({ unit: fc.constantFrom("'", '=', '+', '-', '@', '\t', '\n', 'a') }),
    )
    fc.assert(
      fc.property(text, (one) => {
        const out = neutraliseCell(one)
        expect(restoreCell(out)).toBe(one)
        expect(out).not.toMatch(/^[=+\-@\t\r\n]/)
      }),
    )
  })
})

describe('writing', () => {
  it('is read back cell by cell, whatever the cells hold', () => {
    const cell = fc.string({
      unit: fc.oneof(fc.constantFrom('"', ',', ';', '\t', '\n', '\r', ' ', 'é'), fc.string()),
    })
    fc.assert(
      fc.property(fc.array(fc.tuple(cell, cell), { minLength: 1 }), (rows) => {
        const filled = rows.map(([one, other]) => [`x${one}`, other.replace(/^'+/, '')])
        const written = writeCsv([['number', 'name'], ...filled])
        expect(parseSheet(written).rows.map(({ cells }) => cells)).toEqual(filled)
      }),
    )
  })
})
