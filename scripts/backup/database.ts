import { execFile } from 'node:child_process'
import { promisify } from 'node:util'

import pg from 'pg'

import { env } from '@/lib/env'
import { objectKeysOf } from '@/lib/photographs/keys'
import type { Derivative } from '@/lib/photographs/constants'

import { CLIENT, findPostgres } from '../lib/postgres-binaries.mjs'
import { Refusal } from '../lib/say.mjs'

const run = promisify(execFile)

/** Any constant: two restores into one place wait for nobody, the second is refused. */
const LOCK = 7_260_413

/** What belongs neither to PostgreSQL itself nor to one of its extensions. */
const RELATIONS = `pg_class c JOIN pg_namespace n ON n.oid = c.relnamespace
  AND n.nspname !~ '^pg_' AND n.nspname <> 'information_schema'
  AND NOT EXISTS (SELECT FROM pg_depend d
    WHERE d.classid = 'pg_class'::regclass AND d.objid = c.oid AND d.deptype = 'e')`

/** Connects as the owner of the database, without any limit of time. */
export async function connect(): Promise<pg.Client> {
  const client = new pg.Client({
    connectionString: env().DATABASE_URL,
    connectionTimeoutMillis: 5_000,
    application_name: 'woadmap backup',
  })
  await client.connect()
  return client
}

/** Rows by table, of every table of ours. Reads each table once. */
export async function countTables(client: pg.Client): Promise<Record<string, number>> {
  const { rows } = await client.query<{ name: string }>(
    `SELECT format('%I.%I', n.nspname, c.relname) AS name
     FROM ${RELATIONS} WHERE c.relkind = 'r' ORDER BY 1`,
  )
  const counts: Record<string, number> = {}
  for (const { name } of rows) {
    const counted = await client.query<{ n: string }>(`SELECT count(*) AS n FROM ${name}`)
    counts[name] = Number(counted.rows[0]!.n)
  }
  return counts
}

/** The name of the last migration. @throws Refusal when the database has none */
export async function lastMigration(client: pg.Client): Promise<string> {
  const { rows } = await client.query<{ name: string | null }>(
    `SELECT to_regclass('public.migrations')::text AS name`,
  )
  const last =
    rows[0]!.name &&
    (await client.query<{ name: string }>('SELECT max(name) AS name FROM migrations')).rows[0]!.name
  if (!last) throw new Refusal('This database holds no Woadmap: there is nothing to back up.')
  return last
}

/** Every role besides the owner that has rights or row policies here. */
export async function rolesWithRights(client: pg.Client): Promise<string[]> {
  const { rows } = await client.query<{ name: string }>(
    `SELECT DISTINCT r.rolname AS name FROM pg_roles r JOIN (
       SELECT (aclexplode(relacl)).grantee AS oid FROM pg_class
       UNION SELECT (aclexplode(nspacl)).grantee FROM pg_namespace
       UNION SELECT (aclexplode(proacl)).grantee FROM pg_proc
       UNION SELECT (aclexplode(defaclacl)).grantee FROM pg_default_acl
       UNION SELECT unnest(polroles) FROM pg_policy
     ) g USING (oid)
     WHERE r.rolname <> current_user AND r.rolname !~ '^pg_' AND NOT r.rolsuper ORDER BY 1`,
  )
  return rows.map(({ name }) => name)
}

/** Those of the roles that this server does not know. */
export async function unknownRoles(client: pg.Client, roles: string[]): Promise<string[]> {
  const { rows } = await client.query<{ rolname: string }>(
    'SELECT rolname FROM pg_roles WHERE rolname = ANY ($1)',
    [roles],
  )
  const known = new Set(rows.map(({ rolname }) => rolname))
  return roles.filter((role) => !known.has(role))
}

/** Every key of the object store that a row stands for. */
export async function keysOfRows(client: pg.Client): Promise<string[]> {
  const { rows } = await client.query<{
    id: string
    brandId: string
    objectKey: string
    sha256: string
    derivatives: Derivative[]
  }>(
    `SELECT id, brand_id AS "brandId", object_key AS "objectKey", sha256, derivatives
     FROM photographs WHERE state <> 'pending'`,
  )
  const kits = await client.query<{ objectKey: string }>(
    `SELECT object_key AS "objectKey" FROM kits WHERE object_key IS NOT NULL`,
  )
  return [...rows.flatMap(objectKeysOf), ...kits.rows.map(({ objectKey }) => objectKey)]
}

/** Whether the database holds no table, view or sequence of anybody's. */
export async function isDatabaseEmpty(client: pg.Client): Promise<boolean> {
  const { rows } = await client.query<{ empty: boolean }>(
    `SELECT NOT EXISTS (SELECT FROM ${RELATIONS}) AS empty`,
  )
  return rows[0]!.empty
}

/** Takes the place for one restore, until the connection ends; false when another holds it. */
export async function takePlace(client: pg.Client): Promise<boolean> {
  const { rows } = await client.query<{ taken: boolean }>(
    'SELECT pg_try_advisory_lock($1) AS taken',
    [LOCK],
  )
  return rows[0]!.taken
}

/** Writes the database as an exported snapshot shows it, in PostgreSQL's own archive format. */
export async function dumpDatabase(file: string, snapshot: string): Promise<void> {
  await runProgram('pg_dump', [
    '--format=custom',
    '--no-owner',
    `--snapshot=${snapshot}`,
    `--file=${file}`,
  ])
}

/** Puts a dump into the empty database: the whole of it or, when anything fails, nothing. */
export async function restoreDatabase(file: string): Promise<void> {
  await runProgram('pg_restore', ['--single-transaction', '--exit-on-error', '--no-owner', file])
}

async function runProgram(program: string, args: string[]): Promise<void> {
  const [newest] = findPostgres(undefined, undefined, CLIENT)
  // The password goes by the environment: everybody may read a command line.
  const address = new URL(env().DATABASE_URL)
  const password = decodeURIComponent(address.password)
  address.password = ''
  try {
    await run(`${newest!.folder}/${program}`, [`--dbname=${address.href}`, ...args], {
      cwd: '/',
      env: { NODE_ENV: env().NODE_ENV, PGPASSWORD: password, LANG: 'C.UTF-8' },
    })
  } catch (error) {
    const { stderr, message } = error as Error & { stderr?: string }
    throw new Refusal(`${program} did not succeed: ${stderr?.trim() || message}`)
  }
}
