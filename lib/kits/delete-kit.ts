import { lineObject } from '@/lib/activity/objects'
import { recordActivity } from '@/lib/activity/record'
import { authorize, type Actor } from '@/lib/auth/actor'
import { NotFoundError } from '@/lib/errors'
import { logger } from '@/lib/logger'
import { deleteObjects } from '@/lib/storage/objects'
import { inTransaction, Line } from '@/models'

import { canDeleteKits } from './policy'
import { loadKit } from './queries'
import type { KitIdInput } from './schema'

/** Deletes a kit and its file; one that is being built is not finished. @throws NotFoundError */
export async function deleteKit(actor: Actor, { kitId }: KitIdInput): Promise<void> {
  authorize(actor, canDeleteKits)
  const objectKey = await inTransaction(async (transaction) => {
    const kit = await loadKit(actor, kitId, transaction)
    const line = await Line.findOne({
      where: { id: kit.lineId, brandId: actor.brandId },
      transaction,
    })
    if (!line) throw new NotFoundError()
    await kit.destroy({ transaction })
    await recordActivity(
      actor,
      {
        action: 'kit.deleted',
        object: lineObject(line),
        before: { kit: kit.id, count: kit.selection.length },
      },
      transaction,
    )
    return kit.objectKey
  })
  if (!objectKey) return
  // The sweep takes what the store does not let go of now.
  await deleteObjects([objectKey]).catch((error: unknown) => {
    logger().warn({ err: error }, 'a deleted kit’s file stays for the sweep')
  })
}
