import { generateKeyBetween } from 'fractional-indexing'
import type { Transaction } from 'sequelize'

import { Combination } from '@/models'

import type { Lane } from './constants'

/**
 * A rank above everything in a lane of a line, deleted ones too: they keep theirs for when they come
 * back. The caller holds the board (touchBoard), so that no two get the same.
 */
export async function topRank(
  { brandId, lineId, lane }: { brandId: string; lineId: string; lane: Lane },
  transaction?: Transaction,
): Promise<string> {
  const first = await Combination.min<string | null, Combination>('rank', {
    where: { brandId, lineId, lane },
    paranoid: false,
    transaction,
  })
  return generateKeyBetween(null, first)
}
