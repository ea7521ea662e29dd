import { setTimeout as sleep } from 'node:timers/promises'

import { Refusal } from './say.mjs'

/** All photographs of the demo are read and copied within this, in milliseconds. */
const WITHIN = 5 * 60_000

/**
 * Waits until every photograph is ready and no job about one is left to do.
 * @param {string} connectionString of the database
 * @throws {Refusal} after five minutes
 */
export async function photographsSettled(connectionString) {
  const { default: pg } = await import('pg')
  const client = new pg.Client({ connectionString })
  await client.connect()
  const deadline = Date.now() + WITHIN
  try {
    for (;;) {
      const { rows } = await client.query(
        `SELECT (SELECT count(*) FROM photographs WHERE state <> 'ready') +
          (SELECT count(*) FROM pgboss.job WHERE state IN ('created', 'retry', 'active')
            AND name LIKE '%-photograph') AS left`,
      )
      if (rows[0].left === '0') return
      if (Date.now() > deadline) throw new Refusal('The photographs of the demo were not read.')
      await sleep(500)
    }
  } finally {
    await client.end()
  }
}
