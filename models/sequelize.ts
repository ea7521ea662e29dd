import { ConnectionError, Sequelize, type Transaction } from 'sequelize'

import { building, env, serving } from '@/lib/env'

import { dropWhenSilent } from './drop-when-silent'
import { currentScope, isForWhomever, type Scope } from './scope'

const shared = globalThis as typeof globalThis & { woadmapSequelize?: Sequelize }

/**
 * How long anything may wait for the database before it is given up, in milliseconds. Who waits for
 * a page is told within 4 s, also when a connection and then a lock were waited for; a job and a
 * migration may take longer.
 */
const WAIT = serving
  ? { connect: 2_000, acquire: 2_000, statement: 2_500, lock: 1_500 }
  : { connect: 3_000, acquire: 4_000, statement: 10_000, lock: 4_000 }

/**
 * The one Sequelize instance. It lives on globalThis so that a hot reload keeps its pool; the
 * models are initialised at every evaluation so that it sees edits. No connection is made before
 * the first query.
 */
export function sequelize(): Sequelize {
  return (shared.woadmapSequelize ??= connect())
}

function connect(): Sequelize {
  const made = new Sequelize(building ? 'postgres://127.0.0.1/none' : env().DATABASE_URL, {
    dialect: 'postgres',
    logging: false,
    hooks: { afterConnect: dropWhenSilent },
    define: { underscored: true, freezeTableName: true },
    pool: {
      max: building ? 1 : env().DATABASE_POOL_MAX,
      min: 0,
      acquire: WAIT.acquire,
      idle: 10_000,
    },
    dialectOptions: {
      connectionTimeoutMillis: WAIT.connect,
      query_timeout: WAIT.statement,
      statement_timeout: WAIT.statement,
      lock_timeout: WAIT.lock,
      idle_in_transaction_session_timeout: 30_000,
      keepAlive: true,
      application_name: 'woadmap',
    },
  })
  made.addHook('afterPoolAcquire', (connection) => setScope(made, connection as ScopedConnection))
  return made
}

interface ScopedConnection {
  query(text: string, values: string[]): Promise<unknown>
  /** The scope it was last set to. */
  woadmapScope?: string
}

/**
 * Tells PostgreSQL for whom the connection speaks from here on, before a query or a transaction
 * takes it: the policies of the tables ask app.brand and app.person. One more round trip where
 * the connection spoke for somebody else before.
 */
async function setScope(sequelize: Sequelize, connection: ScopedConnection): Promise<void> {
  if (isForWhomever()) return
  const { brandId = '', personId = '' } = currentScope()
  const scope = `${brandId}/${personId}`
  if (connection.woadmapScope === scope) return
  try {
    await connection.query(
      "SELECT set_config('app.brand', $1, false), set_config('app.person', $2, false)",
      [brandId, personId],
    )
    connection.woadmapScope = scope
  } catch (error) {
    await (sequelize as unknown as WithManager).connectionManager.destroyConnection(connection)
    throw new ConnectionError(error as Error)
  }
}

interface WithManager {
  connectionManager: { destroyConnection(connection: unknown): Promise<void> }
}

/**
 * Has an open transaction speak for somebody else until it ends or is told again: what belongs to
 * several brands is written whole or not at all.
 */
export async function speakFor(
  { brandId = '', personId = '' }: Scope,
  transaction: Transaction,
): Promise<void> {
  await sequelize().query(
    "SELECT set_config('app.brand', $1, true), set_config('app.person', $2, true)",
    { bind: [brandId, personId], transaction },
  )
}

/** Runs `work` in one transaction: committed when it returns, rolled back when it throws. */
export function inTransaction<T>(work: (transaction: Transaction) => Promise<T>): Promise<T> {
  return sequelize().transaction(work)
}
