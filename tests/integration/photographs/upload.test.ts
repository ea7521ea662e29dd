import { randomUUID } from 'node:crypto'
import { once } from 'node:events'
import { createServer, type AddressInfo } from 'node:net'

import sharp from 'sharp'
import { beforeAll, beforeEach, describe, expect, it, vi } from 'vitest'

import type { Actor } from '@/lib/auth/actor'
import { InvalidError, NotFoundError, UnavailableError } from '@/lib/errors'
import { confirmUpload, withdrawUpload } from '@/lib/photographs/confirm-upload'
import { requestUpload } from '@/lib/photographs/request-upload'
import { requestUploadSchema } from '@/lib/photographs/schema'
import { headObject, putObject } from '@/lib/storage/objects'
import * as environment from '@/lib/env'
import { Photograph, type Line } from '@/models'
import { makeActor, makeBrand } from '@/tests/factories/brand'
import { makeLine } from '@/tests/factories/line'
import { announce, makePicture, sendTo, uploadTo } from '@/tests/factories/photograph'

let actor: Actor
let line: Line

beforeAll(async () => {
  actor = await makeActor(await makeBrand())
})

beforeEach(async () => {
  line = await makeLine({ id: actor.brandId })
})

/** What is left of an upload in the database and in the store. */
async function leftOf(photographId: string) {
  const row = await Photograph.findByPk(photographId, { paranoid: false })
  const object = await headObject(`originals/${actor.brandId}/${photographId}`)
  return { row: row !== null, object: object !== null }
}
const NOTHING = { row: false, object: false }

describe('adding a photograph', () => {
  it('expects the file, takes it from the store and queues it to be read', async () => {
    const id = await uploadTo(actor, line, await makePicture())
    expect(await confirmUpload(actor, { photographId: id })).toEqual({
      kind: 'added',
      photographId: id,
    })
    const photograph = await Photograph.findByPk(id, { rejectOnEmpty: true })
    expect(photograph).toMatchObject({ state: 'waiting', title: 'Hillside' })
  })

  it('goes by what the file is, not by what its name says', async () => {
    const png = await sharp(await makePicture())
      .png()
      .toBuffer()
    const id = await uploadTo(actor, line, png, { fileName: 'saved.jpg' })
    expect(await confirmUpload(actor, { photographId: id })).toMatchObject({ kind: 'added' })
    expect((await Photograph.findByPk(id))!.contentType).toBe('image/png')
  })

  it('confirming ten times at once takes it in once, with the same answer', async () => {
    const id = await uploadTo(actor, line, await makePicture())
    const answers = await Promise.all(
      Array.from({ length: 10 }, () => confirmUpload(actor, { photographId: id })),
    )
    expect(new Set(answers.map((answer) => JSON.stringify(answer))).size).toBe(1)
    const [row] = (await Photograph.sequelize!.query(
      `SELECT count(*)::int AS jobs FROM pgboss.job WHERE data->>'photographId' = $id`,
      { bind: { id }, plain: false },
    )) as unknown as [{ jobs: number }[]]
    expect(row[0]!.jobs).toBe(1)
  })

  it('ten identical requests expect one file', async () => {
    const bytes = await makePicture()
    const answers = await Promise.all(
      Array.from({ length: 10 }, () => requestUpload(actor, announce(line, bytes))),
    )
    expect(new Set(answers.map(({ photographId }) => photographId)).size).toBe(1)
    expect(await Photograph.count({ where: { lineId: line.id } })).toBe(1)
  })

  it('fixes key, type and length in the form', async () => {
    const bytes = await makePicture()
    const answer = await requestUpload(actor, announce(line, bytes))
    if (answer.kind !== 'upload') throw new Error('unexpected')
    const policy = JSON.parse(Buffer.from(answer.post.fields.Policy!, 'base64').toString()) as {
      expiration: string
      conditions: unknown[]
    }
    expect(policy.conditions).toEqual(
      expect.arrayContaining([
        ['content-length-range', bytes.length, bytes.length],
        ['eq', '$Content-Type', 'image/jpeg'],
        { key: `originals/${actor.brandId}/${answer.photographId}` },
      ]),
    )
    const minutes = (Date.parse(policy.expiration) - Date.now()) / 60_000
    expect(minutes).toBeGreaterThan(4)
    expect(minutes).toBeLessThanOrEqual(5)
  })
})

describe('the same file twice in a line', () => {
  it('is told at once, with the first one', async () => {
    const bytes = await makePicture()
    const first = await uploadTo(actor, line, bytes)
    await confirmUpload(actor, { photographId: first })
    expect(await requestUpload(actor, announce(line, bytes))).toEqual({
      kind: 'same',
      photographId: first,
      title: 'Hillside',
    })
  })

  it('is told on confirming when both were sent at the same time, and the second leaves nothing', async () => {
    const bytes = await makePicture()
    const colleague = await makeActor({
      id: actor.brandId,
      slug: actor.brandSlug,
      name: '',
    } as never)
    const first = await uploadTo(actor, line, bytes)
    const second = await uploadTo(colleague, line, bytes)
    expect(second).not.toBe(first)
    await confirmUpload(actor, { photographId: first })
    expect(await confirmUpload(colleague, { photographId: second })).toMatchObject({
      kind: 'same',
      photographId: first,
    })
    expect(await leftOf(second)).toEqual(NOTHING)
  })

  it('is welcome in another line', async () => {
    const bytes = await makePicture()
    await confirmUpload(actor, { photographId: await uploadTo(actor, line, bytes) })
    const other = await makeLine({ id: actor.brandId })
    expect(await requestUpload(actor, announce(other, bytes))).toMatchObject({ kind: 'upload' })
  })
})

describe('a file that is refused leaves a message and nothing else', () => {
  const text = Buffer.from('Dear diary, '.repeat(400))
  const svg = Buffer.from('<svg xmlns="http://www.w3.org/2000/svg"><script>1</script></svg>')
  const html = Buffer.from('<!doctype html><script>alert(1)</script>'.padEnd(600, ' '))
  const FILES: [string, () => Promise<Buffer> | Buffer, RegExp][] = [
    ['text', () => text, /not a picture/],
    ['an SVG under an honest name', () => svg, /SVG/],
    ['a page with a script', () => html, /not a picture/],
    ['a cut-off JPEG', async () => (await makePicture()).subarray(0, 3000), /damaged or cut short/],
    [
      'a picture that is transparent all over',
      () =>
        sharp({
          create: {
            width: 60,
            height: 40,
            channels: 4,
            background: { r: 9, g: 9, b: 9, alpha: 0 },
          },
        })
          .png()
          .toBuffer(),
      /transparent all over/,
    ],
    [
      'a GIF',
      async () =>
        sharp(await makePicture())
          .gif()
          .toBuffer(),
      /taken as JPEG, PNG/,
    ],
    [
      '121 megapixels',
      () =>
        sharp({ create: { width: 11_000, height: 11_000, channels: 3, background: '#888' } })
          .jpeg({ quality: 1 })
          .toBuffer(),
      /more than 120 megapixels/,
    ],
  ]

  it.each(FILES)('%s', async (_, make, words) => {
    const id = await uploadTo(actor, line, await make())
    await expect(confirmUpload(actor, { photographId: id })).rejects.toThrow(words)
    expect(await leftOf(id)).toEqual(NOTHING)
  })

  it('other bytes than announced, of the same length', async () => {
    const bytes = await makePicture()
    const other = Buffer.from(bytes)
    other[other.length - 10]! ^= 1
    const answer = await requestUpload(actor, announce(line, bytes))
    if (answer.kind !== 'upload') throw new Error('unexpected')
    await sendTo(answer.post, other)
    await expect(confirmUpload(actor, answer)).rejects.toThrow(/not the one that was sent/)
    expect(await leftOf(answer.photographId)).toEqual(NOTHING)
  })

  it('more bytes than announced', async () => {
    const bytes = await makePicture()
    const answer = await requestUpload(actor, announce(line, bytes))
    if (answer.kind !== 'upload') throw new Error('unexpected')
    const key = `originals/${actor.brandId}/${answer.photographId}`
    await putObject(key, Buffer.concat([bytes, bytes]), 'image/jpeg')
    await expect(confirmUpload(actor, answer)).rejects.toThrow(/not the one that was sent/)
    expect(await leftOf(answer.photographId)).toEqual(NOTHING)
  })

  it.each([
    ['41 MB', { byteLength: 41_000_000 }],
    ['an empty file', { byteLength: 0 }],
    ['a type we do not take', { contentType: 'image/svg+xml' }],
    ['a hash that is none', { sha256: 'x' }],
  ])('%s, before anything is sent', async (_, changes) => {
    const announced = { ...announce(line, await makePicture()), ...changes }
    expect(requestUploadSchema.safeParse(announced).success).toBe(false)
  })
})

describe('when something goes wrong on the way', () => {
  it('a file that has not arrived can be sent again', async () => {
    const bytes = await makePicture()
    const answer = await requestUpload(actor, announce(line, bytes))
    if (answer.kind !== 'upload') throw new Error('unexpected')
    await expect(confirmUpload(actor, answer)).rejects.toThrow(InvalidError)
    await sendTo(answer.post, bytes)
    expect(await confirmUpload(actor, answer)).toMatchObject({ kind: 'added' })
  })

  it('a cancelled upload leaves nothing, whether or not its file had arrived', async () => {
    const sent = await uploadTo(actor, line, await makePicture())
    await withdrawUpload(actor, { photographId: sent })
    expect(await leftOf(sent)).toEqual(NOTHING)
    const unsent = await requestUpload(actor, announce(line, await makePicture()))
    await withdrawUpload(actor, unsent)
    expect(await leftOf(unsent.photographId)).toEqual(NOTHING)
  })

  it('a confirmed photograph cannot be withdrawn', async () => {
    const id = await uploadTo(actor, line, await makePicture())
    await confirmUpload(actor, { photographId: id })
    await expect(withdrawUpload(actor, { photographId: id })).rejects.toThrow(NotFoundError)
  })

  it('a store that is away is said at once and nothing is kept', async () => {
    const spy = vi
      .spyOn(environment, 'env')
      .mockReturnValue({ ...environment.env(), S3_ENDPOINT: 'http://127.0.0.1:9' })
    try {
      const asking = requestUpload(actor, announce(line, await makePicture()))
      await expect(asking).rejects.toThrow(UnavailableError)
      expect(await Photograph.count({ where: { lineId: line.id } })).toBe(0)
    } finally {
      spy.mockRestore()
    }
  })

  it('a store that takes the connection and says nothing is given up within 4 s', async () => {
    const silent = createServer().listen(0, '127.0.0.1')
    await once(silent, 'listening')
    const { port } = silent.address() as AddressInfo
    const spy = vi
      .spyOn(environment, 'env')
      .mockReturnValue({ ...environment.env(), S3_ENDPOINT: `http://127.0.0.1:${port}` })
    try {
      const began = performance.now()
      const asking = requestUpload(actor, announce(line, await makePicture()))
      await expect(asking).rejects.toThrow(UnavailableError)
      expect(performance.now() - began).toBeLessThan(4_000)
    } finally {
      spy.mockRestore()
      silent.close()
    }
  })

  it('a store that goes away before the confirmation loses nothing: it is confirmed later', async () => {
    const id = await uploadTo(actor, line, await makePicture())
    const spy = vi
      .spyOn(environment, 'env')
      .mockReturnValue({ ...environment.env(), S3_ENDPOINT: 'http://127.0.0.1:9' })
    try {
      await expect(confirmUpload(actor, { photographId: id })).rejects.toThrow(UnavailableError)
    } finally {
      spy.mockRestore()
    }
    expect(await leftOf(id)).toEqual({ row: true, object: true })
    expect(await confirmUpload(actor, { photographId: id })).toMatchObject({ kind: 'added' })
  })

  it('an id that is no id, unknown, or of another brand answers the same', async () => {
    const stranger = await makeActor(await makeBrand())
    const id = await uploadTo(actor, line, await makePicture())
    const messages = await Promise.all(
      [
        confirmUpload(actor, { photographId: 'x' }),
        confirmUpload(actor, { photographId: randomUUID() }),
        confirmUpload(stranger, { photographId: id }),
      ].map((asked) => asked.catch((error: unknown) => error)),
    )
    for (const error of messages) expect(error).toBeInstanceOf(NotFoundError)
    expect(new Set(messages.map((error) => (error as Error).message)).size).toBe(1)
  })
})
