import fc from 'fast-check'
import { describe, expect, it, test } from 'vitest'

import { hexToLab } from '@/lib/color/srgb'
import { colorColumns } from '@/lib/shades/color'
import { guessMapping, mappingProblems, readRows, shadesToCsv } from '@/lib/shades/csv'
import { badRowsCsv, describeError, parseSheet } from '@/lib/shades/csv-text'
import { planImport } from '@/lib/shades/plan-import'
import type { ShadeRow } from '@/lib/shades/present'
import { SHADE_STATUSES, type ReadingTerms } from '@/lib/shades/constants'

function read(text: string, terms: ReadingTerms | null = null) {
  const sheet = parseSheet(text)
  const mapping = guessMapping(sheet.header)
  expect(mappingProblems(mapping, terms)).toEqual([])
  return readRows(sheet, mapping, terms)
}
const errorsOf = (text: string, terms: ReadingTerms | null = null) =>
  read(text, terms).flatMap(({ row, errors }) => errors.map((error) => describeError(row, error)))

const HEAD = 'number,name,status,L,a,b,illuminant,observer,hex,order\n'

describe('the header', () => {
  test.each([
    ['No.;Shade name;L*;a*;b*', { number: 0, name: 1, L: 2, a: 3, b: 4, hex: null }],
    ['Shade,Name,CIELAB_L,CIELAB_A,CIELAB_B', { number: 0, name: 1, L: 2, a: 3, b: 4 }],
    ['HEX,Status,Shade Number', { hex: 0, status: 1, number: 2 }],
    ['b,a,L,id,Illuminant/Observer', { b: 0, a: 1, L: 2, number: 3, illuminant: 4 }],
  ])('%s is understood', (header, expected) => {
    expect(guessMapping(parseSheet(`${header}\nx`).header)).toMatchObject(expected)
  })

  it('must name the numbers and all of Lab or none', () => {
    const mapping = guessMapping(['name', 'L', 'a'])
    expect(mappingProblems(mapping, 'D65/10')).toEqual([
      'Choose the column that holds the shade numbers.',
      'A Lab colour needs three columns: choose L, a and b, or none of them.',
    ])
  })

  it('may not give one column two meanings', () => {
    const mapping = { ...guessMapping(['number', 'hex']), name: 0 }
    expect(mappingProblems(mapping, null)).toEqual([
      'One column is chosen for two things. Each column can hold one.',
    ])
  })

  it('that does not say the light and the observer asks; nothing is assumed', () => {
    const mapping = guessMapping(['number', 'L', 'a', 'b'])
    expect(mappingProblems(mapping, null)).toEqual([
      'The file does not say under which light and observer L, a and b were read: choose.',
    ])
    expect(mappingProblems(mapping, 'D65/2')).toEqual([])
  })
})

describe('a row', () => {
  it('is a shade with its reading as it stands', () => {
    const [row] = read(`${HEAD}14,Moss,Approved,54.2,-12,8.1,D65,10,,3\n`)
    expect(row?.shade).toEqual({
      number: '14',
      name: 'Moss',
      status: 'approved',
      color: { labL: 54.2, labA: -12, labB: 8.1, illuminant: 'D65', observer: 10, hex: null },
      position: 2,
    })
  })

  it('with a hex is D65 and 2°, and keeps the hex', () => {
    const [labL, labA, labB] = hexToLab('#7a8b4f')
    const [row] = read('number,hex\n14,7A8B4F\n')
    expect(row?.shade?.color).toEqual({
      labL,
      labA,
      labB,
      illuminant: 'D65',
      observer: 2,
      hex: '#7a8b4f',
    })
  })

  it('with decimal commas is read after semicolons, tabs or within quotes', () => {
    const texts = [
      'number;L;a;b\n1;54,2;-12,5;8\n',
      'number\tL\ta\tb\n1\t54,2\t-12,5\t8\n',
      'number,L,a,b\n1,"54,2","-12,5",8\n',
    ]
    for (const text of texts) {
      expect(read(text, 'D65/10')[0]?.shade?.color).toMatchObject({
        labL: 54.2,
        labA: -12.5,
        labB: 8,
      })
    }
  })

  it('with decimal commas not in quotes is refused, and says why', () => {
    expect(errorsOf('number,L,a,b\n1,54,2,-12,5,8\n', 'D65/10')).toEqual([
      'Row 2, number: the row has 6 cells and the header 4: is there a comma in a cell without quotation marks?',
    ])
  })

  test.each([
    ['D65', '10'],
    ['d65', '10°'],
    ['D65/10', ''],
    ['D65/10°', '10'],
    ['', 'D65, 10 deg'],
  ])('says its terms as %j and %j', (illuminant, observer) => {
    const [row] = read(`${HEAD}1,,,50,0,0,"${illuminant}","${observer}",,\n`)
    expect(row?.shade?.color?.observer).toBe(10)
  })

  test.each([
    ['1,,,50,0,0,D50,2,,', 'Row 2, illuminant: “D50” is not D65: only readings under D65'],
    ['1,,,50,0,0,,10,,', 'Row 2, illuminant: the row does not say under which light'],
    ['1,,,50,0,0,D65,,,', 'Row 2, observer: the row does not say by which observer, 2 or 10'],
    ['1,,,50,0,0,D65,5,,', 'Row 2, observer: “5” is no observer: write 2 or 10'],
    ['1,,,abc,0,0,D65,10,,', 'Row 2, L: “abc” is not a number: give L'],
    ['1,,,50,,0,D65,10,,', 'Row 2, a: give a'],
    ['1,,,5 0,0,0,D65,10,,', 'Row 2, L: “5 0” is not a number'],
    ['1,,,120,0,0,D65,10,,', 'Row 2, L: give L from 0 to 100'],
    [',,,50,0,0,D65,10,,', 'Row 2, number: give the shade a number'],
    ['1,,done,50,0,0,D65,10,,', 'Row 2, status: “done” is no status: write target, dipped,'],
    ['1,,,,,,,,#12,', 'Row 2, hex: give a hex colour such as #7a8b4f'],
    ['1,,,,,,D65,10,#123456,', 'Row 2, observer: a hex colour is D65 and 2°: leave this empty'],
    ['1,,,,,,,,,', 'Row 2, L: there is no colour: give L, a and b, or a hex'],
    ['1,,,50,0,0,D65,10,,first', 'Row 2, order: “first” is not a whole number'],
    ['1,,,50,0,0,D65,10,,0', 'Row 2, order: the first place is 1'],
  ])('%s is bad: %s', (line, message) => {
    const errors = errorsOf(`${HEAD}${line}\n`)
    expect(errors).toHaveLength(1)
    expect(errors[0]).toContain(message)
  })

  it('that says its terms is not overruled by those chosen for the file', () => {
    const rows = read(`${HEAD}1,,,50,0,0,D65,2,,\n2,,,50,0,0,,,,\n`, 'D65/10')
    expect(rows.map(({ shade }) => shade?.color?.observer)).toEqual([2, 10])
  })

  it('with Lab and hex takes Lab and says so', () => {
    const [row] = read(`${HEAD}1,,,50,0,0,D65,10,#777777,\n`)
    expect(row?.shade?.color?.hex).toBeNull()
    expect(row?.note).toMatch(/hex is left out/)
  })

  it('that has the number of another, in whatever case, is bad, and so is the other', () => {
    expect(errorsOf('number,hex\nq1,#111111\nQ2,#222222\nQ1,#333333\n')).toEqual([
      'Row 2, number: “q1” stands in row 4 as well',
      'Row 4, number: “Q1” stands in row 2 as well',
    ])
  })
})

describe('bad rows', () => {
  it('go out as they stood, with the reason', () => {
    const sheet = parseSheet('number;L;a;b;remark\n1;x;-12,5;8;=A1\n2;50;0;0;fine\n')
    const rows = readRows(sheet, guessMapping(sheet.header), 'D65/10')
    const back = parseSheet(
      badRowsCsv(
        sheet.header,
        rows.filter(({ shade }) => !shade),
      ),
    )
    expect(back.header).toEqual(['number', 'L', 'a', 'b', 'remark', 'reason'])
    expect(back.rows.map(({ cells }) => cells)).toEqual([
      ['1', 'x', '-12,5', '8', '=A1', 'Row 2, L: “x” is not a number: give L'],
    ])
  })
})

/** Shades as the database may hold them. */
const text = (most: number) =>
  fc
    .string({
      unit: fc.oneof(
        fc.constantFrom(...'=+-@\',;"é ß中'),
        fc.string({ minLength: 1, maxLength: 1 }),
      ),
      maxLength: most,
    })
    .map((one) =>
      one
        .normalize('NFC')
        .replace(/\p{Cc}/gu, '')
        .replace(/\s+/gu, ' ')
        .trim(),
    )
const within = (most: number) =>
  fc.double({ min: -most, max: most, noNaN: true }).map((value) => value + 0)
const color = fc.oneof(
  fc
    .tuple(within(100).map(Math.abs), within(150), within(150), fc.constantFrom('D65/2', 'D65/10'))
    .map(([L, a, b, terms]) =>
      colorColumns({ kind: 'lab', L, a, b, terms: terms as ReadingTerms }),
    ),
  fc
    .integer({ min: 0, max: 0xffffff })
    .map((value) => colorColumns({ kind: 'hex', hex: `#${value.toString(16).padStart(6, '0')}` })),
)
const shades = fc.uniqueArray(
  fc
    .record({
      number: text(16).filter((one) => one !== '' && one.length <= 16),
      name: text(60).map((one) => (one.length <= 60 && one) || null),
      status: fc.constantFrom(...SHADE_STATUSES),
      position: fc.integer({ min: 0, max: 9_999 }),
      color,
    })
    .map(({ color: columns, ...fields }): ShadeRow => ({
      id: 'id',
      version: 1,
      familyId: null,
      familyPinned: false,
      familyPosition: null,
      ...fields,
      ...columns,
    })),
  { minLength: 1, maxLength: 30, selector: ({ number }) => number.toLowerCase() },
)

describe('what went out', () => {
  it('comes in again unchanged', () => {
    fc.assert(
      fc.property(shades, (line) => {
        const plan = planImport(read(shadesToCsv(line)), line, new Map())
        expect(plan.map(({ outcome }) => outcome)).toEqual(line.map(() => 'unchanged'))
      }),
      { numRuns: 300 },
    )
  })

  it('makes the same shades in an empty line, with drafts of their names', () => {
    fc.assert(
      fc.property(shades, (line) => {
        const plan = planImport(read(shadesToCsv(line)), [], new Map())
        expect(
          plan.map((row) => (row.outcome === 'new' ? [row.shade, row.draft] : row.outcome)),
        ).toEqual(
          line.map(({ number, name, status, position, hex, ...shade }) => [
            {
              number,
              status,
              position,
              hex,
              labL: shade.labL,
              labA: shade.labA,
              labB: shade.labB,
              illuminant: shade.illuminant,
              observer: shade.observer,
            },
            name,
          ]),
        )
      }),
    )
  })
})
