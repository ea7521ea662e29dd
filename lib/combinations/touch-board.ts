import { literal, type Transaction } from 'sequelize'

import type { Actor } from '@/lib/auth/actor'
import { NotFoundError } from '@/lib/errors'
import { Line } from '@/models'

/**
 * Says that the line's combinations change, and holds the line's row until the transaction ends: of
 * two who move, keep or edit combinations of a line, the second waits. Every command that changes
 * one calls it before it writes a combination.
 * @throws NotFoundError when the line is not of the brand
 */
export async function touchBoard(
  { brandId }: Pick<Actor, 'brandId'>,
  lineId: string,
  transaction: Transaction,
): Promise<void> {
  const [touched] = await Line.update(
    { boardRevision: literal('board_revision + 1') },
    { where: { brandId, id: lineId }, transaction, silent: true },
  )
  if (touched !== 1) throw new NotFoundError()
}
