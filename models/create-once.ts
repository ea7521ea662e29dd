import { randomUUID } from 'node:crypto'

import type { CreationAttributes, Model, ModelStatic, Transaction } from 'sequelize'

/** A row that a form makes: the form's `requestKey` names the submit. */
interface Requested extends Model {
  id: string
  brandId: string
  requestKey: string | null
}

/**
 * Makes the row of a submit, or finds the one that the same submit made before; waits for one that
 * is under way at the same moment.
 * @returns the row and whether this call made it; null when another unique value of the row is taken
 */
export async function createOnce<M extends Requested>(
  model: ModelStatic<M>,
  values: Omit<CreationAttributes<M>, 'id'> & { brandId: string; requestKey: string },
  transaction: Transaction,
): Promise<{ row: M; created: boolean } | null> {
  const id = randomUUID()
  const { brandId, requestKey } = values
  await model.bulkCreate([{ ...values, id } as unknown as CreationAttributes<M>], {
    ignoreDuplicates: true,
    transaction,
  })
  const row = await (model as unknown as ModelStatic<Requested>).findOne({
    where: { brandId, requestKey },
    paranoid: false,
    transaction,
  })
  return row && { row: row as M, created: row.id === id }
}
