import { literal, type Model, type ModelStatic, type Transaction } from 'sequelize'

import { ConflictError } from '@/lib/errors'

/**
 * Saves `values` on one row if it still has the version that the form was opened with, and raises
 * the version by one. The caller has loaded the row in the actor's scope.
 * @throws ConflictError when somebody saved in between
 */
export async function updateVersioned<M extends Model>(
  model: ModelStatic<M>,
  row: { id: string; brandId: string; version: number },
  values: Record<string, unknown>,
  transaction: Transaction,
): Promise<void> {
  const { id, brandId, version } = row
  const [changed] = await (model as ModelStatic<Model>).update(
    { ...values, version: literal('version + 1') },
    { where: { id, brandId, version }, transaction },
  )
  if (changed !== 1) {
    throw new ConflictError(
      'Somebody else saved this first. Your text is still here: look at theirs, then save again.',
    )
  }
}
