import { shadeObject } from '@/lib/activity/objects'
import { recordChanges } from '@/lib/activity/record'
import type { Actor } from '@/lib/auth/actor'
import { ConflictError, NotFoundError, type FieldErrors } from '@/lib/errors'
import { Shade, updateVersioned } from '@/models'

import { changeShades, findNumberHolder, numberTaken } from './change-shades'
import { colorColumns, describeColor, isSameColor } from './color'
import type { UpdateShadeInput } from './schema'

/**
 * Changes the given fields of a shade; its name is none of them (lib/names).
 * @throws NotFoundError
 * @throws ConflictError when the number is taken, or when somebody saved in between: its
 * fieldErrors then say what stands there now
 */
export async function updateShade(actor: Actor, input: UpdateShadeInput): Promise<Shade> {
  const { lineSlug, shadeId, version, color, ...fields } = input
  return changeShades(actor, lineSlug, async (line, transaction) => {
    const shade = await Shade.findOne({
      where: { brandId: actor.brandId, lineId: line.id, id: shadeId },
      transaction,
    })
    if (!shade) throw new NotFoundError()
    if (shade.version !== version) throw savedFirst(shade, input)
    if (fields.number !== undefined) {
      const holder = await findNumberHolder(line, [fields.number], transaction, shade.id)
      if (holder) throw numberTaken(holder)
    }
    const values = { ...fields, ...(color && colorColumns(color)) }
    const row = { id: shade.id, brandId: actor.brandId, version }
    await updateVersioned(Shade, row, values, transaction)
    await recordChanges(
      actor,
      { action: 'shade.updated', object: shadeObject(shade, line) },
      { before: shade, after: values },
      transaction,
    )
    return { answer: await shade.reload({ transaction }), changed: true }
  })
}

/** The conflict that names what the other person saved, field by field. */
function savedFirst(shade: Shade, { number, status, color }: UpdateShadeInput) {
  const theirs: FieldErrors = {}
  if (number !== undefined && number !== shade.number) theirs.number = [`Now ${shade.number}.`]
  if (status !== undefined && status !== shade.status) theirs.status = [`Now ${shade.status}.`]
  if (color && !isSameColor(colorColumns(color), shade)) {
    theirs.color = [`Now ${describeColor(shade)}.`]
  }
  const differs = Object.values(theirs).flat()
  return new ConflictError(
    [
      'Somebody else saved this shade first.',
      ...differs,
      'What you typed is still here: save again to put yours in its place.',
    ].join(' '),
    theirs,
  )
}
