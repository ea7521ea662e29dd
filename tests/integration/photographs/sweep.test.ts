import { beforeEach, describe, expect, it } from 'vitest'

import type { Actor } from '@/lib/auth/actor'
import { confirmUpload } from '@/lib/photographs/confirm-upload'
import { deletePhotographs, restorePhotographs } from '@/lib/photographs/delete-photographs'
import { ConflictError, NotFoundError } from '@/lib/errors'
import { readPhotograph } from '@/lib/photographs/read-photograph'
import { UNDO_WINDOW } from '@/lib/photographs/constants'
import { sweepUploads } from '@/lib/photographs/sweep'
import { listObjects, putObject } from '@/lib/storage/objects'
import { Photograph, Reading, sequelize, type Line } from '@/models'
import { makeActor, makeBrand } from '@/tests/factories/brand'
import { makeCombination } from '@/tests/factories/combination'
import { makeLine } from '@/tests/factories/line'
import { makePhotograph, makePicture, uploadTo } from '@/tests/factories/photograph'
import { makeShades } from '@/tests/factories/shade'

let actor: Actor
let line: Line

beforeEach(async () => {
  actor = await makeActor(await makeBrand())
  line = await makeLine({ id: actor.brandId })
})

async function keysOfBrand(): Promise<string[]> {
  const keys: string[] = []
  for (const folder of ['originals', 'derivatives']) {
    for await (const { key } of listObjects(`${folder}/${actor.brandId}/`)) keys.push(key)
  }
  return keys
}

/** Puts a time of a photograph's row into the past, which no model would. */
function age(id: string, column: 'updated_at' | 'deleted_at', milliseconds: number) {
  return sequelize().query(`UPDATE photographs SET ${column} = $time WHERE id = $id`, {
    bind: { id, time: new Date(Date.now() - milliseconds) },
  })
}

/** The jobs about a photograph; deleting them is what doing them comes to. */
async function jobsOf(id: string, what: 'SELECT' | 'DELETE'): Promise<unknown[]> {
  const [rows] = await sequelize().query(
    `${what === 'SELECT' ? 'SELECT id' : 'DELETE'} FROM pgboss.job
     WHERE name = 'read-photograph' AND data->>'photographId' = $id`,
    { bind: { id } },
  )
  return rows
}

describe('the sweep', () => {
  it('removes an upload that was never confirmed, row and object, and not before its time', async () => {
    const id = await uploadTo(actor, line, await makePicture())
    await sweepUploads()
    expect(await Photograph.count({ where: { id } })).toBe(1)
    await age(id, 'updated_at', 16 * 60_000)
    await sweepUploads()
    expect(await Photograph.count({ where: { id }, paranoid: false })).toBe(0)
    expect(await keysOfBrand()).toEqual([])
  })

  it('removes a deleted photograph with its reading and all its objects; its combinations stay', async () => {
    await makeShades(line, 6)
    const photographId = await uploadTo(actor, line, await makePicture())
    await confirmUpload(actor, { photographId })
    await readPhotograph(photographId)
    const combination = await makeCombination(line, [], {
      photographId,
      createdById: actor.personId,
    })
    expect((await keysOfBrand()).length).toBeGreaterThan(2)
    await deletePhotographs(actor, { photographIds: [photographId] })
    await sweepUploads()
    expect((await keysOfBrand()).length).toBeGreaterThan(2)
    await age(photographId, 'deleted_at', UNDO_WINDOW + 1)
    await sweepUploads()
    expect(await Photograph.count({ where: { id: photographId }, paranoid: false })).toBe(0)
    expect(await Reading.count({ where: { photographId } })).toBe(0)
    expect(await keysOfBrand()).toEqual([])
    expect((await combination.reload()).photographId).toBeNull()
  })

  it('removes objects that no row knows, and none that one does', async () => {
    const kept = await uploadTo(actor, line, await makePicture())
    await confirmUpload(actor, { photographId: kept })
    const lost = '00000000-0000-4000-8000-000000000000'
    await putObject(`originals/${actor.brandId}/${lost}`, Buffer.from('x'), 'image/jpeg')
    await putObject(
      `derivatives/${actor.brandId}/${lost}/a-480.webp`,
      Buffer.from('x'),
      'image/webp',
    )
    await sweepUploads()
    expect(await keysOfBrand()).toHaveLength(3)
    await sweepUploads({ orphan: 0 })
    expect(await keysOfBrand()).toEqual([`originals/${actor.brandId}/${kept}`])
  })

  it('gives up a reading that was cut off again and again, in words', async () => {
    const photograph = await makePhotograph(line, { state: 'reading' })
    await sweepUploads()
    expect((await photograph.reload()).state).toBe('reading')
    await age(photograph.id, 'updated_at', 21 * 60_000)
    await sweepUploads()
    expect(await photograph.reload()).toMatchObject({
      state: 'failed',
      failure: expect.stringMatching(/again/),
    })
  })
})

describe('undoing a delete', () => {
  it('brings photographs back', async () => {
    const photographs = [await makePhotograph(line), await makePhotograph(line)]
    const photographIds = photographs.map(({ id }) => id)
    await deletePhotographs(actor, { photographIds })
    expect(await Photograph.count({ where: { lineId: line.id } })).toBe(0)
    expect(await restorePhotographs(actor, { photographIds })).toEqual({ count: 2 })
    expect(await Photograph.count({ where: { lineId: line.id } })).toBe(2)
  })

  it('has a photograph read that was deleted before its turn', async () => {
    const id = await uploadTo(actor, line, await makePicture())
    await confirmUpload(actor, { photographId: id })
    await deletePhotographs(actor, { photographIds: [id] })
    // The job comes and finds nothing to read.
    await readPhotograph(id)
    await jobsOf(id, 'DELETE')
    await restorePhotographs(actor, { photographIds: [id] })
    expect(await jobsOf(id, 'SELECT')).toHaveLength(1)
    await readPhotograph(id)
    expect((await Photograph.findByPk(id))!.state).toBe('ready')
  })

  it('is refused once the same file is there again', async () => {
    const bytes = await makePicture()
    const first = await uploadTo(actor, line, bytes)
    await confirmUpload(actor, { photographId: first })
    await deletePhotographs(actor, { photographIds: [first] })
    await confirmUpload(actor, { photographId: await uploadTo(actor, line, bytes) })
    await expect(restorePhotographs(actor, { photographIds: [first] })).rejects.toThrow(
      ConflictError,
    )
  })

  it('is too late after the undo window, even before the sweep', async () => {
    const { id } = await makePhotograph(line)
    await deletePhotographs(actor, { photographIds: [id] })
    await age(id, 'deleted_at', UNDO_WINDOW + 1000)
    await expect(restorePhotographs(actor, { photographIds: [id] })).rejects.toThrow(NotFoundError)
  })
})
