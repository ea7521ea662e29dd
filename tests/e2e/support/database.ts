import { readFileSync } from 'node:fs'

import pg from 'pg'

/** A connection to the database of the product under test, as its owner. */
export async function database(): Promise<pg.Client> {
  const client = new pg.Client({ connectionString: process.env.DATABASE_URL })
  client.on('error', () => {})
  await client.connect()
  return client
}

/** Stops PostgreSQL as a power cut would; the launcher starts it again. */
export async function crashDatabase(client: pg.Client): Promise<void> {
  const { pid } = (await client.query('SELECT pg_backend_pid() AS pid')).rows[0]
  const server = Number(/^PPid:\s*(\d+)/m.exec(readFileSync(`/proc/${pid}/status`, 'utf8'))![1])
  process.kill(server, 'SIGQUIT')
}
