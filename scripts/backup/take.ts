import { chmod, mkdir, readdir, readFile, writeFile } from 'node:fs/promises'
import { fileURLToPath } from 'node:url'

import { Refusal, say, sayError } from '../lib/say.mjs'
import {
  connect,
  countTables,
  dumpDatabase,
  keysOfRows,
  lastMigration,
  rolesWithRights,
} from './database'
import { filesOf, hashOf, type BackedUpObject, type Manifest } from './manifest'
import { forEach, listKeys, readObject } from './objects'

/** How often the database is dumped anew because objects went away meanwhile. */
const TRIES = 3

/**
 * Backs up the database and every object of the bucket into an empty folder, while the product
 * runs. The database comes first and then the objects: what is uploaded meanwhile is an object
 * without a row, which the sweep of the restored place removes. A row whose object has gone by the
 * time it is copied was itself removed since, so the database is dumped anew.
 */
export async function takeBackup(folder: string): Promise<Manifest> {
  await makeFolder(folder)
  const files = filesOf(folder)
  const copied = new Map<string, BackedUpObject>()
  for (let attempt = 1; ; attempt++) {
    const { keys, ...database } = await dumpSnapshot(files.dump)
    const news = (await listKeys()).filter((key) => !copied.has(key))
    for (const object of await forEach(news, (key) => copyObject(key, files.object))) {
      if (object) copied.set(object.key, object)
    }
    const missing = keys.filter((key) => !copied.has(key))
    if (missing.length > 0 && attempt < TRIES) continue
    const objects = [...copied.values()].sort((one, other) => (one.key < other.key ? -1 : 1))
    const manifest: Manifest = { format: 1, ...database, objects, missing }
    await writeFile(files.manifest, `${JSON.stringify(manifest, null, 2)}\n`, { mode: 0o600 })
    return manifest
  }
}

// Password hashes and unlaunched shades: for its owner's eyes only.
async function makeFolder(folder: string): Promise<void> {
  await mkdir(folder, { recursive: true, mode: 0o700 })
  if ((await readdir(folder)).length > 0) {
    throw new Refusal(`${folder} is not empty. Name another folder for this backup.`)
  }
  await mkdir(filesOf(folder).objects, { mode: 0o700 })
}

async function dumpSnapshot(file: string) {
  const client = await connect()
  try {
    await client.query('BEGIN ISOLATION LEVEL REPEATABLE READ READ ONLY')
    const { rows } = await client.query<{ snapshot: string; now: Date }>(
      'SELECT pg_export_snapshot() AS snapshot, now()',
    )
    const migration = await lastMigration(client)
    const tables = await countTables(client)
    const keys = await keysOfRows(client)
    const roles = await rolesWithRights(client)
    await dumpDatabase(file, rows[0]!.snapshot)
    await chmod(file, 0o600)
    const dump = await readFile(file)
    return {
      takenAt: rows[0]!.now.toISOString(),
      migration,
      roles,
      tables,
      dump: { sha256: hashOf(dump), byteLength: dump.length },
      keys,
    }
  } finally {
    await client.end()
  }
}

async function copyObject(
  key: string,
  fileOf: (hash: string) => string,
): Promise<BackedUpObject | null> {
  const object = await readObject(key)
  if (!object) return null
  const sha256 = hashOf(object.bytes)
  await writeFile(fileOf(sha256), object.bytes, { mode: 0o600 })
  return { key, contentType: object.contentType, byteLength: object.bytes.length, sha256 }
}

async function main(folder: string): Promise<number> {
  const { tables, objects, missing } = await takeBackup(folder)
  const rows = Object.values(tables).reduce((sum, count) => sum + count, 0)
  const bytes = objects.reduce((sum, { byteLength }) => sum + byteLength, 0)
  say(
    `${rows} rows of ${Object.keys(tables).length} tables and ${objects.length} objects ` +
      `(${(bytes / 1e6).toFixed(1)} MB) are in ${folder}`,
  )
  if (missing.length === 0) return 0
  throw new Refusal(
    `The backup is whole but for ${missing.length} objects that rows name and the store does not ` +
      `have; the first is ${missing[0]}. Everything else is in it.`,
  )
}

if (process.argv[1] === fileURLToPath(import.meta.url)) {
  process.exitCode = await main(process.argv[2]!).catch((error: unknown) => {
    sayError(error)
    return 1
  })
}
