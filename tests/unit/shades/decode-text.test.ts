import { describe, expect, it, test } from 'vitest'

import { decodeText } from '@/components/shades/decode-text'

const bytes = (...parts: (number[] | Buffer)[]) =>
  Buffer.concat(parts.map((one) => Buffer.from(one)))
const swapped = (text: string) => Buffer.from(text, 'utf16le').swap16()

describe('the bytes of a CSV file', () => {
  test.each([
    ['UTF-8', Buffer.from('Café'), 'utf-8'],
    ['UTF-8 with a mark', bytes([0xef, 0xbb, 0xbf], Buffer.from('Café')), 'utf-8'],
    ['UTF-16, small end first', bytes([0xff, 0xfe], Buffer.from('Café', 'utf16le')), 'utf-16le'],
    ['UTF-16, big end first', bytes([0xfe, 0xff], swapped('Café')), 'utf-16be'],
    ['Windows-1252', Buffer.from('Café', 'latin1'), 'windows-1252'],
  ])('are read as %s', (_name, file, encoding) => {
    expect(decodeText(file)).toEqual({ text: 'Café', encoding })
  })

  it('that are a workbook say how to get a CSV file', () => {
    expect(decodeText(bytes([0x50, 0x4b, 0x03, 0x04]))).toMatchObject({
      problem: expect.stringContaining('Save it as CSV') as string,
    })
  })

  it('that are no text are refused', () => {
    expect(decodeText(bytes([0x89, 0x00, 0x01]))).toMatchObject({
      problem: expect.stringContaining('not text') as string,
    })
  })
})
