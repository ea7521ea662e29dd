import { shadeObject } from '@/lib/activity/objects'
import { recordActivity } from '@/lib/activity/record'
import type { Actor } from '@/lib/auth/actor'
import { writeDrafts } from '@/lib/names/write-drafts'
import { createOnce, Shade } from '@/models'

import { changeShades, findNumberHolder, numberTaken, requireRoom } from './change-shades'
import { colorColumns } from './color'
import type { CreateShadeInput } from './schema'

/**
 * Adds a shade at the end of the line's order; a name that was typed becomes a draft of it. The same
 * `requestKey` again gives the shade it made the first time.
 * @throws NotFoundError, ConflictError when the number is taken or the line is full
 */
export async function createShade(actor: Actor, input: CreateShadeInput): Promise<Shade> {
  const { lineSlug, requestKey, color, name: text, ...fields } = input
  const shade = await changeShades(actor, lineSlug, async (line, transaction) => {
    const where = { brandId: actor.brandId, lineId: line.id }
    const held = await Shade.count({ where, transaction })
    const last = await Shade.max<number | null, Shade>('position', { where, transaction })
    const position = (last ?? -1) + 1
    const values = { ...fields, ...colorColumns(color), position }
    const made = await createOnce(Shade, { ...where, ...values, requestKey }, transaction)
    if (!made) {
      const holder = await findNumberHolder(line, [fields.number], transaction)
      throw numberTaken(holder ?? { ...fields, name: null })
    }
    if (made.created) {
      requireRoom(held, 1)
      await recordActivity(
        actor,
        { action: 'shade.created', object: shadeObject(made.row, line), after: values },
        transaction,
      )
      const drafts = text === null ? [] : [{ text, shadeId: made.row.id }]
      await writeDrafts(actor, { line, transaction }, drafts)
    }
    return { answer: made.row, changed: made.created }
  })
  // With the family it has fallen into, as whoever sends it again is told.
  return shade.reload()
}
