import { QueryTypes } from 'sequelize'

import { sequelize } from '@/models'

/** Whether the database answers within a second. */
export async function isReady(): Promise<boolean> {
  const late = new Promise<false>((resolve) => setTimeout(resolve, 1_000, false).unref())
  const answers = sequelize()
    .query('SELECT 1', { type: QueryTypes.SELECT })
    .then(
      () => true,
      () => false,
    )
  return Promise.race([answers, late])
}
