/**
 * `npm start`: everything from a fresh clone to a running product, on this machine.
 * `--dev` serves with hot reload in place of a production build.
 *
 * Only Node's own modules are imported here and below until `npm ci` has run.
 */
import { join } from 'node:path'

import { ensureBuild } from './lib/build.mjs'
import { ensureDebianPackages } from './lib/debian.mjs'
import { demoAccountsTable } from './lib/demo-accounts.mjs'
import { readEnvironment } from './lib/env-file.mjs'
import { launch } from './lib/launcher.mjs'
import { ensurePackages, requireNode } from './lib/packages.mjs'
import { NEXT, ROOT } from './lib/paths.mjs'
import { findPostgres } from './lib/postgres-binaries.mjs'
import { Refusal, say, sayError } from './lib/say.mjs'
import { localServices, requirePorts, startServices } from './lib/services.mjs'
import { readSettings } from './lib/settings.mjs'
import { waitForPort } from './lib/ports.mjs'

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
    localServices(env).database && ensureDebianPackages(fleet, [POSTGRES], env),
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

const POSTGRES = { name: 'postgresql', isPresent: () => findPostgres().length > 0 }

async function prepareDatabase(fleet, env, { seedDemo }) {
  await script(fleet, env, ['migrations/umzug.ts', 'up'], 'The database could not be migrated')
  if (seedDemo) await script(fleet, env, ['seeders/seed.ts'], 'The demo could not be seeded')
}

async function script(fleet, env, [file, ...args], problem) {
  const code = await fleet.run({
    command: process.execPath,
    args: ['--import', 'tsx', file, ...args],
    cwd: ROOT,
    env,
  })
  if (code !== 0) throw new Refusal(`${problem}; why is written above.`)
}

async function serve(fleet, env, { host, port, appOrigin, seedDemo }) {
  await fleet.start({
    name: 'jobs',
    command: process.execPath,
    args: ['--import', 'tsx', 'worker.ts'],
    cwd: ROOT,
    env,
    show: true,
    restart: true,
    stopWithin: 8000,
  })
  await fleet.start({
    name: 'web',
    command: process.execPath,
    args: [NEXT, dev ? 'dev' : 'start', '-p', String(port), '-H', host],
    cwd: ROOT,
    env,
    show: true,
    stopWithin: 4000,
  })
  const at = host === '0.0.0.0' || host === '::' ? '127.0.0.1' : host
  if (
    !(await waitForPort(port, { host: at, within: 90_000, alive: () => fleet.isRunning('web') }))
  ) {
    throw new Refusal(`The web server did not start.\n${fleet.tail('web')}`)
  }
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
