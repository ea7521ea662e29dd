import { readdirSync } from 'node:fs'
import { join } from 'node:path'

import { QueryTypes } from 'sequelize'

import { sequelize } from '@/models'

/** How long the database may take, in milliseconds, so that it is told within a second. */
const WAIT = 800

/** Whether this instance can serve, and if not, why. */
export type Readiness = { ready: true; migration: string } | { ready: false; why: string }

/** The newest migration this release comes with. */
function expectedMigration(): string {
  const names = readdirSync(join(process.cwd(), 'migrations'))
  return names
    .filter((name) => /^\d{4}\..*\.ts$/.test(name))
    .sort()
    .at(-1)!
}

/** Asks, within a second, whether the database answers and is migrated at least as far as we need. */
export async function readReadiness(): Promise<Readiness> {
  const late = new Promise<null>((resolve) => setTimeout(resolve, WAIT, null).unref())
  const applied = sequelize()
    .query<{ name: string }>('SELECT name FROM migrations ORDER BY name DESC LIMIT 1', {
      type: QueryTypes.SELECT,
    })
    .then(
      ([row]) => row?.name ?? '',
      () => null,
    )
  const migration = await Promise.race([applied, late])
  if (migration === null) return { ready: false, why: 'the database does not answer' }
  const expected = expectedMigration()
  return migration >= expected
    ? { ready: true, migration }
    : {
        ready: false,
        why: `the database is at ${migration || 'no migration'}, not yet at ${expected}`,
      }
}
