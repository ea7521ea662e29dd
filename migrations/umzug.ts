import { fileURLToPath } from 'node:url'

import { QueryTypes, type QueryInterface, type Transaction } from 'sequelize'
import { SequelizeStorage, Umzug, type MigrationParams, type RunnableMigration } from 'umzug'

import { prepareQueues } from '@/lib/jobs/boss'
import { sequelize } from '@/models/sequelize'

import { grantToWeb } from './grants'

/** What a migration file exports as `up` and `down`; each runs in a transaction of its own. */
export type Migrate = (to: { query: QueryInterface; transaction: Transaction }) => Promise<void>

/** Any constant: two launches that migrate at once wait for each other on it. */
const LOCK = 7_260_412

async function load(path: string): Promise<{ up: Migrate; down: Migrate }> {
  return (await import(path)) as { up: Migrate; down: Migrate }
}

function resolve({
  name,
  path,
}: MigrationParams<QueryInterface>): RunnableMigration<QueryInterface> {
  const run = (way: 'up' | 'down') => async () => {
    const { [way]: migrate } = await load(path!)
    await sequelize().transaction((transaction) =>
      migrate({ query: sequelize().getQueryInterface(), transaction }),
    )
  }
  return { name, path, up: run('up'), down: run('down') }
}

/** The migrations of this folder in the order of their names. */
export const umzug = new Umzug({
  migrations: {
    glob: ['[0-9]*.ts', { cwd: fileURLToPath(new URL('.', import.meta.url)) }],
    resolve,
  },
  context: () => sequelize().getQueryInterface(),
  storage: new SequelizeStorage({ sequelize: sequelize(), tableName: 'migrations' }),
  logger: {
    info: ({ event, name }) => name && console.log(`${event}: ${name}`),
    warn: console.warn,
    error: console.error,
    debug: () => {},
  },
})

/** Runs `work` while no other process migrates the same database. */
async function alone(work: () => Promise<unknown>): Promise<void> {
  await sequelize().transaction(async (transaction) => {
    await sequelize().query('SET LOCAL lock_timeout = 0', { transaction })
    await sequelize().query('SELECT pg_advisory_xact_lock($lock)', {
      bind: { lock: LOCK },
      type: QueryTypes.SELECT,
      transaction,
    })
    await sequelize().query('SET LOCAL idle_in_transaction_session_timeout = 0', { transaction })
    await work()
  })
}

if (process.argv[1] === fileURLToPath(import.meta.url)) {
  try {
    await alone(() => umzug.runAsCLI())
    if (process.argv[2] === 'up') {
      await prepareQueues()
      await grantToWeb()
    }
  } finally {
    await sequelize().close()
  }
}
