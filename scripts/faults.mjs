/**
 * `npm run faults`: does to a product of its own, on this machine, what a bad day does to one, and
 * checks what is seen against what is expected. `npm run faults -- pool-exhausted ten-posts` runs
 * those only; a name that is none lists them all.
 *
 * Only Node's own modules are imported here and below until `npm ci` has run.
 */
import { join } from 'node:path'

import { ensureBuild } from './lib/build.mjs'
import { DEBIAN, ensureDebianPackages } from './lib/debian.mjs'
import { launch } from './lib/launcher.mjs'
import { ensurePackages, requireNode } from './lib/packages.mjs'
import { ROOT } from './lib/paths.mjs'
import { migrate, seed } from './lib/product.mjs'
import { sayError } from './lib/say.mjs'
import { makeTestWorld } from './lib/test-world.mjs'

const LOCAL = join(ROOT, '.local/faults')
const DIST = '.local/faults/next'

async function main() {
  requireNode(ROOT)
  const owner = { what: 'A run of the faults in this folder' }
  const lock = join(LOCAL, 'faults.lock')
  // What is lost during a fault fails the fault that stands on it.
  await launch({ local: LOCAL, lock, owner, whenStopped: 130, onLoss: sayError }, faults)
}

async function faults(fleet) {
  await ensurePackages(fleet, ROOT, process.env)
  const { register } = await import('tsx/esm/api')
  register()
  const { chooseFaults, runFaults } = await import('./faults/index.ts')
  const chosen = chooseFaults(process.argv.slice(2))
  await ensureDebianPackages(
    fleet,
    [DEBIAN.postgresql, DEBIAN.chromium, DEBIAN.faketime],
    process.env,
  )
  const world = await makeTestWorld(fleet, LOCAL, process.env, { durable: true })
  const env = { ...world.environment('faults', 'production'), WOADMAP_DIST_DIR: DIST }
  await ensureBuild(fleet, ROOT, env)
  await world.renew('faults')
  await migrate(fleet, env)
  await seed(fleet, env)
  // The sweep runs in this process, on the same settings.
  Object.assign(process.env, env, { LOG_LEVEL: 'silent' })
  return runFaults(chosen, { fleet, env, port: world.port, local: LOCAL, dist: DIST })
}

main().catch((error) => {
  sayError(error)
  process.exit(1)
})
