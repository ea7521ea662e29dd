import sharpAll from 'sharp'
import { describe, expect, test } from 'vitest'

import { deltaE00 } from '@/lib/color/ciede2000'
import { isMatch, matchPhotograph } from '@/lib/color/match'
import { readPhotographColors } from '@/lib/color/photograph-colors'
import { screenColor } from '@/lib/color/gamut'
import { displayP3ToLab, parseHex } from '@/lib/color/srgb'
import { chromaOf } from '@/lib/color/types'
import { decodePhotograph, PhotographError, sniffPhotograph } from '@/lib/photographs/decode'
import { FORMATS_TAKEN, MAX_BYTES, MAX_PIXELS } from '@/lib/photographs/formats'
import { warmUpReading } from '@/lib/photographs/warm-up'
import { dyedLine, seededRandom } from '@/scripts/bench/line'

const LINE = dyedLine(48)
const WIDTH = 480
const HEIGHT = 320

/** Five shades of the line, plainly different, that screens and inks can both show. */
const FIELDS = LINE.filter(({ lab }) => screenColor(lab).inGamut && chromaOf(lab) < 45)
  .reduce<typeof LINE>(
    (chosen, shade) =>
      chosen.every(({ lab }) => deltaE00(lab, shade.lab) >= 22) ? [...chosen, shade] : chosen,
    [],
  )
  .slice(0, 5)
  .sort((a, b) => b.lab[0] - a.lab[0])

/** A hillside of those five, a little grainy; not square, and not the same upside down. */
function hillside(): Buffer {
  const random = seededRandom(9)
  const fields = FIELDS.map(({ lab }) => parseHex(screenColor(lab).hex)!.map((v) => v * 255))
  const pixels = Buffer.alloc(WIDTH * HEIGHT * 3)
  for (let y = 0; y < HEIGHT; y++)
    for (let x = 0; x < WIDTH; x++) {
      const depth = (y + 30 * Math.sin(x / 60)) / HEIGHT
      const field = fields[Math.max(0, Math.min(4, Math.floor(depth * 5)))]!
      field.forEach((v, c) => {
        pixels[(y * WIDTH + x) * 3 + c] = Math.min(255, Math.max(0, v + random() * 9 - 4.5))
      })
    }
  return pixels
}
const PIXELS = hillside()
const plain = () => sharpAll(PIXELS, { raw: { width: WIDTH, height: HEIGHT, channels: 3 } })

/** The numbers of the five, in order. */
async function fiveOf(bytes: Buffer) {
  const { image } = await decodePhotograph(bytes)
  const match = matchPhotograph(readPhotographColors(image), LINE, 'true')
  if (!isMatch(match)) throw new Error(match.unavailable)
  return match.places
}
const idsOf = async (bytes: Buffer) => (await fiveOf(bytes)).map(({ shadeId }) => shadeId)

async function faultOf(bytes: Buffer): Promise<PhotographError> {
  const error = await decodePhotograph(bytes).then(
    () => null,
    (reason: unknown) => reason,
  )
  expect(error).toBeInstanceOf(PhotographError)
  return error as PhotographError
}

describe('the same five as the plain original', () => {
  const copies: Record<string, () => Promise<Buffer>> = {
    'a JPEG of high quality': () => plain().jpeg({ quality: 95 }).toBuffer(),
    'a JPEG with an sRGB profile': () =>
      plain().withIccProfile('srgb').jpeg({ quality: 95 }).toBuffer(),
    'a 16-bit PNG': () => plain().toColourspace('rgb16').png().toBuffer(),
    'a 16-bit PNG with an sRGB profile': () =>
      plain().toColourspace('rgb16').withIccProfile('srgb').png().toBuffer(),
    'a 16-bit PNG in Display P3': () =>
      plain().toColourspace('rgb16').withIccProfile('p3').png().toBuffer(),
    'a JPEG in Display P3': () => plain().withIccProfile('p3').jpeg({ quality: 95 }).toBuffer(),
    'a WebP': () => plain().webp({ quality: 90 }).toBuffer(),
    'an AVIF': () => plain().avif({ quality: 80, effort: 0 }).toBuffer(),
    'a TIFF': () => plain().tiff({ compression: 'lzw' }).toBuffer(),
    'an opaque PNG with an alpha channel': () => plain().ensureAlpha().png().toBuffer(),
  }
  test.each(Object.entries(copies))('%s', async (_, copy) => {
    const original = await idsOf(await plain().png().toBuffer())
    expect(original).toEqual(FIELDS.map(({ id }) => id))
    expect(await idsOf(await copy())).toEqual(original)
  })

  test.each([1, 2, 3, 4, 5, 6, 7, 8])('EXIF orientation %i, upright', async (orientation) => {
    const sideways = await plain().png().withMetadata({ orientation }).toBuffer()
    const { image, width, height } = await decodePhotograph(sideways)
    const turned = orientation > 4
    expect([width, height]).toEqual(turned ? [HEIGHT, WIDTH] : [WIDTH, HEIGHT])
    expect([image.width, image.height]).toEqual(turned ? [213, 320] : [320, 213])
    expect(await idsOf(sideways)).toEqual(await idsOf(await plain().png().toBuffer()))
  })

  test('a CMYK JPEG, through its profile', async () => {
    const cmyk = await plain().withIccProfile('cmyk').jpeg({ quality: 95 }).toBuffer()
    expect((await sharpAll(cmyk).metadata()).space).toBe('cmyk')
    expect((await decodePhotograph(cmyk)).image.space).toBe('srgb')
    expect(await idsOf(cmyk)).toEqual(FIELDS.map(({ id }) => id))
  })
})

describe('the awkward ones', () => {
  test('Display P3 stays as wide as it is', async () => {
    const side = 40
    const red = Buffer.from(Array.from({ length: side * side * 3 }, (_, at) => (at % 3 ? 0 : 255)))
    // The profile alone, with the numbers left as they are: the red of Display P3 itself.
    const profile = (await sharpAll(await plain().withIccProfile('p3').png().toBuffer()).metadata())
      .icc!
    const tagged = await sharpAll(
      await pngWithProfile(
        await sharpAll(red, { raw: { width: side, height: side, channels: 3 } })
          .png()
          .toBuffer(),
        profile,
      ),
    )
      .keepIccProfile()
      .png()
      .toBuffer()
    const { image } = await decodePhotograph(tagged)
    expect(image.space).toBe('display-p3')
    const [cell] = readPhotographColors(image).cells
    expect(deltaE00(cell!.lab, displayP3ToLab(1, 0, 0))).toBeLessThan(0.1)
  })

  test('grey gives neutrals', async () => {
    const grey = await plain().greyscale().png().toBuffer()
    const { image } = await decodePhotograph(grey)
    for (const { lab } of readPhotographColors(image).cells)
      expect(chromaOf(lab)).toBeLessThan(0.01)
    const neutrals = [92, 80, 68, 56, 44, 32, 20].map((L, n) => ({
      id: `n${n}`,
      lab: [L, 0, 1] as const,
    }))
    const vivid = LINE.filter(({ lab }) => chromaOf(lab) > 15)
    const match = matchPhotograph(readPhotographColors(image), [...vivid, ...neutrals], 'true')
    if (!isMatch(match)) throw new Error(match.unavailable)
    for (const { shadeId } of match.places) expect(shadeId).toMatch(/^n/)
  })

  test('an animated GIF is its first frame', async () => {
    const frame = (background: string) =>
      sharpAll({ create: { width: 60, height: 40, channels: 3, background } })
        .png()
        .toBuffer()
    const gif = await sharpAll([await frame('#c03020'), await frame('#2040c0')], {
      join: { animated: true },
    })
      .gif()
      .toBuffer()
    expect((await sharpAll(gif).metadata()).pages).toBe(2)
    const { image, format, height } = await decodePhotograph(gif)
    expect([format, height, image.height]).toEqual(['GIF', 40, 40])
    const { cells } = readPhotographColors(image)
    expect(cells).toHaveLength(1)
    expect(cells[0]!.lab[1]).toBeGreaterThan(40)
  })

  test('a fully transparent one has no visible pixels', async () => {
    const clear = await sharpAll({
      create: { width: 30, height: 30, channels: 4, background: { r: 9, g: 9, b: 9, alpha: 0 } },
    })
      .png()
      .toBuffer()
    const { image } = await decodePhotograph(clear)
    expect(() => readPhotographColors(image)).toThrow('no visible pixels')
  })

  test('one flat colour is one shade at 100 %', async () => {
    const flat = await sharpAll({
      create: { width: 30, height: 30, channels: 3, background: '#5a7d3c' },
    })
      .png()
      .toBuffer()
    const shares = (await fiveOf(flat)).map(({ share }) => share)
    expect([...shares].sort()).toEqual([0, 0, 0, 0, 1])
  })

  test('a picture smaller than the reading is not enlarged', async () => {
    const tiny = await plain().resize(12, 8).png().toBuffer()
    const { image } = await decodePhotograph(tiny)
    expect([image.width, image.height]).toEqual([12, 8])
  })
})

describe('what is refused, in words', () => {
  const svg = '<svg xmlns="http://www.w3.org/2000/svg" width="9" height="9"><rect/></svg>'
  const heic = Buffer.concat([
    Buffer.from([0, 0, 0, 24]),
    Buffer.from('ftypheic\0\0\0\0mif1heic', 'latin1'),
    Buffer.alloc(200),
  ])
  test.each<[string, Buffer, string]>([
    ['nothing', Buffer.alloc(0), 'empty'],
    ['text', Buffer.from('number,name\n1,Peat\n'), 'not-a-picture'],
    ['a PDF', Buffer.from('%PDF-1.7\n%âãÏÓ\n'), 'not-a-picture'],
    ['an SVG', Buffer.from(svg), 'svg'],
    ['an SVG with a declaration', Buffer.from(`<?xml version="1.0"?>\n${svg}`), 'svg'],
    ['a HEIC', heic, 'heic'],
    ['a BMP', Buffer.concat([Buffer.from('BM'), Buffer.alloc(200)]), 'format'],
    ['more than 40 MB', Buffer.alloc(MAX_BYTES + 1), 'too-large'],
  ])('%s', async (_, bytes, fault) => {
    const error = await faultOf(bytes)
    expect(error.fault).toBe(fault)
    expect(error.code).toBe('invalid')
    if (fault === 'heic' || fault === 'format') expect(error.message).toContain(FORMATS_TAKEN)
  })

  test.each(['jpeg', 'png', 'webp', 'avif', 'tiff', 'gif'] as const)(
    'a %s cut short, at any place',
    async (format) => {
      const whole = await plain()[format]().toBuffer()
      await expect(decodePhotograph(whole)).resolves.toBeTruthy()
      for (const part of [0.1, 0.5, 0.9]) {
        const error = await faultOf(whole.subarray(0, Math.floor(whole.length * part)))
        expect(error.fault).toBe('damaged')
        expect(error.message).toMatch(/damaged or cut short/)
      }
    },
  )

  test('more than 120 megapixels, quickly', async () => {
    const side = Math.ceil(Math.sqrt(MAX_PIXELS)) + 1
    const vast = await sharpAll({
      create: { width: side, height: side, channels: 3, background: '#888' },
      limitInputPixels: false,
    })
      .png({ compressionLevel: 1 })
      .toBuffer()
    const started = performance.now()
    expect((await faultOf(vast)).fault).toBe('too-many-pixels')
    expect(performance.now() - started).toBeLessThan(500)
  }, 30_000)

  test('an AVIF that names only HEIF at first is still an AVIF', async () => {
    const avif = await plain().resize(64).avif({ effort: 0 }).toBuffer()
    const major = Buffer.from(avif)
    major.write('mif1', 8, 'latin1')
    expect(await sniffPhotograph(major)).toBe('image/avif')
  })

  test('no loader is left open but those of the formats taken', async () => {
    const raw = sharpAll(Buffer.from(svg))
    await expect(raw.png().toBuffer()).rejects.toThrow()
  })
})

test('warming up leaves no error behind', async () => {
  await expect(warmUpReading()).resolves.toBeUndefined()
})

/** A PNG with an iCCP chunk set in after its header. @source PNG (Third Edition) § 11.3.2.3 */
async function pngWithProfile(png: Buffer, profile: Buffer): Promise<Buffer> {
  const { crc32, deflateSync } = await import('node:zlib')
  const data = Buffer.concat([Buffer.from('p3\0\0', 'latin1'), deflateSync(profile)])
  const typed = Buffer.concat([Buffer.from('iCCP', 'latin1'), data])
  const length = Buffer.alloc(4)
  length.writeUInt32BE(data.length)
  const sum = Buffer.alloc(4)
  sum.writeUInt32BE(crc32(typed))
  const header = 8 + 25
  return Buffer.concat([png.subarray(0, header), length, typed, sum, png.subarray(header)])
}
