import { inflateSync } from 'node:zlib'

import { unzipSync } from 'fflate'
import { afterAll, beforeAll, describe, expect, test } from 'vitest'

import { buildKit, stepsOf } from '@/lib/exports/build-kit'
import type { ExportDescription } from '@/lib/exports/description'
import { Rasteriser } from '@/lib/exports/rasterise'
import { zipFiles } from '@/lib/exports/zip'
import {
  exportCombination,
  exportDescription,
  exportPhotograph,
} from '../../factories/kit-description'

let rasteriser: Rasteriser
let description: ExportDescription
beforeAll(async () => {
  rasteriser = new Rasteriser()
  description = exportDescription(
    exportCombination({
      photograph: await exportPhotograph(),
      story: 'The water has not noticed yet.\n\nKnit the main colour deep.',
    }),
    exportCombination({ id: 'b2', title: 'שלום' }),
  )
})
afterAll(() => rasteriser.close())

describe('a kit', () => {
  test('holds each combination’s pictures and texts, and what is over all', async () => {
    const steps: number[] = []
    const { zip, texts } = await buildKit(description, rasteriser, async (done) => {
      steps.push(done)
    })
    const name = 'low-sun-high-bracken'
    expect(Object.keys(unzipSync(zip))).toEqual([
      'CREDITS.txt',
      'combination/alt.txt',
      'combination/caption.txt',
      'combination/combination-1080x1080.png',
      'combination/combination-1200x1500.png',
      'combination/combination-1200x630.png',
      'combination/combination.svg',
      `${name}/alt.txt`,
      `${name}/caption.txt`,
      `${name}/${name}-1080x1080.png`,
      `${name}/${name}-1200x1500.png`,
      `${name}/${name}-1200x630.png`,
      `${name}/${name}.svg`,
      'post.html',
      'shades.css',
      'shades.csv',
      'shades.tokens.json',
      'sheet.pdf',
    ])
    expect(texts.map(({ id }) => id)).toEqual(['a1', 'b2'])
    expect(steps).toEqual([1, 2, 3])
    expect(steps.at(-1)).toBe(stepsOf(2))
  })

  test('built again from the same selection is the same to the byte', async () => {
    const [first, second] = [
      await buildKit(description, rasteriser),
      await buildKit(description, rasteriser),
    ]
    expect(second.zip.equals(first.zip)).toBe(true)
  })

  test('can be read from the middle: pictures are stored as they are', async () => {
    const { zip, files } = await buildKit(description, rasteriser)
    const entries = unzipSync(zip)
    const pictures = files.filter(({ path }) => path.endsWith('.png'))
    expect(pictures).toHaveLength(6)
    for (const { path, offset, byteLength } of pictures) {
      const part = zip.subarray(offset!, offset! + byteLength)
      expect(part.equals(Buffer.from(entries[path]!))).toBe(true)
    }
  })

  test('tells when a picture cannot be drawn', async () => {
    const combination = exportCombination({
      photograph: await exportPhotograph({ bytes: Buffer.from('not a picture') }),
    })
    await expect(buildKit(exportDescription(combination), rasteriser)).rejects.toThrow(
      /could not be drawn/,
    )
  })
})

describe('the sheet', () => {
  /** The PDF with its compressed streams beside their packed selves. */
  async function readSheet(): Promise<string> {
    const { zip } = await buildKit(description, rasteriser)
    const pdf = Buffer.from(unzipSync(zip)['sheet.pdf']!)
    const text = pdf.toString('latin1')
    const streams = [...text.matchAll(/\/FlateDecode[\s\S]*?stream\r?\n([\s\S]*?)\r?\nendstream/g)]
    const inflated = streams.flatMap(([, packed]) => {
      try {
        return inflateSync(Buffer.from(packed!, 'latin1')).toString('latin1')
      } catch {
        return []
      }
    })
    return [text, ...inflated].join('\n')
  }
  const utf16 = (words: string) =>
    `\u00fe\u00ff${Buffer.from(words, 'utf16le').swap16().toString('latin1')}`

  test('is tagged, names its language and title, and embeds its fonts', async () => {
    const pdf = await readSheet()
    expect(pdf).toMatch(/\/Marked true/)
    expect(pdf).toMatch(/\/Lang \(en-GB\)/)
    expect(pdf).toMatch(/\/DisplayDocTitle true/)
    expect(pdf).toMatch(/\/Title \d+ 0 R/)
    expect(pdf).toContain('(Heronsway DK: combinations)')
    expect(pdf).toContain('<pdfuaid:part>1</pdfuaid:part>')
    const fonts = [...pdf.matchAll(/\/FontDescriptor\n([\s\S]*?)endobj/g)]
    expect(fonts.length).toBeGreaterThan(1)
    for (const [, font] of fonts) expect(font).toMatch(/\/FontFile[23]? \d+ 0 R/)
    expect(pdf).not.toMatch(/\/BaseFont \/(Helvetica|Times)/)
  })

  test('has a heading, pictures in words, a list and a table for each combination', async () => {
    const pdf = await readSheet()
    const elements = [...pdf.matchAll(/\/S \/(\w+)\n/g)].map(([, tag]) => tag)
    const count = (tag: string) => elements.filter((one) => one === tag).length
    expect(count('Document')).toBe(1)
    expect(count('H1')).toBe(2)
    expect(count('Figure')).toBe(3)
    expect([count('L'), count('LI'), count('Table'), count('TR')]).toEqual([2, 10, 2, 12])
    expect(count('P')).toBe(3)
    const alts = [...pdf.matchAll(/\/Alt \(/g)]
    expect(alts).toHaveLength(3)
    expect(pdf).toContain('/Alt (Bracken above a small dark lake)')
    // What the type cannot set is still said.
    expect(pdf).toContain(utf16('שלום'))
  })
})

describe('a zip', () => {
  test('has its files in order under one date, in whatever order they came', () => {
    const files = ['b.txt', 'a.txt', 'c.png'].map((path) => ({ path, bytes: Buffer.from(path) }))
    const one = zipFiles(files)
    expect(zipFiles(files.toReversed()).zip.equals(one.zip)).toBe(true)
    expect(one.files.map(({ path }) => path)).toEqual(['a.txt', 'b.txt', 'c.png'])
  })
})
