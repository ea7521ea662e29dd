import { Op } from 'sequelize'

import { deleteObjects, listObjects } from '@/lib/storage/objects'
import { Kit } from '@/models'

import { KITS, kitOfKey } from './keys'

const MINUTE = 60_000
/** Longer than all tries of a kit's job. */
const STUCK = 30 * MINUTE
/** Longer than a kit's zip lies in the store before its row says so. */
const ORPHAN = 60 * MINUTE
const BATCH = 500

/** What a sweep did. */
export interface KitSweepResult {
  expired: number
  stuck: number
  objects: number
}

/**
 * The work of the job `sweep-kits`: removes the files of kits that have expired, whose rows stay
 * and say so, and files without a row; gives up what will not be built any more.
 * @param now for tests @throws UnavailableError when the store is away; the next sweep goes on
 */
export async function sweepKits(now = Date.now()): Promise<KitSweepResult> {
  const [stuck] = await Kit.update(
    { state: 'failed', failure: 'Building it was cut off several times. Build the kit again.' },
    {
      where: {
        state: ['waiting', 'building'],
        updatedAt: { [Op.lte]: new Date(now - STUCK) },
      },
    },
  )
  // The rows first: a file that stays behind has no row that names it, and the next sweep finds it.
  const [expired] = await Kit.update(
    { objectKey: null },
    { where: { expiresAt: { [Op.lte]: new Date(now) }, objectKey: { [Op.ne]: null } } },
  )
  return { stuck, expired, objects: await sweepFiles(now) }
}

async function sweepFiles(now: number): Promise<number> {
  let swept = 0
  let batch: string[] = []
  const flush = async () => {
    const ids = batch.flatMap((key) => kitOfKey(key) ?? [])
    const kits = await Kit.findAll({ where: { id: ids }, attributes: ['id', 'objectKey', 'state'] })
    const wanted = new Set(
      kits.flatMap(({ id, objectKey, state }) =>
        objectKey !== null || state === 'waiting' || state === 'building' ? [id] : [],
      ),
    )
    const left = batch.filter((key) => !wanted.has(kitOfKey(key) ?? ''))
    await deleteObjects(left)
    swept += left.length
    batch = []
  }
  for await (const { key, modifiedAt } of listObjects(KITS)) {
    if (now - modifiedAt.getTime() >= ORPHAN) batch.push(key)
    if (batch.length === BATCH) await flush()
  }
  if (batch.length > 0) await flush()
  return swept
}
