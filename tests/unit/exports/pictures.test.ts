import fc from 'fast-check'
import sharp from 'sharp'
import { afterAll, beforeAll, describe, expect, test } from 'vitest'

import { windBands } from '@/components/yarn/card-strokes'
import { deltaE00 } from '@/lib/color/ciede2000'
import { decodeChannel, hexToLab, srgbToLab } from '@/lib/color/srgb'
import { drawingsOf } from '@/lib/exports/build-kit'
import { compose, spread } from '@/lib/exports/compose'
import { PICTURE_SIZES } from '@/lib/exports/constants'
import { Rasteriser } from '@/lib/exports/rasterise'
import { svgOf } from '@/lib/exports/svg'
import { widthOf } from '@/lib/exports/typeset'
import {
  exportCombination,
  exportDescription,
  exportPhotograph,
  exportShades,
} from '../../factories/kit-description'

let rasteriser: Rasteriser
beforeAll(() => {
  rasteriser = new Rasteriser()
})
afterAll(() => rasteriser.close())

const encode = (light: number) =>
  light <= 0.0031308 ? light * 12.92 : 1.055 * light ** (1 / 2.4) - 0.055

/** Without blanks, since a line may end anywhere. */
const bare = (text: string) => text.replaceAll(' ', '')

/** The mean of a rectangle of raw pixels, taken in linear light. */
function meanLab(
  data: Buffer,
  width: number,
  area: { x: number; y: number; width: number; height: number },
) {
  const sums = [0, 0, 0]
  let count = 0
  for (let y = Math.ceil(area.y); y < Math.floor(area.y + area.height); y++) {
    for (let x = Math.ceil(area.x); x < Math.floor(area.x + area.width); x++) {
      for (const channel of [0, 1, 2])
        sums[channel]! += decodeChannel(data[(y * width + x) * 3 + channel]! / 255)
      count++
    }
  }
  const [red = 0, green = 0, blue = 0] = sums.map((sum) => encode(sum / count))
  return srgbToLab(red, green, blue)
}

describe('pictures of a combination', () => {
  test.each([
    ['with its photograph', true],
    ['without a photograph', false],
  ])('are of exactly their sizes, %s, with no alpha channel', async (_, tipped) => {
    const photograph = tipped ? await exportPhotograph() : null
    const combination = exportCombination({ photograph })
    const { pictures } = await rasteriser.pictures({
      drawings: drawingsOf(exportDescription(combination), combination),
      photograph: photograph?.bytes ?? null,
    })
    const read = await Promise.all(pictures.map((picture) => sharp(picture).metadata()))
    expect(read.map(({ width, height }) => ({ width, height }))).toEqual([...PICTURE_SIZES])
    for (const { format, channels } of read) expect([format, channels]).toEqual(['png', 3])
  })

  test.each([
    ['wool as a line has it', exportShades()],
    [
      'pale, dark and vivid yarn',
      exportShades([
        [96, 0, 2],
        [8, 1, -1],
        [75, 20, 78],
        [45, 62, 30],
        [30, 20, -55],
      ]),
    ],
  ])('show each band in the mean colour of its shade, within ΔE00 0.5: %s', async (_, shades) => {
    // Even shares, so that no band is a few threads only.
    const combination = exportCombination({
      shades: shades.map((shade) => ({ ...shade, share: 0.2 })),
    })
    const drawings = drawingsOf(exportDescription(combination), combination)
    const pixels = await rasteriser.pixels({ drawings, photograph: null })
    drawings.forEach(({ composition: { card }, width }, picture) => {
      const { shape, area } = card
      const bands = combination.shades.map(({ hex, share, label }) => ({ hex, share, name: label }))
      windBands(shape, bands).forEach(({ y, height, band }) => {
        // Whole threads and whole turns, clear of the slit, the notches, and of the band's rise.
        const thirds = Math.floor(height / shape.pitch / 3) - 1
        const inside = {
          x: area.x + shape.width * 0.3,
          y: area.y + y + shape.pitch - shape.rise / 2,
          width: Math.round((shape.width * 0.5) / shape.pitch) * shape.pitch,
          height: thirds * 3 * shape.pitch,
        }
        expect(thirds).toBeGreaterThan(0)
        const mean = meanLab(pixels[picture]!, width, inside)
        expect(deltaE00(mean, hexToLab(band.hex!)), `${band.hex} at ${width}`).toBeLessThan(0.5)
      })
    })
  })

  test('need no font, and say in words what they show', () => {
    const combination = exportCombination({ title: 'A < B & "C"' })
    const { composition } = drawingsOf(exportDescription(combination), combination)[0]!
    const svg = svgOf(composition, { title: combination.title, alt: 'x\u0000 ]]> <script>' })
    expect(svg).toContain('<title id="title">A &lt; B &amp; &quot;C&quot;</title>')
    expect(svg).toContain('<desc id="desc">x ]]&gt; &lt;script&gt;</desc>')
    expect(svg).not.toMatch(/<text|font-family|<script|NaN|undefined/)
  })

  test.each([
    ['markup', '<script>alert(1)</script>', '<script>alert(1)</script>'],
    ['a formula', '=HYPERLINK("http://example.org")', '=HYPERLINK("http://example.org")'],
    ['letters of no shipped face', 'שלום עולם', 'Five shades'],
    ['only a picture', '🧶', 'Five shades'],
    ['a picture among words', 'Moss 🧶 and stone', 'Moss and stone'],
    ['marks that turn the writing', 'Moss \u202Egnihton', 'Moss gnihton'],
    ['letters with accents of their own', 'Cafe\u0301 Łódź', 'Café Łódź'],
  ])('set a title of %s as far as they can', (_, title, set) => {
    const combination = exportCombination({ title })
    for (const size of PICTURE_SIZES) {
      const { title: lines } = compose(exportDescription(combination), combination, size)
      expect(bare(lines.map(({ text }) => text).join(' '))).toBe(bare(set))
    }
  })

  test('keep every text within the picture, however long titles and names are', async () => {
    const photograph = await exportPhotograph({ credit: 'W'.repeat(120) })
    const words = ['W'.repeat(80), 'Mm '.repeat(26).trim(), 'a']
    for (const word of words) {
      for (const tipped of [photograph, null]) {
        const combination = exportCombination({
          title: word,
          photograph: tipped,
          shades: exportShades().map((shade) => ({ ...shade, label: word.slice(0, 60) })),
        })
        for (const drawing of drawingsOf(exportDescription(combination), combination)) {
          const { composition } = drawing
          const { title, names, foot, card, width, height } = composition
          for (const { text, face, size, x, y } of [...title, ...names.flat(), ...foot]) {
            expect(x + widthOf(text, face, size)).toBeLessThan(width - 20)
            expect(y).toBeLessThan(height - 20)
          }
          expect(card.area.y + card.area.height).toBeLessThanOrEqual(height - 20)
          expect(Math.max(...title.map(({ y }) => y))).toBeLessThan(
            card.area.x > title[0]!.x + 100 ? height : card.area.y,
          )
        }
      }
    }
  })
})

describe('names beside their bands', () => {
  test('never overlap, stay in order and between the edges, and stay at their aims where they can', () => {
    fc.assert(
      fc.property(
        fc.array(
          fc.tuple(fc.double({ min: 0, max: 1000, noNaN: true }), fc.integer({ min: 1, max: 100 })),
          {
            minLength: 1,
            maxLength: 8,
          },
        ),
        (pairs) => {
          const aims = pairs.map(([aim]) => aim).toSorted((a, b) => a - b)
          const heights = pairs.map(([, height]) => height)
          const middles = spread(aims, heights, 0, 1000)
          middles.forEach((middle, index) => {
            const half = heights[index]! / 2
            expect(middle - half).toBeGreaterThanOrEqual(-1e-6)
            expect(middle + half).toBeLessThanOrEqual(1000 + 1e-6)
            if (index > 0)
              expect(middle - half).toBeGreaterThanOrEqual(
                middles[index - 1]! + heights[index - 1]! / 2 - 1e-6,
              )
          })
          const free = aims.every(
            (aim, index) =>
              aim - heights[index]! / 2 >=
                (index ? aims[index - 1]! + heights[index - 1]! / 2 : 0) &&
              aim + heights[index]! / 2 <= 1000,
          )
          if (free) middles.forEach((middle, index) => expect(middle).toBeCloseTo(aims[index]!, 6))
        },
      ),
    )
  })
})
