import { recordedShades } from '@/lib/activity/objects'
import { recordActivity } from '@/lib/activity/record'
import type { Actor } from '@/lib/auth/actor'
import { Shade } from '@/models'

import { changeShades, findShades } from './change-shades'
import type { DeleteShadesAnswer } from './present'
import type { DeleteShadesInput } from './schema'
import { findUses } from './uses'

/**
 * Deletes shades, all or none. Those in use by kept combinations are deleted only once `confirmed`;
 * the combinations keep showing them, as deleted. Deleting again what is deleted is no error.
 * @throws NotFoundError when one of them is not a shade of this line
 */
export async function deleteShades(
  actor: Actor,
  { lineSlug, shadeIds, confirmed }: DeleteShadesInput,
): Promise<DeleteShadesAnswer> {
  return changeShades<DeleteShadesAnswer>(actor, lineSlug, async (line, transaction) => {
    const shades = await findShades(line, shadeIds, transaction)
    const standing = shades.filter(({ deletedAt }) => !deletedAt)
    const ids = standing.map(({ id }) => id)
    if (!confirmed) {
      const uses = await findUses(actor, ids, transaction)
      if (uses.total > 0) return { answer: { deleted: false, uses }, changed: false }
    }
    const where = { brandId: actor.brandId, lineId: line.id, id: ids }
    await Shade.destroy({ where, transaction })
    if (ids.length > 0) {
      const recorded = recordedShades(standing, line)
      await recordActivity(actor, { action: 'shade.deleted', ...recorded }, transaction)
    }
    return { answer: { deleted: true, shadeIds: ids }, changed: ids.length > 0 }
  })
}
