import { execFileSync } from 'node:child_process'
import { createHash } from 'node:crypto'
import { existsSync, statSync } from 'node:fs'
import { dirname, join } from 'node:path'

import { Refusal, say } from './say.mjs'

const ELSEWHERE = '/var/lib/woadmap'

/**
 * Where the cluster is and as whom it runs. PostgreSQL refuses to run as root, so root runs it as
 * the owner of the data folder or, for a new one, as the user `postgres`; and when that user may
 * not enter our local folder (a checkout under /root, say), its cluster is kept under /var/lib.
 * @param {string} local the folder of local services
 * @returns {{home: string, data: string, owner?: {uid: number, gid: number}}} no owner: as we are
 * @throws {Refusal} when the data folder belongs to another user
 */
export function placePostgres(local, uid = process.getuid()) {
  const here = placeIn(join(local, 'postgres'))
  const made = statSync(here.data, { throwIfNoEntry: false })
  if (uid !== 0) {
    if (made && made.uid !== uid) throw foreign(here.data)
    return here
  }
  const owner = made && made.uid !== 0 ? { uid: made.uid, gid: made.gid } : userPostgres()
  const blocked = blockedAncestor(local, owner)
  if (!blocked) return { ...here, owner }
  if (made) {
    throw new Refusal(
      `The database in ${here.data} cannot be reached by the user it runs as, who may not enter ` +
        `${blocked}. Allow that (chmod o+x ${blocked}), or set WOADMAP_LOCAL=<another folder>.`,
    )
  }
  const name = createHash('sha256').update(local).digest('hex').slice(0, 12)
  const there = placeIn(join(ELSEWHERE, name))
  say(`PostgreSQL may not enter ${blocked}, so its data is kept in ${there.home}`)
  return { ...there, owner }
}

function placeIn(home) {
  return { home, data: join(home, 'data') }
}

function foreign(data) {
  return new Refusal(
    `The database folder ${data} belongs to another user. ` +
      'Start as that user, or set WOADMAP_LOCAL=<folder of your own>.',
  )
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
