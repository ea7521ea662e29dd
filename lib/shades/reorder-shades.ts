import { QueryTypes } from 'sequelize'

import { recordedShades } from '@/lib/activity/objects'
import { recordActivity } from '@/lib/activity/record'
import type { Actor } from '@/lib/auth/actor'
import { sequelize, Shade } from '@/models'

import { changeShades, findShades } from './change-shades'
import { BY_POSITION } from './queries'
import type { ReorderShadesInput } from './schema'

/**
 * Moves shades, in the order they stand, so that the first of them comes to `place`; the line is
 * numbered anew without gaps. Answers the place it came to, which is the last one at most. The
 * versions of the shades stay: their order is no field of theirs.
 * @throws NotFoundError when one of them is not there
 */
export async function reorderShades(
  actor: Actor,
  { lineSlug, shadeIds, place }: ReorderShadesInput,
): Promise<{ place: number }> {
  return changeShades(actor, lineSlug, async (line, transaction) => {
    const shades = await findShades(line, shadeIds, transaction)
    const moved = new Set(shades.map(({ id }) => id))
    const order = await Shade.findAll({
      attributes: ['id', 'position'],
      where: { brandId: actor.brandId, lineId: line.id },
      order: BY_POSITION,
      raw: true,
      transaction,
    })
    const staying = order.filter(({ id }) => !moved.has(id))
    const at = Math.min(place - 1, staying.length)
    const next = [
      ...staying.slice(0, at),
      ...order.filter(({ id }) => moved.has(id)),
      ...staying.slice(at),
    ]
    if (next.every(({ position }, index) => position === index)) {
      return { answer: { place: at + 1 }, changed: false }
    }
    await sequelize().query(
      `UPDATE shades SET position = place.ordinality - 1, updated_at = now()
       FROM unnest($ids::uuid[]) WITH ORDINALITY AS place (id)
       WHERE shades.id = place.id AND brand_id = $brandId AND line_id = $lineId`,
      {
        bind: { ids: next.map(({ id }) => id), brandId: actor.brandId, lineId: line.id },
        type: QueryTypes.UPDATE,
        transaction,
      },
    )
    const { object, after } = recordedShades(
      shades.filter(({ deletedAt }) => !deletedAt),
      line,
    )
    const first = order.findIndex(({ id }) => moved.has(id)) + 1
    await recordActivity(
      actor,
      {
        action: 'shade.reordered',
        object,
        before: { place: first },
        after: { place: at + 1, ...after },
      },
      transaction,
    )
    return { answer: { place: at + 1 }, changed: true }
  })
}
