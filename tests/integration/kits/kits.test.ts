import { spawn, type ChildProcess } from 'node:child_process'
import { randomUUID } from 'node:crypto'
import { once } from 'node:events'

import { unzipSync } from 'fflate'
import sharp from 'sharp'
import { beforeAll, beforeEach, describe, expect, it, vi } from 'vitest'

import type { Actor } from '@/lib/auth/actor'
import * as environment from '@/lib/env'
import { ConflictError, ForbiddenError, InvalidError, NotFoundError } from '@/lib/errors'
import { buildKitJob } from '@/lib/jobs/build-kit.job'
import { buildKit } from '@/lib/kits/build-kit'
import { KIT_LIMITS } from '@/lib/kits/constants'
import { deleteKit } from '@/lib/kits/delete-kit'
import { downloadKit } from '@/lib/kits/download-kit'
import { kitKey } from '@/lib/kits/keys'
import { presentCandidate, presentKit } from '@/lib/kits/present'
import {
  getKit,
  getKitPicture,
  listCandidates,
  listKits,
  listKitStandings,
} from '@/lib/kits/queries'
import { requestKit } from '@/lib/kits/request-kit'
import { requestKitSchema } from '@/lib/kits/schema'
import { sweepKits } from '@/lib/kits/sweep'
import { derivativeKey } from '@/lib/photographs/keys'
import { deleteObjects, getObject, headObject, putObject } from '@/lib/storage/objects'
import {
  Activity,
  Combination,
  Kit,
  sequelize,
  type Line,
  type Photograph,
  type Shade,
} from '@/models'
import { makeActor, makeActors, makeBrand } from '@/tests/factories/brand'
import { makeCombination } from '@/tests/factories/combination'
import { makeLine } from '@/tests/factories/line'
import { makeIdea } from '@/tests/factories/name'
import { makePhotograph } from '@/tests/factories/photograph'
import { makeShades } from '@/tests/factories/shade'

const DAY = 24 * 60 * 60 * 1000

let actor: Actor
let line: Line
let shades: Shade[]

beforeAll(async () => {
  actor = await makeActor(await makeBrand('Teasel & Tarn'))
})

beforeEach(async () => {
  line = await makeLine({ id: actor.brandId })
  shades = await makeShades(line, 6)
})

/** A photograph that may be shown, with its copy in the store. */
async function shownPhotograph(values: object = {}): Promise<Photograph> {
  const photograph = await makePhotograph(line, { title: 'Low sun' })
  await photograph.update({
    photographer: 'Ines Thornbeck',
    licence: 'own-work',
    altText: 'Bracken above a small dark lake.',
    derivatives: [{ format: 'webp', width: 900, height: 600 }],
    ...values,
  })
  const copy = await sharp({
    create: { width: 900, height: 600, channels: 3, background: '#8899aa' },
  })
    .webp()
    .toBuffer()
  for (const derivative of photograph.derivatives)
    await putObject(derivativeKey(photograph, derivative), copy, 'image/webp')
  return photograph
}

const ask = (combinations: readonly { id: string }[], requestKey = randomUUID(), by = actor) =>
  requestKit(by, {
    lineSlug: line.slug,
    combinationIds: combinations.map(({ id }) => id),
    requestKey,
  })

/** Asks for a kit and takes its job off the queue, so that the test does it. */
async function askAlone(combinations: readonly { id: string }[]): Promise<Kit> {
  const kit = await ask(combinations)
  await sequelize().query(`DELETE FROM pgboss.job WHERE data->>'kitId' = $id`, {
    bind: { id: kit.id },
  })
  return kit
}

async function filesOf(kit: Kit): Promise<Record<string, Uint8Array>> {
  return unzipSync((await getObject(kitKey(kit)))!)
}
const fresh = (kit: Kit) => Kit.findByPk(kit.id, { rejectOnEmpty: true })

describe('asking for a kit', () => {
  it('makes one kit and one job of one submit, however often it is sent', async () => {
    const combination = await makeCombination(line, shades)
    const requestKey = randomUUID()
    const kits = await Promise.all(Array.from({ length: 5 }, () => ask([combination], requestKey)))
    expect(new Set(kits.map(({ id }) => id)).size).toBe(1)
    const jobs = await sequelize().query(`SELECT id FROM pgboss.job WHERE data->>'kitId' = $id`, {
      bind: { id: kits[0]!.id },
    })
    expect(jobs[0]).toHaveLength(1)
    const told = await Activity.count({
      where: { brandId: actor.brandId, action: 'kit.requested', objectId: line.id },
    })
    expect(told).toBe(1)
  })

  it('is for owner, designer and marketer; a dyer is refused everything about kits', async () => {
    const brand = await makeBrand()
    const actors = await makeActors(brand)
    line = await makeLine(brand)
    shades = await makeShades(line, 5)
    const combination = await makeCombination(line, shades)
    for (const role of ['owner', 'designer', 'marketer'] as const)
      await expect(ask([combination], randomUUID(), actors[role])).resolves.toBeTruthy()
    const kit = await Kit.findOne({ where: { brandId: brand.id }, rejectOnEmpty: true })
    const { dyer } = actors
    const refusals = await Promise.allSettled([
      ask([combination], randomUUID(), dyer),
      listKits(dyer, line.slug, 1),
      listCandidates(dyer, line.slug),
      getKit(dyer, line.slug, kit.id),
      listKitStandings(dyer, [kit.id]),
      downloadKit(dyer, kit.id),
      getKitPicture(dyer, kit.id, 'x.png'),
      deleteKit(dyer, { kitId: kit.id }),
    ])
    for (const refusal of refusals)
      expect(refusal).toMatchObject({ reason: expect.any(ForbiddenError) })
  })

  it('answers of another brand’s combinations and kits as of ones that do not exist', async () => {
    const combination = await makeCombination(line, shades)
    const kit = await askAlone([combination])
    const stranger = await makeActor(await makeBrand())
    const other = await makeLine({ id: stranger.brandId })
    const refusals = await Promise.allSettled([
      ask([combination], randomUUID(), stranger),
      requestKit(stranger, {
        lineSlug: other.slug,
        combinationIds: [combination.id],
        requestKey: randomUUID(),
      }),
      listKits(stranger, line.slug, 1),
      getKit(stranger, other.slug, kit.id),
      downloadKit(stranger, kit.id),
      getKitPicture(stranger, kit.id, 'x.png'),
      deleteKit(stranger, { kitId: kit.id }),
    ])
    for (const refusal of refusals)
      expect(refusal).toMatchObject({ reason: expect.any(NotFoundError) })
    expect(await listKitStandings(stranger, [kit.id])).toEqual([])
  })

  it('refuses more combinations than a kit holds, and one twice', () => {
    const parse = (combinationIds: string[]) =>
      requestKitSchema.safeParse({ lineSlug: 'a', combinationIds, requestKey: randomUUID() })
    const ids = Array.from({ length: KIT_LIMITS.combinations + 1 }, () => randomUUID())
    expect(parse(ids).success).toBe(false)
    expect(parse(ids.slice(1)).success).toBe(true)
    expect(parse([ids[0]!, ids[0]!]).success).toBe(false)
  })

  it('begins nothing when none of the combinations can go in', async () => {
    const empty = await makeCombination(line, [])
    await expect(ask([empty])).rejects.toBeInstanceOf(InvalidError)
    expect(await Kit.count({ where: { lineId: line.id } })).toBe(0)
  })
})

describe('what keeps a combination out', () => {
  it.each([
    ['no licence', { licence: null }, 'Its photograph, Low sun, has no licence.'],
    ['no credit', { photographer: ' ' }, 'Its photograph, Low sun, has no credit.'],
    ['no alt text', { altText: '' }, 'Its photograph, Low sun, has no alt text.'],
    [
      'none of the three',
      { licence: null, photographer: '', altText: '' },
      'Its photograph, Low sun, has no licence, credit and alt text.',
    ],
    ['no copy yet', { derivatives: [] }, 'Its photograph, Low sun, has not been read yet.'],
  ])('is a photograph with %s, and the form says so', async (_, values, words) => {
    const photograph = await shownPhotograph(values)
    await makeCombination(line, shades, { photographId: photograph.id })
    const [candidate] = (await listCandidates(actor, line.slug)).map(presentCandidate)
    expect(candidate!.reasons).toEqual([words])
  })

  it('is an empty place and a deleted shade; a licence of its own kind only hides the photograph', async () => {
    await makeCombination(line, shades.slice(0, 4), { title: 'Four' })
    await makeCombination(line, [], { title: 'None' })
    const hidden = await shownPhotograph({ licence: 'other' })
    await makeCombination(line, shades.slice(1), { title: 'Hidden', photographId: hidden.id })
    await makeCombination(line, shades, { title: 'Gone' })
    await shades[0]!.destroy()
    const candidates = (await listCandidates(actor, line.slug)).map(presentCandidate)
    const of = (title: string) => candidates.find((one) => one.title === title)!
    expect(of('Four').reasons).toContain('One place is still empty.')
    expect(of('None').reasons).toEqual(['No shade is wound on it yet.'])
    expect(of('Gone').reasons).toEqual([
      `No. ${shades[0]!.number} is not a shade of the line any more.`,
    ])
    expect(of('Hidden').reasons).toEqual([])
    expect(of('Hidden').note).toContain('stays out of the pictures')
  })
})

describe('building a kit', () => {
  it('draws what can go in, in the order asked for, and lists the rest with why', async () => {
    const photograph = await shownPhotograph()
    await makeIdea(line, shades[0]!, { text: 'Thyme Will Tell', state: 'approved' })
    await makeIdea(line, shades[1]!, { text: 'Thyme and Again', state: 'in-review' })
    const first = await makeCombination(line, shades, { title: 'First' })
    const second = await makeCombination(line, shades, {
      title: 'Second',
      photographId: photograph.id,
    })
    const out = await makeCombination(line, shades.slice(0, 3), { title: 'Half' })
    const kit = await askAlone([second, out, first])
    await buildKit(kit.id)
    const { kit: built } = await getKit(actor, line.slug, kit.id)
    expect(built).toMatchObject({ state: 'ready', failure: null, done: 3, total: 3 })
    expect(built.contents.map(({ title }) => title)).toEqual(['Second', 'First'])
    expect(built.leftOut).toEqual([
      { id: out.id, title: 'Half', reasons: ['2 places are still empty.'] },
    ])
    const files = await filesOf(kit)
    expect(Object.keys(files)).toContain('second/second-1200x630.png')
    const post = Buffer.from(files['post.html']!).toString()
    expect(post.indexOf('Second')).toBeLessThan(post.indexOf('First'))
    const texts = Object.entries(files).filter(([path]) => /csv|css|json|html|alt|caption/.test(path))
    expect(texts.length).toBeGreaterThanOrEqual(8)
    for (const [path, bytes] of texts) {
      const text = Buffer.from(bytes).toString()
      expect(text, path).toContain('Thyme Will Tell')
      expect(text, path).toContain('No. S2')
      expect(text, path).not.toContain('Thyme and Again')
    }
    const { width } = await sharp(
      await getKitPicture(actor, kit.id, `${second.id}-1080x1080.png`),
    ).metadata()
    expect(width).toBe(1080)
    await expect(getKitPicture(actor, kit.id, `${out.id}-1080x1080.png`)).rejects.toBeInstanceOf(
      NotFoundError,
    )
  })

  it('again from the same selection gives the same files to the byte', async () => {
    const photograph = await shownPhotograph()
    const combination = await makeCombination(line, shades, { photographId: photograph.id })
    const [one, two] = [await askAlone([combination]), await askAlone([combination])]
    await buildKit(one.id)
    await buildKit(two.id)
    expect((await fresh(two)).sha256).toBe((await fresh(one)).sha256)
  })

  it('once it is ready does nothing more', async () => {
    const kit = await askAlone([await makeCombination(line, shades)])
    await buildKit(kit.id)
    const { updatedAt } = await fresh(kit)
    await buildKit(kit.id)
    expect((await fresh(kit)).updatedAt).toEqual(updatedAt)
  })

  it('says why it could not be built when all became unfit meanwhile', async () => {
    const combination = await makeCombination(line, shades)
    const kit = await askAlone([combination])
    await combination.destroy()
    await buildKit(kit.id)
    const failed = await fresh(kit)
    expect(failed.state).toBe('failed')
    expect(failed.failure).toContain('None of its combinations')
    expect(failed.leftOut[0]!.reasons).toEqual(['It has been deleted.'])
  })

  it('says which photograph is gone from the store', async () => {
    const photograph = await shownPhotograph()
    const combination = await makeCombination(line, shades, { photographId: photograph.id })
    await deleteObjects(photograph.derivatives.map((copy) => derivativeKey(photograph, copy)))
    const kit = await askAlone([combination])
    await buildKit(kit.id)
    expect((await fresh(kit)).failure).toContain('Low sun')
  })

  it('is tried again while the store is away, and the last try says so', async () => {
    const kit = await askAlone([await makeCombination(line, shades)])
    const away = { ...environment.env(), S3_ENDPOINT: 'http://127.0.0.1:9' }
    const spy = vi.spyOn(environment, 'env').mockReturnValue(away)
    try {
      await expect(buildKitJob({ kitId: kit.id }, { isLastTry: false })).rejects.toThrow()
      expect((await fresh(kit)).state).toBe('building')
      await expect(buildKitJob({ kitId: kit.id }, { isLastTry: true })).rejects.toThrow()
    } finally {
      spy.mockRestore()
    }
    expect(await fresh(kit)).toMatchObject({ state: 'failed' })
    expect((await fresh(kit)).failure).toContain('Build the kit again')
  })

  it('leaves no file of a kit that was deleted while it was built', async () => {
    const kit = await askAlone([await makeCombination(line, shades)])
    const building = buildKit(kit.id)
    await deleteKit(actor, { kitId: kit.id })
    await building
    expect(await headObject(kitKey(kit))).toBeNull()
  })
})

describe('taking a kit away', () => {
  it('leads to the file by a link of ten minutes, and is recorded', async () => {
    const kit = await askAlone([await makeCombination(line, shades)])
    await expect(downloadKit(actor, kit.id)).rejects.toBeInstanceOf(ConflictError)
    await buildKit(kit.id)
    const link = new URL(await downloadKit(actor, kit.id))
    expect(link.searchParams.get('X-Amz-Expires')).toBe('600')
    expect(link.searchParams.get('response-content-disposition')).toMatch(
      /^attachment; filename="[a-z0-9-]+\.zip"$/,
    )
    const answer = await fetch(link)
    expect(answer.status).toBe(200)
    const { byteLength } = await fresh(kit)
    expect((await answer.arrayBuffer()).byteLength).toBe(byteLength)
    const told = await Activity.findOne({
      where: { brandId: actor.brandId, action: 'kit.downloaded', objectId: line.id },
    })
    expect(told?.after).toMatchObject({ kit: kit.id, count: 1 })
  })

  it('ends after thirty days: the sweep removes the file, the row says so and keeps its selection', async () => {
    const combination = await makeCombination(line, shades)
    const kit = await askAlone([combination])
    await buildKit(kit.id)
    const { expiresAt } = await fresh(kit)
    expect(expiresAt!.getTime() - Date.now()).toBeGreaterThan(29.9 * DAY)
    await Kit.update({ expiresAt: new Date(Date.now() - 1) }, { where: { id: kit.id } })
    await expect(downloadKit(actor, kit.id)).rejects.toThrow(/expired/)
    expect((await sweepKits()).expired).toBeGreaterThan(0)
    // An hour later nobody can still be fetching it.
    await sweepKits(Date.now() + 2 * 60 * 60 * 1000)
    expect(await headObject(kitKey(kit))).toBeNull()
    const { kits } = await listKits(actor, line.slug, 1)
    expect(presentKit(actor, kits[0]!)).toMatchObject({
      expired: true,
      selection: [combination.id],
    })
  })

  it('ends when the kit is deleted', async () => {
    const kit = await askAlone([await makeCombination(line, shades)])
    await buildKit(kit.id)
    await deleteKit(actor, { kitId: kit.id })
    expect(await headObject(kitKey(kit))).toBeNull()
    await expect(getKit(actor, line.slug, kit.id)).rejects.toBeInstanceOf(NotFoundError)
    expect(await Combination.count({ where: { lineId: line.id } })).toBe(1)
  })

  it('is not ended by a sweep before its time, nor is a file that is just being written', async () => {
    const kit = await askAlone([await makeCombination(line, shades)])
    await buildKit(kit.id)
    const orphan = kitKey({ id: randomUUID(), brandId: actor.brandId })
    await putObject(orphan, Buffer.from('x'), 'application/zip')
    await sweepKits()
    expect(await headObject(kitKey(kit))).not.toBeNull()
    expect(await headObject(orphan)).not.toBeNull()
    await sweepKits(Date.now() + 2 * 60 * 60 * 1000)
    expect(await headObject(orphan)).toBeNull()
    expect(await headObject(kitKey(kit))).not.toBeNull()
  })
})

describe('the job process', () => {
  const running = new Set<ChildProcess>()
  function startWorker(): ChildProcess {
    const child = spawn(process.execPath, ['--import', 'tsx', 'worker.ts'], {
      stdio: ['ignore', 'ignore', 'inherit'],
    })
    running.add(child)
    child.once('exit', () => running.delete(child))
    return child
  }
  async function until(condition: () => Promise<boolean>, milliseconds: number) {
    const end = Date.now() + milliseconds
    while (!(await condition())) {
      if (Date.now() > end) throw new Error('It did not come about in time.')
      await new Promise((resolve) => setTimeout(resolve, 25))
    }
  }

  const setExpiry = (kit: Kit, after: string) =>
    sequelize().query(
      `UPDATE pgboss.job SET expire_in = $after::interval WHERE data->>'kitId' = $id`,
      { bind: { id: kit.id, after } },
    )
  async function jobOf(kit: Kit): Promise<{ state: string; retry_count: number }> {
    const [rows] = await sequelize().query(
      `SELECT state, retry_count FROM pgboss.job WHERE data->>'kitId' = $id`,
      { bind: { id: kit.id } },
    )
    return (rows as { state: string; retry_count: number }[])[0]!
  }

  it('killed in the middle of a kit leaves it to the next one, which builds it once, whole', async () => {
    const photograph = await shownPhotograph()
    const combinations = []
    for (let count = 0; count < 12; count++)
      combinations.push(await makeCombination(line, shades, { photographId: photograph.id }))
    await sequelize().query(`DELETE FROM pgboss.job WHERE name = 'build-kit'`)
    const kit = await ask(combinations)
    try {
      const first = startWorker()
      await until(async () => (await fresh(kit)).done >= 2, 60_000)
      first.kill('SIGKILL')
      await once(first, 'exit')
      const left = await fresh(kit)
      expect(left).toMatchObject({ state: 'building', objectKey: null, total: 13 })
      expect(left.done).toBeLessThan(13)
      // Its expiry, brought forward: what maintenance does after two minutes.
      await setExpiry(kit, '1 second')
      startWorker()
      await until(async () => (await jobOf(kit)).state !== 'active', 60_000)
      await setExpiry(kit, '2 minutes')
      await until(async () => (await fresh(kit)).state === 'ready', 120_000)
      await until(async () => (await jobOf(kit)).state === 'completed', 10_000)
      expect(await jobOf(kit)).toMatchObject({ retry_count: 1 })
      const built = await fresh(kit)
      expect(built).toMatchObject({ done: 13, total: 13, leftOut: [] })
      expect(built.contents).toHaveLength(12)
      const pictures = Object.keys(await filesOf(kit)).filter((path) => path.endsWith('.png'))
      expect(pictures).toHaveLength(36)
    } finally {
      await Promise.all(
        [...running].map(async (child) => {
          child.kill('SIGTERM')
          await once(child, 'exit')
        }),
      )
    }
  }, 280_000)
})
