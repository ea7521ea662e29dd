import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'

import { beforeEach, describe, expect, it, onTestFinished } from 'vitest'

import type { Actor } from '@/lib/auth/actor'
import { deleteObjects, putObject } from '@/lib/storage/objects'
import { Photograph, type Line } from '@/models'
import { makeActor, makeBrand } from '@/tests/factories/brand'
import { makeLine } from '@/tests/factories/line'
import { makePhotograph } from '@/tests/factories/photograph'

import { filesOf, hashOf } from '../../../scripts/backup/manifest'
import { restoreBackup } from '../../../scripts/backup/put-back'
import { takeBackup } from '../../../scripts/backup/take'

let actor: Actor
let line: Line
let folder: string

beforeEach(async () => {
  actor = await makeActor(await makeBrand())
  line = await makeLine({ id: actor.brandId })
  folder = mkdtempSync(join(tmpdir(), 'woadmap-backup-'))
  onTestFinished(() => rmSync(folder, { recursive: true, force: true }))
})

async function storePhotograph(content: string): Promise<Photograph> {
  const photograph = await makePhotograph(line)
  await putObject(photograph.objectKey, Buffer.from(content), 'image/jpeg')
  return photograph
}

describe('a backup', () => {
  it('holds the rows of every table and the bytes and type of every object', async () => {
    const { objectKey } = await storePhotograph('a hillside')
    const { tables, objects, dump } = await takeBackup(folder)
    expect(tables['public.photographs']).toBe(await Photograph.count({ paranoid: false }))
    const sha256 = hashOf(Buffer.from('a hillside'))
    expect(objects).toContainEqual({
      key: objectKey,
      contentType: 'image/jpeg',
      byteLength: 10,
      sha256,
    })
    const files = filesOf(folder)
    expect(readFileSync(files.object(sha256), 'utf8')).toBe('a hillside')
    expect(hashOf(readFileSync(files.dump))).toBe(dump.sha256)
  })

  it('names the objects that rows speak of and the store has lost, and holds the rest', async () => {
    const lost = await storePhotograph('lost')
    const kept = await storePhotograph('kept')
    await deleteObjects([lost.objectKey])
    const { objects, missing } = await takeBackup(folder)
    expect(missing).toContain(lost.objectKey)
    expect(objects.map(({ key }) => key)).toContain(kept.objectKey)
  })

  it('is not written over another', async () => {
    writeFileSync(join(folder, 'letter.txt'), 'to keep')
    await expect(takeBackup(folder)).rejects.toThrow('is not empty')
  })
})

describe('a restore', () => {
  it('refuses a database that holds anything, and changes nothing', async () => {
    await takeBackup(folder)
    const after = await storePhotograph('added since')
    await expect(restoreBackup(folder)).rejects.toThrow('The database is not empty')
    expect(await Photograph.count({ where: { id: after.id } })).toBe(1)
  })

  it('refuses a backup of which a byte has changed, before it looks at the place', async () => {
    const content = `a tarn ${actor.brandId}`
    await storePhotograph(content)
    await takeBackup(folder)
    writeFileSync(filesOf(folder).object(hashOf(Buffer.from(content))), 'another tarn')
    await expect(restoreBackup(folder)).rejects.toThrow('The backup is damaged')
  })

  it('refuses a folder in which a backup was begun and not ended', async () => {
    await takeBackup(folder)
    rmSync(filesOf(folder).manifest)
    await expect(restoreBackup(folder)).rejects.toThrow('no whole backup')
  })
})
