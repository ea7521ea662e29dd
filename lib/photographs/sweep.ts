import { Op, type WhereOptions } from 'sequelize'

import { deleteObjects, listObjects } from '@/lib/storage/objects'
import { Photograph } from '@/models'

import { DERIVATIVES, objectKeysOf, ORIGINALS, photographOfKey } from './keys'
import { UNDO_WINDOW } from './constants'

const MINUTE = 60_000

/** How old something must be before it is swept, in milliseconds. */
export interface SweepAges {
  /** An upload that was never confirmed. Longer than its form is good for. */
  pending: number
  /** A deleted photograph. */
  deleted: number
  /** An object without a row: longer than an upload can take. */
  orphan: number
  /** A photograph that says it is being read: longer than all tries of its job. */
  reading: number
  /** A photograph that waits to be read: longer than any heap before it takes. */
  waiting: number
}

const AGES: SweepAges = {
  pending: 15 * MINUTE,
  deleted: UNDO_WINDOW,
  orphan: 60 * MINUTE,
  reading: 20 * MINUTE,
  waiting: 6 * 60 * MINUTE,
}

/** Keys are looked at this many at a time. */
const BATCH = 500
/** Rows with all their objects; the store removes at most 1,000 at once. */
const ROWS = 100

/** What a sweep did. */
export interface SweepResult {
  uploads: number
  photographs: number
  objects: number
  stuck: number
}

/**
 * The work of the job `sweep-uploads`: removes what no one will ask for again from the database and
 * the object store, so that nothing is left over in either after any failure. Rows go before their
 * objects; an object that stays behind has no row any more, and the next sweep finds it.
 * @throws UnavailableError when the store is away; the next sweep goes on
 */
export async function sweepUploads(ages: Partial<SweepAges> = {}): Promise<SweepResult> {
  const age = { ...AGES, ...ages }
  const before = (milliseconds: number) => ({ [Op.lte]: new Date(Date.now() - milliseconds) })
  const cutOff = await giveUp(
    'reading',
    before(age.reading),
    'Reading it was cut off several times.',
  )
  const lost = await giveUp('waiting', before(age.waiting), 'Its reading never began.')
  const uploads = await sweepRows({ state: 'pending', updatedAt: before(age.pending) })
  const photographs = await sweepRows({ deletedAt: before(age.deleted) })
  let objects = 0
  for (const prefix of [ORIGINALS, DERIVATIVES]) objects += await sweepOrphans(prefix, age.orphan)
  return { uploads, photographs, objects, stuck: cutOff + lost }
}

async function giveUp(
  state: 'reading' | 'waiting',
  updatedAt: { [Op.lte]: Date },
  why: string,
): Promise<number> {
  const [count] = await Photograph.update(
    { state: 'failed', failure: `${why} Read the photograph again.` },
    { where: { state, updatedAt } },
  )
  return count
}

async function sweepRows(where: WhereOptions<Photograph>): Promise<number> {
  for (let swept = 0; ;) {
    const rows = await Photograph.findAll({ where, limit: ROWS, paranoid: false })
    if (rows.length === 0) return swept
    // The condition again: a row may have been confirmed or brought back since.
    const gone = { ...where, id: rows.map(({ id }) => id) }
    swept += await Photograph.destroy({ where: gone, force: true })
    const left = await Photograph.findAll({
      where: { id: gone.id },
      attributes: ['id'],
      paranoid: false,
    })
    const stays = new Set(left.map(({ id }) => id))
    await deleteObjects(rows.filter(({ id }) => !stays.has(id)).flatMap(objectKeysOf))
  }
}

async function sweepOrphans(prefix: string, age: number): Promise<number> {
  let swept = 0
  let batch: string[] = []
  const flush = async () => {
    const ids = batch.flatMap((key) => photographOfKey(key) ?? [])
    const rows = await Photograph.findAll({
      where: { id: [...new Set(ids)] },
      attributes: ['id'],
      paranoid: false,
    })
    const known = new Set(rows.map(({ id }) => id))
    const orphans = batch.filter((key) => !known.has(photographOfKey(key) ?? ''))
    await deleteObjects(orphans)
    swept += orphans.length
    batch = []
  }
  for await (const { key, modifiedAt } of listObjects(prefix)) {
    if (Date.now() - modifiedAt.getTime() >= age) batch.push(key)
    if (batch.length === BATCH) await flush()
  }
  if (batch.length > 0) await flush()
  return swept
}
