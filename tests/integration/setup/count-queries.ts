import type { Options } from 'sequelize'

import { sequelize } from '@/models'

/** Does the work and counts the SQL statements that it sends, those of its transactions among them. */
export async function countQueries<T>(
  work: () => Promise<T>,
): Promise<{ answer: T; queries: number }> {
  const { options } = sequelize() as unknown as { options: Options }
  const { logging } = options
  let queries = 0
  options.logging = () => {
    queries += 1
  }
  try {
    const answer = await work()
    return { answer, queries }
  } finally {
    options.logging = logging
  }
}
