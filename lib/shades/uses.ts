import type { Transaction } from 'sequelize'

import { authorize, type Actor } from '@/lib/auth/actor'
import { canReadCombinations } from '@/lib/combinations/policy'
import { Combination, CombinationPlace } from '@/models'

import type { ShadeUses } from './present'

const NAMED = 10

/** The combinations, deleted ones left out, that these shades stand in. One query. */
export async function findUses(
  actor: Actor,
  shadeIds: readonly string[],
  transaction?: Transaction,
): Promise<ShadeUses> {
  authorize(actor, canReadCombinations)
  const combinations = await Combination.findAll({
    attributes: ['id', 'title'],
    where: { brandId: actor.brandId },
    include: {
      model: CombinationPlace,
      as: 'places',
      attributes: ['shadeId'],
      where: { shadeId: [...shadeIds] },
      required: true,
    },
    order: [
      ['title', 'ASC'],
      ['id', 'ASC'],
    ],
    transaction: transaction ?? null,
  })
  const places = combinations.flatMap((combination) => combination.places ?? [])
  return {
    combinations: combinations
      .slice(0, NAMED)
      .map(({ id, title }) => ({ combinationId: id, title })),
    total: combinations.length,
    shadeIds: [...new Set(places.flatMap(({ shadeId }) => shadeId ?? []))],
  }
}
