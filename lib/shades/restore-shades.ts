import { literal } from 'sequelize'

import { recordedShades } from '@/lib/activity/objects'
import { recordActivity } from '@/lib/activity/record'
import type { Actor } from '@/lib/auth/actor'
import { ConflictError } from '@/lib/errors'
import { Shade } from '@/models'

import { changeShades, findNumberHolder, findShades, requireRoom } from './change-shades'
import type { RestoreShadesInput } from './schema'

/**
 * Takes a deletion back, for all or none. Restoring what is not deleted is no error.
 * @throws NotFoundError when one of them never was a shade of this line
 * @throws ConflictError when a number was given to another shade meanwhile, or the line is full
 */
export async function restoreShades(
  actor: Actor,
  { lineSlug, shadeIds }: RestoreShadesInput,
): Promise<{ restored: number }> {
  return changeShades(actor, lineSlug, async (line, transaction) => {
    const shades = await findShades(line, shadeIds, transaction)
    const deleted = shades.filter(({ deletedAt }) => deletedAt)
    const where = { brandId: actor.brandId, lineId: line.id }
    requireRoom(await Shade.count({ where, transaction }), deleted.length)
    const numbers = deleted.map(({ number }) => number)
    const holder = await findNumberHolder(line, numbers, transaction)
    if (holder) {
      throw new ConflictError(
        `No. ${holder.number} was given to another shade meanwhile${holder.name ? `, ${holder.name}` : ''}. Give that one another number, then take the deletion back.`,
      )
    }
    await Shade.update(
      { deletedAt: null, version: literal('version + 1') as unknown as number },
      {
        where: { ...where, id: deleted.map(({ id }) => id) },
        paranoid: false,
        transaction,
      },
    )
    if (deleted.length > 0) {
      const recorded = recordedShades(deleted, line)
      await recordActivity(actor, { action: 'shade.restored', ...recorded }, transaction)
    }
    return { answer: { restored: deleted.length }, changed: deleted.length > 0 }
  })
}
