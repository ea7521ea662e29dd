import { QueryTypes, type Transaction } from 'sequelize'

import { Family, sequelize, Shade, type Line } from '@/models'

import type { ArrangedFamily, Arrangement } from './arrangement'

/** The families of a line and its shades, deleted ones left out. Two queries. */
export async function readArrangement(line: Line, transaction: Transaction): Promise<Arrangement> {
  const where = { brandId: line.brandId, lineId: line.id }
  const families = await Family.findAll({
    attributes: ['id', 'name', 'nameGiven', 'neutral'],
    where,
    order: [
      ['position', 'ASC'],
      ['id', 'ASC'],
    ],
    raw: true,
    transaction,
  })
  const shades = await Shade.findAll({
    attributes: [
      'id',
      'number',
      'name',
      'labL',
      'labA',
      'labB',
      'familyId',
      'familyPinned',
      'familyPosition',
    ],
    where,
    order: [['id', 'ASC']],
    raw: true,
    transaction,
  })
  return {
    families,
    shades: shades.map((shade) => ({
      id: shade.id,
      number: shade.number,
      name: shade.name,
      lab: [shade.labL, shade.labA, shade.labB],
      familyId: shade.familyId,
      pinned: shade.familyPinned,
      position: shade.familyPosition,
    })),
  }
}

const isSameFamily = (one: ArrangedFamily, other: ArrangedFamily): boolean =>
  one.name === other.name && one.nameGiven === other.nameGiven && one.neutral === other.neutral

/**
 * Saves what differs between two arrangements of one line; the caller has locked the line's row.
 * Shades keep their versions: where one stands is no field of its own.
 * @returns whether anything did
 */
export async function saveArrangement(
  line: Line,
  before: Arrangement,
  after: Arrangement,
  transaction: Transaction,
): Promise<boolean> {
  const { brandId, id: lineId } = line
  const former = new Map(before.families.map((family, place) => [family.id, { family, place }]))
  const rows = after.families.map((family, position) => ({ ...family, brandId, lineId, position }))
  const made = rows.filter(({ id }) => !former.has(id))
  const changed = rows.filter((row) => {
    const was = former.get(row.id)
    return was && (was.place !== row.position || !isSameFamily(was.family, row))
  })
  const kept = new Set(after.families.map(({ id }) => id))
  const gone = before.families.filter(({ id }) => !kept.has(id)).map(({ id }) => id)
  // An id that another line has is refused, not taken over.
  if (made.length > 0) await Family.bulkCreate(made, { transaction })
  if (changed.length > 0) {
    await Family.bulkCreate(changed, {
      updateOnDuplicate: ['name', 'nameGiven', 'neutral', 'position', 'updatedAt'],
      transaction,
    })
  }
  const stood = new Map(before.shades.map((shade) => [shade.id, shade]))
  const moved = after.shades.filter(({ id, familyId, pinned, position }) => {
    const was = stood.get(id)
    return was?.familyId !== familyId || was.pinned !== pinned || was.position !== position
  })
  if (moved.length > 0) {
    await sequelize().query(
      `UPDATE shades SET family_id = moved.family_id, family_pinned = moved.pinned,
         family_position = moved.position, updated_at = now()
       FROM unnest($ids::uuid[], $familyIds::uuid[], $pinned::boolean[], $positions::integer[])
         AS moved (id, family_id, pinned, position)
       WHERE shades.id = moved.id AND brand_id = $brandId AND line_id = $lineId`,
      {
        bind: {
          ids: moved.map(({ id }) => id),
          familyIds: moved.map(({ familyId }) => familyId),
          pinned: moved.map(({ pinned }) => pinned),
          positions: moved.map(({ position }) => position),
          brandId,
          lineId,
        },
        type: QueryTypes.UPDATE,
        transaction,
      },
    )
  }
  // Deleted shades that stood there are in no family then; restored, they are placed anew.
  if (gone.length > 0) {
    await Family.destroy({ where: { brandId, lineId, id: gone }, transaction })
  }
  return made.length + changed.length + moved.length + gone.length > 0
}
