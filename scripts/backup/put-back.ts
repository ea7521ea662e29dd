import { readFile } from 'node:fs/promises'
import { fileURLToPath } from 'node:url'

import { verifyPassword } from '@/lib/auth/password'
import { deleteObjects, putObject } from '@/lib/storage/objects'

import { Refusal, say, sayError } from '../lib/say.mjs'
import {
  connect,
  countTables,
  isDatabaseEmpty,
  lastMigration,
  restoreDatabase,
  takePlace,
  unknownRoles,
} from './database'
import { filesOf, hashOf, parseManifest, type BackedUpObject, type Manifest } from './manifest'
import { forEach, isBucketEmpty, listKeys, readObject } from './objects'

type Client = Awaited<ReturnType<typeof connect>>

/** The store removes at most this many objects at once. */
const BATCH = 1_000

/** Reads a backup and makes sure that every byte of it is as it was. @throws Refusal */
async function readBackup(folder: string): Promise<Manifest> {
  const files = filesOf(folder)
  const text = await readFile(files.manifest, 'utf8').catch(() => {
    throw new Refusal(`There is no whole backup in ${folder}: it has no manifest.json.`)
  })
  const manifest = parseManifest(text)
  const hashes = new Map(manifest.objects.map(({ sha256 }) => [files.object(sha256), sha256]))
  hashes.set(files.dump, manifest.dump.sha256)
  const damaged = await forEach([...hashes], async ([path, hash]) => {
    const bytes = await readFile(path).catch(() => null)
    return bytes && hashOf(bytes) === hash ? [] : [path]
  })
  if (damaged.flat().length > 0) {
    throw new Refusal(
      `The backup is damaged: ${damaged.flat()[0]} is missing or not as it was written. ` +
        'Nothing was restored.',
    )
  }
  return manifest
}

/** Makes sure nothing can be overwritten, and that what the dump names is there. @throws Refusal */
async function requireEmptyPlace(client: Client, { roles }: Manifest): Promise<void> {
  if (!(await takePlace(client))) {
    throw new Refusal('Another restore into this database is under way.')
  }
  if (!(await isDatabaseEmpty(client))) {
    throw new Refusal(
      'The database is not empty. A restore never writes over anything: give it a new database.',
    )
  }
  if (!(await isBucketEmpty())) {
    throw new Refusal(
      'The bucket is not empty. A restore never writes over anything: give it a new bucket.',
    )
  }
  const unknown = await unknownRoles(client, roles)
  if (unknown.length > 0) {
    throw new Refusal(
      `The database server has no role ${unknown.join(', ')}, which the backup gives rights to. ` +
        'Make it first (docs/DEPLOY.md), then restore.',
    )
  }
}

/**
 * Objects before rows: the product never shows a row whose object is not there yet. When anything
 * fails, the place is empty again.
 */
async function putBack(folder: string, manifest: Manifest): Promise<void> {
  const files = filesOf(folder)
  try {
    await forEach(manifest.objects, async ({ key, contentType, sha256 }) =>
      putObject(key, await readFile(files.object(sha256)), contentType),
    )
    await restoreDatabase(files.dump)
  } catch (error) {
    const keys = manifest.objects.map(({ key }) => key)
    for (let at = 0; at < keys.length; at += BATCH) await deleteObjects(keys.slice(at, at + BATCH))
    throw error
  }
}

/** Compares what is there now with the manifest. @returns what differs, in words */
async function findDifferences(client: Client, manifest: Manifest): Promise<string[]> {
  const tables = await countTables(client)
  const names = [...new Set([...Object.keys(tables), ...Object.keys(manifest.tables)])]
  const rows = names
    .filter((name) => tables[name] !== manifest.tables[name])
    .map(
      (name) => `${name} has ${tables[name] ?? 'no'} rows, not ${manifest.tables[name] ?? 'any'}`,
    )
  const migration = await lastMigration(client)
  if (migration !== manifest.migration) rows.push(`the last migration is ${migration}`)

  const known = new Set(manifest.objects.map(({ key }) => key))
  const strange = (await listKeys()).filter((key) => !known.has(key))
  const objects = await forEach(manifest.objects, async (object: BackedUpObject) => {
    const stored = await readObject(object.key)
    const same =
      stored && stored.contentType === object.contentType && hashOf(stored.bytes) === object.sha256
    return same ? [] : [`${object.key} is not the object that was backed up`]
  })
  return [...rows, ...objects.flat(), ...strange.map((key) => `${key} is in no backup`)]
}

/** Whether the password of every person can be checked: a hash that is none is refused in words. */
async function findUnusablePasswords(client: Client): Promise<string[]> {
  const { rows } = await client.query<{ id: string; password_hash: string }>(
    'SELECT id, password_hash FROM people',
  )
  const answers = await forEach(rows, ({ id, password_hash: hash }) =>
    verifyPassword(hash, 'nobody has this password').then(
      () => [],
      () => [`person ${id} has a password that cannot be checked`],
    ),
  )
  return answers.flat()
}

/**
 * Puts a backup into an empty database and an empty bucket and checks it there.
 * @throws Refusal when the backup is not whole, the place not empty, or the outcome not the same
 */
export async function restoreBackup(folder: string): Promise<Manifest> {
  const manifest = await readBackup(folder)
  const client = await connect()
  try {
    await requireEmptyPlace(client, manifest)
    await putBack(folder, manifest)
    const problems = [
      ...(await findDifferences(client, manifest)),
      ...(await findUnusablePasswords(client)),
    ]
    if (problems.length > 0) {
      throw new Refusal(`What was restored is not what was backed up:\n${problems.join('\n')}`)
    }
    // One that was ended since the backup would live again.
    await client.query('DELETE FROM sessions')
    return manifest
  } finally {
    await client.end()
  }
}

async function main(folder: string): Promise<number> {
  const { takenAt, tables, objects } = await restoreBackup(folder)
  say(
    `Restored as of ${takenAt}: ${Object.keys(tables).length} tables have their rows, ` +
      `${objects.length} objects their bytes. Everybody signs in anew.`,
  )
  return 0
}

if (process.argv[1] === fileURLToPath(import.meta.url)) {
  process.exitCode = await main(process.argv[2]!).catch((error: unknown) => {
    sayError(error)
    return 1
  })
}
