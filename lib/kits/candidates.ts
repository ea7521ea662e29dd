import type { Transaction, WhereOptions } from 'sequelize'

import { Combination, CombinationPlace, Photograph, Shade } from '@/models'

/**
 * Combinations with everything a kit asks of them, in the order of their lanes on the board.
 * Three queries, however many there are.
 */
export function findCandidates(
  where: WhereOptions<Combination>,
  transaction?: Transaction,
): Promise<Combination[]> {
  return Combination.findAll({
    where,
    include: [
      { model: Photograph, as: 'photograph' },
      {
        model: CombinationPlace,
        as: 'places',
        separate: true,
        order: [['place', 'ASC']],
        include: [{ model: Shade, as: 'shade', paranoid: false }],
      },
    ],
    order: [
      ['rank', 'ASC'],
      ['id', 'ASC'],
    ],
    transaction: transaction ?? null,
  })
}
