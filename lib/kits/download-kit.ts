import { lineObject } from '@/lib/activity/objects'
import { recordActivity } from '@/lib/activity/record'
import { authorize, type Actor } from '@/lib/auth/actor'
import { ConflictError, NotFoundError } from '@/lib/errors'
import { presignDownload, requireObjectStore } from '@/lib/storage/objects'
import { inTransaction, Line } from '@/models'

import { KIT_LIMITS } from './constants'
import { canReadKits } from './policy'
import { loadKit } from './queries'

/**
 * A link to a kit's file, good for ten minutes; taking it away is recorded.
 * @throws NotFoundError, ConflictError when there is nothing (any more) to take away,
 * UnavailableError when the store is away
 */
export async function downloadKit(actor: Actor, kitId: string): Promise<string> {
  authorize(actor, canReadKits)
  const kit = await loadKit(actor, kitId)
  const { objectKey, expiresAt, contents } = kit
  if (objectKey === null || expiresAt === null || expiresAt.getTime() <= Date.now()) {
    throw new ConflictError(
      kit.state === 'ready'
        ? 'This kit has expired and its file is removed. Build it again from the same combinations.'
        : 'This kit is not built yet.',
    )
  }
  await requireObjectStore()
  const line = await Line.findOne({ where: { id: kit.lineId, brandId: actor.brandId } })
  if (!line) throw new NotFoundError()
  await inTransaction((transaction) =>
    recordActivity(
      actor,
      {
        action: 'kit.downloaded',
        object: lineObject(line),
        after: { kit: kit.id, count: contents.length },
      },
      transaction,
    ),
  )
  const day = kit.createdAt.toISOString().slice(0, 10)
  return presignDownload({
    key: objectKey,
    fileName: `${line.slug}-kit-${day}.zip`,
    seconds: KIT_LIMITS.linkSeconds,
  })
}
