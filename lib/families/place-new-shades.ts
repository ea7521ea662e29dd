import { randomUUID } from 'node:crypto'

import type { Transaction } from 'sequelize'

import { Shade, type Line } from '@/models'

import { placeNew, sortAnew, type Arrangement } from './arrangement'
import { FAMILY_LIMITS } from './constants'
import { readArrangement, saveArrangement } from './save-arrangement'

/** Whether a person has put anything in its place. */
const isTouched = ({ families, shades }: Arrangement): boolean =>
  families.some(({ nameGiven }) => nameGiven) ||
  shades.some(({ pinned, position }) => pinned || position !== null)

/**
 * Puts shades that are in no family into that of their nearest shade. A line without families is
 * sorted whole, and so is one of a few shades that nobody has touched. The caller has locked the
 * line's row. One query when there is nothing to place.
 */
export async function placeNewShades(line: Line, transaction: Transaction): Promise<void> {
  const where = { brandId: line.brandId, lineId: line.id, familyId: null }
  const unplaced = await Shade.findOne({ attributes: ['id'], where, transaction })
  if (!unplaced) return
  const before = await readArrangement(line, transaction)
  const small = before.shades.length < FAMILY_LIMITS.settled && !isTouched(before)
  const after = small
    ? sortAnew(before, line.familyCount, randomUUID)
    : placeNew(before, randomUUID)
  await saveArrangement(line, before, after, transaction)
  const names = ({ families }: Arrangement) =>
    families.map(({ id, name }) => `${id} ${name}`).join()
  // Whoever has the families open and sees none of these changes goes on undisturbed.
  if (before.families.length > 0 && names(before) !== names(after)) {
    await line.increment('familiesVersion', { transaction })
  }
}
