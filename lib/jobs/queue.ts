import PgBoss from 'pg-boss'
import { DatabaseError, type Transaction } from 'sequelize'

import { currentScope } from '@/models/scope'

/**
 * The queues by name and what one of their jobs carries: ids only. A job is done at least once, so
 * its handler is idempotent.
 */
export interface JobData {
  'read-photograph': { photographId: string }
  'copy-photograph': { photographId: string }
  'sweep-uploads': Record<string, never>
  'send-letter': { letterId: string }
  'send-letters': Record<string, never>
  'sweep-people': Record<string, never>
  'build-kit': { kitId: string }
  'sweep-kits': Record<string, never>
  'tell-decisions': Record<string, never>
  'freeze-names': Record<string, never>
}
/** One of the queues. */
export type JobName = keyof JobData

/**
 * How often a job is tried again, after how long (seconds, doubling), and how long one try may take
 * before it counts as dead and is given to another process.
 */
export const QUEUES: Record<
  JobName,
  { retryLimit: number; retryDelay: number; expireInSeconds: number }
> = {
  'read-photograph': { retryLimit: 4, retryDelay: 2, expireInSeconds: 90 },
  'copy-photograph': { retryLimit: 4, retryDelay: 5, expireInSeconds: 120 },
  'sweep-uploads': { retryLimit: 0, retryDelay: 0, expireInSeconds: 120 },
  'send-letter': { retryLimit: 3, retryDelay: 5, expireInSeconds: 60 },
  'send-letters': { retryLimit: 0, retryDelay: 0, expireInSeconds: 300 },
  'sweep-people': { retryLimit: 0, retryDelay: 0, expireInSeconds: 120 },
  'build-kit': { retryLimit: 3, retryDelay: 2, expireInSeconds: 120 },
  'sweep-kits': { retryLimit: 0, retryDelay: 0, expireInSeconds: 120 },
  'tell-decisions': { retryLimit: 0, retryDelay: 0, expireInSeconds: 120 },
  'freeze-names': { retryLimit: 0, retryDelay: 0, expireInSeconds: 120 },
}

// Never started and never connected: it only words the insert, which runs in our transaction.
let sender: PgBoss | undefined
const unconnected = {
  executeSql: () => Promise.reject(new Error('A job is enqueued within a transaction.')),
}

/**
 * Enqueues a job in the transaction of the row it is about: both are there after commit, or neither.
 */
export async function enqueue<Name extends JobName>(
  name: Name,
  data: JobData[Name],
  transaction: Transaction,
): Promise<void> {
  sender ??= new PgBoss({ db: unconnected })
  const connection = (transaction as unknown as { connection: PgConnection }).connection
  const { requestId } = currentScope()
  const id = await sender.send(name, requestId ? { ...data, requestId } : data, {
    ...QUEUES[name],
    retryBackoff: true,
    db: { executeSql: (text, values) => runOn(connection, text, values) },
  })
  if (!id) throw new Error(`No queue named ${name}: run the migrations.`)
}

/** pg-boss writes its own SQL; we only lend it the connection, and say as Sequelize does what failed. */
async function runOn(connection: PgConnection, text: string, values: unknown[]) {
  try {
    // eslint-disable-next-line sql/fixed
    return await connection.query(text, values)
  } catch (error) {
    throw new DatabaseError(Object.assign(error as Error, { sql: '' }))
  }
}

interface PgConnection {
  query(text: string, values: unknown[]): Promise<{ rows: unknown[] }>
}
