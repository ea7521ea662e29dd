/**
 * `npm start`: everything from a fresh clone to a running product, on this machine.
 * `--dev` serves with hot reload in place of a production build.
 *
 * Only Node's own modules are imported here and below until `npm ci` has run.
 */
import { join } from 'node:path'

import { ensureBuild } from './lib/build.mjs'
import { DEBIAN, ensureDebianPackages } from './lib/debian.mjs'
import { demoAccountsTable } from './lib/demo-accounts.mjs'
import { readEnvironment } from './lib/env-file.mjs'
import { launch } from './lib/launcher.mjs'
import { ensurePackages, requireNode } from './lib/packages.mjs'
import { ROOT } from './lib/paths.mjs'
import { migrate, seed, startJobs, startWeb } from './lib/product.mjs'
import { say, sayError } from './lib/say.mjs'
import { localServices, requirePorts, startServices } from './lib/services.mjs'
import { readSettings } from './lib/settings.mjs'

const dev = process.argv.includes('--dev')

async function main() {
  requireNode(ROOT)
  const env = readEnvironment(join(ROOT, '.env'))
  const settings = readSettings(env, ROOT)
  const owner = { what: 'Woadmap', address: settings.appOrigin }
  const lock = join(settings.local, 'start.lock')
  await launch({ local: settings.local, lock, owner }, (fleet, stopped) =>
    start(fleet, stopped, env, settings),
  )
}

async function start(fleet, stopped, env, settings) {
  await requirePorts(env, settings)
  await Promise.all([
    ensurePackages(fleet, ROOT, env),
    localServices(env).database && ensureDebianPackages(fleet, [DEBIAN.postgresql], env),
  ])
  const productEnv = await startServices(fleet, env, settings, dev ? 'development' : 'production')
  await Promise.all([
    prepareDatabase(fleet, productEnv, settings),
    dev || ensureBuild(fleet, ROOT, productEnv),
  ])
  await serve(fleet, productEnv, settings)
  await stopped
  return 0
}

async function prepareDatabase(fleet, env, { seedDemo }) {
  await migrate(fleet, env)
  if (seedDemo) await seed(fleet, env)
}

async function serve(fleet, env, { host, port, appOrigin, seedDemo }) {
  await startJobs(fleet, env, { show: true })
  await startWeb(fleet, env, { host, port, dev, show: true })
  say(`Woadmap is at ${appOrigin}`)
  const accounts = seedDemo && demoAccountsTable(join(ROOT, 'seeders/demo-accounts.json'))
  if (accounts)
    process.stdout.write(`\n  Sign in with one of the demo's accounts:\n\n${accounts}\n\n`)
  say('Ctrl-C stops everything')
}

main().catch((error) => {
  sayError(error)
  process.exit(1)
})
