import { existsSync, readdirSync, realpathSync } from 'node:fs'
import { dirname, join } from 'node:path'

import { Refusal } from './say.mjs'

const DEBIAN = '/usr/lib/postgresql'
/** What runs a database. */
const SERVER = ['postgres', 'initdb']
/** What copies one from elsewhere. */
export const CLIENT = ['pg_dump', 'pg_restore']

/**
 * Every folder on this machine that holds PostgreSQL's own programs, with its major version, newest
 * first. Debian keeps them out of the PATH.
 * @param {string[]} programs all of which must be there
 * @returns {{folder: string, major: number}[]}
 */
export function findPostgres(path = process.env.PATH ?? '', debian = DEBIAN, programs = SERVER) {
  const folders = [
    ...(existsSync(debian)
      ? readdirSync(debian).map((version) => join(debian, version, 'bin'))
      : []),
    ...path.split(':').filter(Boolean),
  ]
  const found = new Map()
  for (const folder of folders) {
    if (!programs.every((program) => existsSync(join(folder, program)))) continue
    const home = dirname(realpathSync(join(folder, programs[0])))
    const major = Number(/(\d+)(?:\.\d+)?\/bin$/.exec(home)?.[1] ?? 0)
    found.set(home, { folder: home, major })
  }
  return [...found.values()].sort((a, b) => b.major - a.major)
}

/**
 * The programs to run a data folder with.
 * @param {number | undefined} madeBy the version that made it; undefined for a new one
 * @throws {Refusal} when only other versions are installed
 */
export function choosePostgres(installed, madeBy, dataFolder) {
  if (madeBy === undefined) return installed[0]
  const match =
    installed.find(({ major }) => major === madeBy) ?? installed.find(({ major }) => major === 0)
  if (match) return match
  const versions = installed.map(({ major }) => major).join(', ')
  throw new Refusal(
    `The database in ${dataFolder} was made by PostgreSQL ${madeBy}, and this machine has ${versions}. ` +
      `Install postgresql-${madeBy}, or move that folder away to begin with an empty database.`,
  )
}
