import fc from 'fast-check'
import { describe, expect, it, test } from 'vitest'

import { parseReading } from '@/lib/shades/constants'
import {
  createShadeSchema,
  shadeColor,
  shadeHex,
  shadeName,
  shadeNumber,
  shadeTableSchema,
  updateShadeSchema,
} from '@/lib/shades/schema'

const messagesOf = (result: { success: boolean; error?: { issues: { message: string }[] } }) =>
  result.error?.issues.map(({ message }) => message)

describe('a reading', () => {
  test.each([
    ['54.2', 54.2],
    ['54,2', 54.2],
    ['-3', -3],
    ['\u22123,5', -3.5],
    ['+.5', 0.5],
    [' 7. ', 7],
    ['1e-7', 1e-7],
    ['2.5E1', 25],
  ])('takes %j as %d', (text, value) => {
    expect(parseReading(text)).toBe(value)
  })

  test.each(['', ' ', 'abc', '5 0', '1,234.5', '1.2.3', '--1', '0x10', 'NaN', 'Infinity', '1e999'])(
    'does not take %j',
    (text) => {
      expect(parseReading(text)).toBeNull()
    },
  )

  it('is never −0, which would make an unchanged import look changed', () => {
    expect(Object.is(parseReading('-0'), 0)).toBe(true)
  })

  it('gives back every number that JavaScript writes', () => {
    fc.assert(
      fc.property(fc.double({ noNaN: true, noDefaultInfinity: true }), (value) => {
        expect(parseReading(String(value))).toBe(value + 0)
      }),
    )
  })
})

describe('a colour', () => {
  const lab = { kind: 'lab', L: '54,2', a: '-12', b: '8.1' }

  it('is Lab with its terms, to the last digit', () => {
    expect(shadeColor.parse({ ...lab, terms: 'D65/10' })).toEqual({
      kind: 'lab',
      L: 54.2,
      a: -12,
      b: 8.1,
      terms: 'D65/10',
    })
  })

  test.each([undefined, '', 'D50/2', 'A/10', 'D65'])('is refused in words under %j', (terms) => {
    expect(messagesOf(shadeColor.safeParse({ ...lab, terms }))).toEqual([
      'Say which light and observer it was read under.',
    ])
  })

  test.each([
    [{ L: '' }, 'Give L.'],
    [{ L: 'abc' }, '“abc” is not a number: give L.'],
    [{ L: '101' }, 'Give L from 0 to 100.'],
    [{ a: '-151' }, 'Give a from −150 to 150.'],
  ])('says what is wrong with %j', (wrong, message) => {
    const result = shadeColor.safeParse({ ...lab, ...wrong, terms: 'D65/2' })
    expect(messagesOf(result)).toEqual([message])
  })

  test.each([
    ['#7A8B4F', '#7a8b4f'],
    ['7a8b4f', '#7a8b4f'],
    ['#abc', '#aabbcc'],
  ])('takes the hex %j', (text, hex) => {
    expect(shadeHex.parse(text)).toBe(hex)
  })

  test.each(['', '#12345', 'green', '#7a8b4f80'])('does not take the hex %j', (text) => {
    expect(messagesOf(shadeHex.safeParse(text))).toEqual(['Give a hex colour such as #7a8b4f.'])
  })
})

describe('number and name', () => {
  it('are kept on one line, composed, without blanks at the ends', () => {
    expect(shadeNumber.parse('  Q\n 1 ')).toBe('Q 1')
    expect(shadeName.parse('Moss\u00a0 e\u0301tude ')).toBe('Moss étude')
  })

  it('let a shade be without a name', () => {
    expect(shadeName.parse('  ')).toBeNull()
    expect(shadeName.parse(null)).toBeNull()
  })

  test.each([
    ['  ', 'Give the shade a number.'],
    ['x'.repeat(17), 'Keep the number to 16 characters.'],
    ['1\u0000', 'There is a character in it that cannot be printed.'],
  ])('say what is wrong with the number %j', (number, message) => {
    expect(messagesOf(shadeNumber.safeParse(number))).toEqual([message])
  })

  it('say what is wrong with a name, as wherever names are written down', () => {
    expect(messagesOf(shadeName.safeParse('x'.repeat(61)))).toEqual([
      'Keep the name to 60 characters.',
    ])
    expect(messagesOf(shadeName.safeParse('Moss\u0000'))).toEqual([
      'There is a character in it that cannot be printed.',
    ])
  })

  it('cannot be changed together: a name goes through its review', () => {
    const change = { lineSlug: 'dk', shadeId: crypto.randomUUID(), version: 1 }
    expect(updateShadeSchema.safeParse({ ...change, number: '2' }).success).toBe(true)
    expect(updateShadeSchema.safeParse({ ...change, name: 'Moss' }).success).toBe(false)
  })

  it('refuse fields that no form has', () => {
    const values = {
      lineSlug: 'dk',
      requestKey: crypto.randomUUID(),
      number: '1',
      name: '',
      status: 'target',
      color: { kind: 'hex', hex: '#abc' },
    }
    expect(createShadeSchema.safeParse(values).success).toBe(true)
    expect(createShadeSchema.safeParse({ ...values, brandId: 'x' }).success).toBe(false)
  })
})

describe('the address of the table', () => {
  it('falls back part by part', () => {
    expect(
      shadeTableSchema.parse({
        status: 'approved,nonsense',
        sort: ['L', 'a'],
        dir: 'sideways',
        page: '-3',
        outside: 'yes',
        q: ' moss ',
      }),
    ).toEqual({
      q: 'moss',
      status: ['approved'],
      outside: false,
      sort: 'order',
      dir: 'asc',
      page: 1,
    })
  })
})
