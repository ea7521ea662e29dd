import { authorize, type Actor } from '@/lib/auth/actor'
import { getLine } from '@/lib/lines/queries'
import { presentShade, SHADE_VIEW_COLUMNS, type ShadeRow } from '@/lib/shades/present'
import { Family, Shade, type Line } from '@/models'

import { canReadFamilies } from './policy'
import {
  FAMILY_VIEW_COLUMNS,
  presentFamily,
  type FamilyView,
  type FamilyWithShades,
} from './present'

/** The families of a line in their order. One query; empty for a line of another brand. */
export async function listFamilies(actor: Actor, lineId: string): Promise<FamilyView[]> {
  authorize(actor, canReadFamilies)
  const families = await Family.findAll({
    attributes: [...FAMILY_VIEW_COLUMNS],
    where: { brandId: actor.brandId, lineId },
    order: [
      ['position', 'ASC'],
      ['id', 'ASC'],
    ],
    raw: true,
  })
  return families.map(presentFamily)
}

/**
 * All families of a line with their shades, and those shades that are in none. Three queries.
 * @throws NotFoundError
 */
export async function readFamilies(
  actor: Actor,
  lineSlug: string,
): Promise<{ line: Line; families: FamilyWithShades[]; unplaced: number; total: number }> {
  authorize(actor, canReadFamilies)
  const line = await getLine(actor, lineSlug)
  const [families, rows] = await Promise.all([
    listFamilies(actor, line.id),
    Shade.findAll({
      attributes: [...SHADE_VIEW_COLUMNS],
      where: { brandId: actor.brandId, lineId: line.id },
      order: IN_FAMILY,
      raw: true,
    }) as Promise<ShadeRow[]>,
  ])
  const held = rows.map(presentShade)
  return {
    line,
    families: families.map((family) => {
      const shades = held.filter(({ familyId }) => familyId === family.id)
      const ordered = shades.some(({ familyPosition }) => familyPosition !== null)
      return { ...family, ordered, shades }
    }),
    unplaced: held.filter(({ familyId }) => familyId === null).length,
    total: held.length,
  }
}

/** The order of shades within a family: that of people's own, else light to dark. */
export const IN_FAMILY: [string, string][] = [
  ['familyPosition', 'ASC NULLS LAST'],
  ['labL', 'DESC'],
  ['position', 'ASC'],
  ['createdAt', 'ASC'],
  ['id', 'ASC'],
]
