import { NEXT, ROOT } from './paths.mjs'
import { waitForPort } from './ports.mjs'
import { Refusal } from './say.mjs'

/** Brings the database of this environment up to date. */
export async function migrate(fleet, env) {
  await runScript(fleet, env, ['migrations/umzug.ts', 'up'], 'The database could not be migrated')
}

/** Puts the demo into this environment's database and object store; again changes nothing. */
export async function seed(fleet, env) {
  await runScript(fleet, env, ['seeders/seed.ts'], 'The demo could not be seeded')
}

/** Starts a job process: started again when it dies. */
export async function startJobs(fleet, env, { name = 'jobs', show = false } = {}) {
  await fleet.start({
    name,
    command: process.execPath,
    args: ['--import', 'tsx', 'worker.ts'],
    cwd: ROOT,
    env,
    show,
    restart: true,
    stopWithin: 8000,
  })
}

/**
 * Starts a web server and waits until it answers.
 * @param {{host: string, port: number, name?: string, dev?: boolean, show?: boolean}} options
 * @throws {Refusal} with its last words when it does not come up
 */
export async function startWeb(
  fleet,
  env,
  { host, port, name = 'web', dev = false, show = false },
) {
  await fleet.start({
    name,
    command: process.execPath,
    args: [NEXT, dev ? 'dev' : 'start', '-p', String(port), '-H', host],
    cwd: ROOT,
    // The web connects as a role that sees one brand at a time, never as the owner of the tables.
    env: { ...env, DATABASE_URL: env.DATABASE_WEB_URL ?? env.DATABASE_URL },
    show,
    // Next.js waits for open connections without limit.
    stopWithin: 4000,
  })
  const reachable = ['0.0.0.0', '::'].includes(host) ? '127.0.0.1' : host
  const alive = () => fleet.isRunning(name)
  if (!(await waitForPort(port, { host: reachable, within: 90_000, alive }))) {
    throw new Refusal(`The web server did not start.\n${fleet.tail(name)}`)
  }
}

/**
 * Runs a TypeScript file with this environment.
 * @returns {Promise<number>} its exit code
 */
export function runTs(fleet, env, args) {
  return fleet.run({
    command: process.execPath,
    args: ['--import', 'tsx', ...args],
    cwd: ROOT,
    env,
  })
}

async function runScript(fleet, env, args, problem) {
  if ((await runTs(fleet, env, args)) !== 0) throw new Refusal(`${problem}; why is written above.`)
}
