import { join } from 'node:path'

import { DEBIAN, ensureDebianPackages } from './debian.mjs'
import { readEnvironment } from './env-file.mjs'
import { readLivingIdentity } from './identity.mjs'
import { launch } from './launcher.mjs'
import { LOCAL_KEYS } from './object-store.mjs'
import { ensurePackages, requireNode } from './packages.mjs'
import { ROOT } from './paths.mjs'
import { localDatabaseUrl } from './postgres.mjs'
import { localServices, productEnvironment, startServices } from './services.mjs'
import { readSettings } from './settings.mjs'

/**
 * Does some work on the product's database and object store, whether it is running or not: those
 * the settings name, or else the local ones, which are started for as long as it takes unless
 * `npm start` has them running. Ends this process.
 * @param {string} what what a second one is told is running
 * @param {(fleet: import('./processes.mjs').Fleet, env: object) => Promise<number>} work gives the
 *   exit code; `env` is the environment of a process of the product
 */
export async function launchInPlace(what, work) {
  requireNode(ROOT)
  const env = readEnvironment(join(ROOT, '.env'))
  const settings = readSettings(env, ROOT)
  const local = localServices(env)
  const startLock = join(settings.local, 'start.lock')
  const asTheyAre = (!local.database && !local.objectStore) || readLivingIdentity(startLock)
  // Beside a running product our own processes are noted elsewhere, lest its own be taken for left over.
  const folder = asTheyAre ? join(settings.local, 'beside') : settings.local
  const lock = asTheyAre ? join(folder, 'beside.lock') : startLock
  await launch({ local: folder, lock, owner: { what }, whenStopped: 130 }, async (fleet) => {
    await Promise.all([
      ensurePackages(fleet, ROOT, env),
      ensureDebianPackages(
        fleet,
        [local.database ? DEBIAN.postgresql : DEBIAN.postgresqlClient],
        env,
      ),
    ])
    const placeEnv = asTheyAre
      ? { ...productEnvironment(env, settings, 'production'), ...addressesOf(env, settings) }
      : await startServices(fleet, env, settings, 'production')
    return work(fleet, placeEnv)
  })
}

function addressesOf(env, settings) {
  const local = localServices(env)
  return {
    ...(local.database && {
      DATABASE_URL: localDatabaseUrl(
        { local: settings.local, port: settings.databasePort },
        'woadmap',
      ),
    }),
    ...(local.objectStore && {
      S3_ENDPOINT: `http://127.0.0.1:${settings.objectStorePort}`,
      ...LOCAL_KEYS,
    }),
  }
}
