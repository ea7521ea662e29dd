import { execFileSync } from 'node:child_process'
import { existsSync, statSync } from 'node:fs'
import { dirname } from 'node:path'

import { Refusal } from './say.mjs'

/**
 * As whom PostgreSQL must run, since it refuses to run as root: the owner of the data folder when
 * there is one, otherwise ourselves or, for root, the user `postgres`.
 * @returns {{uid: number, gid: number} | undefined} undefined means as we are
 * @throws {Refusal} when that user cannot be, or cannot get at the folder
 */
export function postgresOwner(dataFolder, uid = process.getuid()) {
  const owner = existsSync(dataFolder) ? statSync(dataFolder) : undefined
  if (uid !== 0) {
    if (owner && owner.uid !== uid) {
      throw new Refusal(
        `The database folder ${dataFolder} belongs to another user. ` +
          'Start as that user, or set WOADMAP_LOCAL=<folder of your own>.',
      )
    }
    return undefined
  }
  const identity = owner && owner.uid !== 0 ? { uid: owner.uid, gid: owner.gid } : userPostgres()
  const blocked = blockedAncestor(dirname(dataFolder), identity)
  if (blocked) {
    throw new Refusal(
      `PostgreSQL does not run as root, and the user it runs as may not enter ${blocked}. ` +
        `Allow that (chmod o+x ${blocked}), or set WOADMAP_LOCAL=<folder it can enter, such as /var/lib/woadmap>.`,
    )
  }
  return identity
}

/**
 * The topmost folder on the way to `folder` that the user may not pass through.
 * @param {{uid: number, gid: number}} user
 * @returns {string | undefined}
 */
export function blockedAncestor(folder, { uid, gid }) {
  const above = dirname(folder)
  const higher = above === folder ? undefined : blockedAncestor(above, { uid, gid })
  if (higher || !existsSync(folder)) return higher
  const { mode, uid: ownerUid, gid: ownerGid } = statSync(folder)
  const bit = ownerUid === uid ? 0o100 : ownerGid === gid ? 0o010 : 0o001
  return mode & bit ? undefined : folder
}

function userPostgres() {
  try {
    const ask = (flag) => Number(execFileSync('id', [flag, 'postgres'], { stdio: 'pipe' }))
    return { uid: ask('-u'), gid: ask('-g') }
  } catch {
    throw new Refusal(
      'PostgreSQL does not run as root, and this machine has no user "postgres". ' +
        'Start as an ordinary user, or add that user (useradd --system postgres).',
    )
  }
}
