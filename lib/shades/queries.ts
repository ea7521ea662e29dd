import { Op } from 'sequelize'

import { authorize, type Actor } from '@/lib/auth/actor'
import { Shade } from '@/models'

import { canReadShades } from './policy'
import { presentShade, SHADE_VIEW_COLUMNS, type ShadeView } from './present'

/** The line's own order; ties fall by age. */
export const BY_POSITION: [string, 'ASC'][] = [
  ['position', 'ASC'],
  ['createdAt', 'ASC'],
  ['id', 'ASC'],
]

/**
 * The shades a photograph may be matched to: all of the line that are neither deleted nor retired,
 * in its order. One query; empty for a line of another brand.
 */
export async function listMatchShades(actor: Actor, lineId: string): Promise<ShadeView[]> {
  authorize(actor, canReadShades)
  const rows = await Shade.findAll({
    attributes: [...SHADE_VIEW_COLUMNS],
    where: { brandId: actor.brandId, lineId, status: { [Op.ne]: 'retired' } },
    order: BY_POSITION,
    raw: true,
  })
  return rows.map(presentShade)
}
