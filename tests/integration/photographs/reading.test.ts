import { once } from 'node:events'
import { spawn, type ChildProcess } from 'node:child_process'
import { inflateSync } from 'node:zlib'

import sharp, { type Sharp } from 'sharp'
import { beforeAll, beforeEach, describe, expect, it, vi } from 'vitest'

import type { Actor } from '@/lib/auth/actor'
import { isMatch } from '@/lib/color/match'
import * as environment from '@/lib/env'
import { readPhotographJob } from '@/lib/jobs/read-photograph.job'
import type { StoredMatches } from '@/lib/photographs/compute-matches'
import { confirmUpload } from '@/lib/photographs/confirm-upload'
import { deletePhotographs } from '@/lib/photographs/delete-photographs'
import { derivativeKey } from '@/lib/photographs/keys'
import { presentPhotograph } from '@/lib/photographs/present'
import { getDerivative, getPhotograph } from '@/lib/photographs/queries'
import { copyPhotograph, readPhotograph } from '@/lib/photographs/read-photograph'
import { rereadPhotograph } from '@/lib/photographs/reread-photograph'
import { deleteObjects, getObject, putObject } from '@/lib/storage/objects'
import { setShadeStatus } from '@/lib/shades/set-shade-status'
import { Photograph, Reading, sequelize, type Line, type Shade } from '@/models'
import { makeActor, makeBrand } from '@/tests/factories/brand'
import { makeLine } from '@/tests/factories/line'
import { makePicture, uploadTo } from '@/tests/factories/photograph'
import { makeShades } from '@/tests/factories/shade'

let actor: Actor
let line: Line
let shades: Shade[]

beforeAll(async () => {
  actor = await makeActor(await makeBrand())
})

beforeEach(async () => {
  line = await makeLine({ id: actor.brandId })
  shades = await makeShades(line, 8)
})

/** Adds a photograph and takes its job off the queue, so that the test does it. */
async function addPhotograph(bytes: Buffer): Promise<string> {
  const photographId = await uploadTo(actor, line, bytes)
  await confirmUpload(actor, { photographId })
  await takeJobs(photographId)
  return photographId
}

function takeJobs(photographId: string) {
  return sequelize().query(`DELETE FROM pgboss.job WHERE data->>'photographId' = $photographId`, {
    bind: { photographId },
  })
}

const deep = (picture: Sharp) => picture.toColourspace('rgb16')
const withReading = (id: string) => getPhotograph(actor, line.slug, id, { withReading: true })

describe('reading a photograph', () => {
  it('finds its colours, matches the five readings, and says that it is ready', async () => {
    const id = await addPhotograph(await makePicture())
    await readPhotograph(id)
    const { photograph } = await withReading(id)
    expect(photograph).toMatchObject({ state: 'ready', width: 640, height: 400, failure: null })
    const { reading } = photograph
    expect(inflateSync(reading!.cellMap)).toHaveLength(reading!.mapWidth * reading!.mapHeight)
    const matches = reading!.matches as StoredMatches
    expect(matches.map(({ kind }) => kind)).toEqual([
      'true',
      'accent',
      'contrast',
      'family',
      'quiet',
    ])
    const [first] = matches
    expect(first && isMatch(first)).toBe(true)
    const ids = new Set(shades.map((shade) => shade.id))
    for (const match of matches.filter(isMatch)) {
      expect(match.places).toHaveLength(5)
      expect(match.places.every(({ shadeId }) => ids.has(shadeId))).toBe(true)
      expect(match.places.reduce((sum, { share }) => sum + share, 0)).toBeCloseTo(1, 9)
    }
  })

  it('done twice, also at the same time, leaves one reading and the same end', async () => {
    const id = await addPhotograph(await makePicture())
    await Promise.all([readPhotograph(id), readPhotograph(id)])
    await readPhotograph(id)
    expect(await Reading.count({ where: { photographId: id } })).toBe(1)
    expect((await withReading(id)).photograph.state).toBe('ready')
  })

  it('never matches to a shade that is retired', async () => {
    const [retired] = shades
    await setShadeStatus(actor, { lineSlug: line.slug, shadeIds: [retired!.id], status: 'retired' })
    const id = await addPhotograph(await makePicture())
    await readPhotograph(id)
    expect(JSON.stringify((await withReading(id)).photograph.reading!.matches)).not.toContain(
      retired!.id,
    )
  })

  it('says in words when the line has fewer than five shades', async () => {
    line = await makeLine({ id: actor.brandId })
    await makeShades(line, 4)
    const id = await addPhotograph(await makePicture())
    await readPhotograph(id)
    const { photograph } = await withReading(id)
    expect(photograph.state).toBe('ready')
    const matches = photograph.reading!.matches as StoredMatches
    for (const match of matches) expect(match).toMatchObject({ unavailable: expect.any(String) })
  })

  it('is known to be stale once the shades have changed, and fresh when read again', async () => {
    const id = await addPhotograph(await makePicture())
    await readPhotograph(id)
    const isStale = async () => {
      const { photograph, line: now } = await getPhotograph(actor, line.slug, id)
      return presentPhotograph(actor, now, photograph).stale
    }
    expect(await isStale()).toBe(false)
    await setShadeStatus(actor, {
      lineSlug: line.slug,
      shadeIds: [shades[7]!.id],
      status: 'approved',
    })
    expect(await isStale()).toBe(true)
    await rereadPhotograph(actor, { photographId: id })
    await takeJobs(id)
    await readPhotograph(id)
    expect(await isStale()).toBe(false)
  })

  it('of a photograph that was deleted meanwhile keeps nothing', async () => {
    const id = await addPhotograph(await makePicture())
    await deletePhotographs(actor, { photographIds: [id] })
    await readPhotograph(id)
    expect(await Reading.count({ where: { photographId: id } })).toBe(0)
  })
})

describe('the copies for the screen', () => {
  const GPS = { IFD3: { GPSLatitudeRef: 'N', GPSLatitude: '54/1 27/1 0/1' } }

  it('carry no metadata, whatever the original held, and stand upright', async () => {
    const bytes = await sharp(await makePicture({ width: 1200, height: 800 }))
      .withExif({ IFD0: { Copyright: 'somebody', Orientation: '6' }, ...GPS })
      .withIccProfile('srgb')
      .jpeg()
      .toBuffer()
    const before = await sharp(bytes).metadata()
    expect(before.exif?.includes('somebody')).toBe(true)
    const id = await addPhotograph(bytes)
    await readPhotograph(id)
    await copyPhotograph(id)
    const { photograph } = await withReading(id)
    const oriented = before.orientation === 6
    expect(photograph.width).toBe(oriented ? 800 : 1200)
    const kinds = photograph.derivatives.map(({ format, width }) => `${format} ${width}`)
    expect(kinds).toEqual(
      ['webp', 'avif'].flatMap((format) =>
        (oriented ? [480, 800] : [480, 960, 1200]).map((width) => `${format} ${width}`),
      ),
    )
    for (const copy of photograph.derivatives) {
      const body = (await getObject(derivativeKey(photograph, copy)))!
      const { exif, xmp, iptc, icc, orientation } = await sharp(body).metadata()
      expect({ exif, xmp, iptc, icc, orientation }).toEqual({})
      expect(body.includes('somebody')).toBe(false)
    }
  })

  it.each([
    ['16 bits in Display P3', (red: Sharp) => deep(red).withIccProfile('p3').png()],
    ['16 bits in sRGB', (red: Sharp) => deep(red).withIccProfile('srgb').png()],
    ['16 bits without a profile', (red: Sharp) => deep(red).png()],
    ['8 bits in Display P3', (red: Sharp) => red.withIccProfile('p3').png()],
  ])('keep the colour of an original of %s', async (_, save) => {
    const [r, g, b] = [208, 48, 32]
    const side = 40 + Math.floor(Math.random() * 400)
    const create = { width: side, height: 40, channels: 3, background: { r, g, b } } as const
    const id = await addPhotograph(await save(sharp({ create })).toBuffer())
    await readPhotograph(id)
    await copyPhotograph(id)
    const { photograph } = await withReading(id)
    expect(photograph.derivatives.map(({ format }) => format)).toEqual(['webp', 'avif'])
    for (const copy of photograph.derivatives) {
      const body = await getObject(derivativeKey(photograph, copy))
      const { channels } = await sharp(body!).stats()
      const means = channels.map(({ mean }) => mean)
      for (const [at, value] of [r, g, b].entries())
        expect(Math.abs(means[at]! - value), `${copy.format}: ${means}`).toBeLessThan(4)
    }
  })

  it('are never wider than the original', async () => {
    const id = await addPhotograph(await makePicture({ width: 300, height: 200 }))
    await readPhotograph(id)
    const { photograph } = await withReading(id)
    expect(photograph.derivatives).toEqual([{ format: 'webp', width: 300, height: 200 }])
  })

  it('are for the brand only, and by their exact name only', async () => {
    const id = await addPhotograph(await makePicture())
    await readPhotograph(id)
    const { photograph, line: now } = await withReading(id)
    const name = presentPhotograph(actor, now, photograph).fallbackSrc!.split('/').at(-1)!
    expect((await getDerivative(actor, id, name)).format).toBe('webp')
    const stranger = await makeActor(await makeBrand())
    await expect(getDerivative(stranger, id, name)).rejects.toThrow(/does not exist/)
    await expect(getDerivative(actor, id, `../${name}`)).rejects.toThrow(/does not exist/)
  })
})

describe('a reading that fails', () => {
  it('says why when the file is gone, and can be read again', async () => {
    const id = await addPhotograph(await makePicture())
    const { photograph } = await getPhotograph(actor, line.slug, id)
    await deleteObjects([photograph.objectKey])
    await readPhotograph(id)
    const failed = await Photograph.findByPk(id, { rejectOnEmpty: true })
    expect(failed).toMatchObject({ state: 'failed', failure: expect.stringMatching(/gone/) })
    await rereadPhotograph(actor, { photographId: id })
    expect((await failed.reload()).state).toBe('waiting')
  })

  it('says so when the file was replaced after it was confirmed', async () => {
    const id = await addPhotograph(await makePicture())
    const { photograph } = await getPhotograph(actor, line.slug, id)
    await putObject(photograph.objectKey, await makePicture(), 'image/jpeg')
    await readPhotograph(id)
    expect(await Photograph.findByPk(id)).toMatchObject({
      state: 'failed',
      failure: expect.stringMatching(/not the one that was added/),
    })
  })

  it('is tried again while the store is away, and says so after the last try', async () => {
    const id = await addPhotograph(await makePicture())
    const spy = vi
      .spyOn(environment, 'env')
      .mockReturnValue({ ...environment.env(), S3_ENDPOINT: 'http://127.0.0.1:9' })
    try {
      const reading = (isLastTry: boolean) =>
        readPhotographJob({ photographId: id }, { isLastTry }).catch((error: unknown) => error)
      expect(await reading(false)).toBeInstanceOf(Error)
      expect((await Photograph.findByPk(id))!.state).toBe('reading')
      expect(await reading(true)).toBeInstanceOf(Error)
      expect((await Photograph.findByPk(id))!.state).toBe('failed')
    } finally {
      spy.mockRestore()
    }
  })
})

describe('the job process', () => {
  const running = new Set<ChildProcess>()
  function startWorker(): ChildProcess {
    const child = spawn(process.execPath, ['--import', 'tsx', 'worker.ts'], {
      stdio: ['ignore', 'pipe', 'inherit'],
      env: { ...process.env, LOG_LEVEL: 'info' },
    })
    running.add(child)
    child.once('exit', () => running.delete(child))
    return child
  }

  async function stateOf(id: string) {
    return (await Photograph.findByPk(id, { attributes: ['state'], rejectOnEmpty: true })).state
  }
  async function until(condition: () => Promise<boolean>, milliseconds: number) {
    const end = Date.now() + milliseconds
    while (!(await condition())) {
      if (Date.now() > end) throw new Error('It did not come about in time.')
      await new Promise((resolve) => setTimeout(resolve, 50))
    }
  }

  it('killed while it reads leaves the job to the next one, which does it once', async () => {
    const bytes = await sharp(await makePicture({ width: 3000, height: 2000 }))
      .png()
      .toBuffer()
    const photographId = await uploadTo(actor, line, bytes, { contentType: 'image/png' })
    await confirmUpload(actor, { photographId })
    try {
      const first = startWorker()
      await until(async () => (await stateOf(photographId)) === 'reading', 40_000)
      first.kill('SIGKILL')
      await once(first, 'exit')
      expect(await stateOf(photographId)).toBe('reading')
      // Its expiry, brought forward: what maintenance does after ninety seconds.
      await sequelize().query(
        `UPDATE pgboss.job SET expire_in = interval '1 second'
         WHERE data->>'photographId' = $photographId AND state = 'active'`,
        { bind: { photographId } },
      )
      startWorker()
      await until(async () => (await stateOf(photographId)) === 'ready', 60_000)
      expect(await Reading.count({ where: { photographId } })).toBe(1)
    } finally {
      await Promise.all(
        [...running].map(async (child) => {
          child.kill('SIGTERM')
          await once(child, 'exit')
        }),
      )
    }
  }, 120_000)
})
