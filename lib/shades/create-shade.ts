import type { Actor } from '@/lib/auth/actor'
import { Shade } from '@/models'

import { changeShades, requireFreeNumber, requireRoom } from './change-shades'
import { colorColumns } from './color'
import type { CreateShadeInput } from './schema'

/**
 * Adds a shade at the end of the line's order. The same `requestKey` again gives the shade it made
 * the first time.
 * @throws NotFoundError, ConflictError when the number is taken or the line is full
 */
export async function createShade(actor: Actor, input: CreateShadeInput): Promise<Shade> {
  const { lineSlug, requestKey, color, ...fields } = input
  return changeShades(actor, lineSlug, async (line, transaction) => {
    const made = await Shade.findOne({
      where: { brandId: actor.brandId, lineId: line.id, requestKey },
      paranoid: false,
      transaction,
    })
    if (made) return { answer: made, changed: false }
    await requireFreeNumber(line, fields.number, transaction)
    const where = { brandId: actor.brandId, lineId: line.id }
    requireRoom(await Shade.count({ where, transaction }), 1)
    const last = await Shade.max<number | null, Shade>('position', { where, transaction })
    const shade = await Shade.create(
      {
        ...where,
        ...fields,
        ...colorColumns(color),
        position: (last ?? -1) + 1,
        requestKey,
      },
      { transaction },
    )
    return { answer: shade, changed: true }
  })
}
