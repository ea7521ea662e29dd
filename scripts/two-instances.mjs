/**
 * `npm run two-instances`: two web servers and two job processes behind nginx, one PostgreSQL, one
 * object store. Runs the browser journeys against nginx, and runs them again while one web server
 * and one job process after the other is killed and started again. Prints what came of it; exits 1
 * when something misses.
 *
 * Only Node's own modules are imported here and below until `npm ci` has run.
 */
import { randomBytes } from 'node:crypto'
import { cpSync, readFileSync, rmSync } from 'node:fs'
import { join } from 'node:path'
import { setTimeout as sleep } from 'node:timers/promises'

import { ensureBuild } from './lib/build.mjs'
import { DEBIAN, ensureDebianPackages } from './lib/debian.mjs'
import { printFigures } from './lib/figures.mjs'
import { launch } from './lib/launcher.mjs'
import { ensurePackages, requireNode } from './lib/packages.mjs'
import { ROOT } from './lib/paths.mjs'
import { findFreePorts } from './lib/ports.mjs'
import { migrate, seed, startJobs, startWeb } from './lib/product.mjs'
import { startProxy } from './lib/proxy.mjs'
import { say, sayError } from './lib/say.mjs'
import { lastLine } from './lib/tally.mjs'
import { distOf, playwright } from './lib/test-steps.mjs'
import { makeTestWorld } from './lib/test-world.mjs'
import { photographsSettled } from './lib/settled.mjs'

const LOCAL = join(ROOT, '.local/test')
/** The journeys that are run; the rest of the browser tests looks at one process. */
const JOURNEYS = ['journey.spec.ts', 'access.spec.ts']
const MACHINES = ['a', 'b']
/** How long a killed machine stays away, and how long both are there between, in milliseconds. */
const AWAY = 8_000
const BETWEEN = 5_000

async function twoInstances(fleet) {
  await Promise.all([
    ensurePackages(fleet, ROOT, process.env),
    ensureDebianPackages(
      fleet,
      [DEBIAN.postgresql, DEBIAN.nginx, DEBIAN.chromium, DEBIAN.backgrounds],
      process.env,
    ),
  ])
  const world = await makeTestWorld(fleet, LOCAL, process.env)
  const env = {
    ...world.environment('e2e', 'production'),
    LOG_LEVEL: 'info',
    NEXT_SERVER_ACTIONS_ENCRYPTION_KEY: randomBytes(32).toString('base64'),
    NEXT_DEPLOYMENT_ID: `run-${Date.now()}`,
  }
  await ensureBuild(fleet, ROOT, { ...env, ...distOf(LOCAL) })
  const ports = await findFreePorts(MACHINES.length)
  const machines = MACHINES.map((name, at) => machineOf(name, ports[at], env))
  for (const { dist } of machines) copyBuild(dist)

  const calm = await run(fleet, { world, env, machines })
  const storm = await run(fleet, { world, env, machines, disturb })
  return printFigures([
    journeys('the journeys, behind the proxy', calm),
    ...shares(calm, machines),
    journeys('the journeys again, while machines die', storm),
    {
      what: 'machines killed and started again',
      value: `${storm.killed}`,
      bar: 'at least 2',
      met: storm.killed >= 2,
    },
    {
      what: 'requests that had to be given to the other one',
      value: `${storm.passedOn}`,
      bar: 'at least 1',
      met: storm.passedOn >= 1,
    },
    {
      what: 'answers by the proxy itself, for want of one',
      value: `${storm.unanswered}`,
      bar: '0',
      met: storm.unanswered === 0,
    },
  ])
}

/** A web server and a job process that share nothing with the other machine's but the settings. */
function machineOf(name, port, env) {
  const dist = join(LOCAL, `next-${name}`)
  return {
    web: `web-${name}`,
    jobs: `jobs-${name}`,
    port,
    dist,
    env: { ...env, PORT: String(port), WOADMAP_DIST_DIR: dist.slice(ROOT.length + 1) },
  }
}

// Its own copy of the build, as another machine has.
function copyBuild(to) {
  const from = join(ROOT, distOf(LOCAL).WOADMAP_DIST_DIR)
  rmSync(to, { recursive: true, force: true })
  cpSync(from, to, {
    recursive: true,
    verbatimSymlinks: true,
    filter: (path) => path !== join(from, 'cache'),
  })
}

async function run(fleet, { world, env, machines, disturb: disturbance }) {
  await world.renew('e2e')
  await migrate(fleet, env)
  await seed(fleet, env)
  for (const machine of machines) await startMachine(fleet, machine)
  const log = await startProxy(fleet, {
    folder: join(LOCAL, 'nginx'),
    port: world.port,
    behind: machines.map(({ port }) => port),
  })
  // What a killed process was reading is read again within two minutes: the demo is not to wait so long.
  await photographsSettled(env.DATABASE_URL)

  const over = new AbortController()
  const disturbed = disturbance?.(fleet, machines, over.signal)
  const tally = await playwright(
    { fleet, local: LOCAL, filters: JOURNEYS },
    { ...env, NODE_ENV: 'test' },
  )
  over.abort()
  const killed = (await disturbed) ?? 0
  for (const name of ['proxy', ...machines.flatMap(({ web, jobs }) => [web, jobs])]) {
    await fleet.stop(name)
  }
  const requests = readFileSync(log, 'utf8').trim().split('\n').map(readRequest)
  return {
    tally,
    killed,
    requests,
    jobsDone: machines.map(({ jobs }) => countJobs(fleet, jobs)),
    passedOn: requests.filter(({ ports }) => ports.length > 1).length,
    unanswered: requests.filter(({ status }) => status === 502 || status === 504).length,
  }
}

async function startMachine(fleet, { web, jobs, port, env }) {
  await startJobs(fleet, env, { name: jobs })
  await startWeb(fleet, env, { name: web, host: '127.0.0.1', port })
}

/** Kills one machine after the other, as a power cut would, until told that it is over. */
async function disturb(fleet, machines, over) {
  let killed = 0
  const pause = (ms) => sleep(ms, undefined, { signal: over }).catch(() => {})
  await pause(BETWEEN)
  while (!over.aborted) {
    const machine = machines[killed % machines.length]
    say(`Killing ${machine.web} and ${machine.jobs}`)
    await Promise.all([fleet.stop(machine.web, 'SIGKILL'), fleet.stop(machine.jobs, 'SIGKILL')])
    killed++
    await pause(AWAY)
    await startMachine(fleet, machine)
    await pause(BETWEEN)
  }
  return killed
}

function readRequest(line) {
  const [, status, tried, method, path] = /^(\d+) (.*) (\S+) (\S+)$/.exec(line)
  return { status: Number(status), ports: tried.match(/\d+(?=,|$)/g) ?? [], method, path }
}

function countJobs(fleet, name) {
  return fleet.tail(name, Infinity).split('"job done"').length - 1
}

function journeys(what, { tally }) {
  return {
    what,
    value: lastLine(tally),
    bar: 'none failed',
    met: tally.failed === 0 && tally.passed > 0,
  }
}

/** Whether both machines did their part. */
function shares({ requests, jobsDone }, machines) {
  const served = machines.map(
    ({ port }) => requests.filter(({ ports }) => ports.at(-1) === String(port)).length,
  )
  return [
    {
      what: '  requests served by each',
      value: served.join(' and '),
      bar: 'at least a third',
      met: Math.min(...served) >= requests.length / 3,
    },
    {
      what: '  jobs done by each',
      value: jobsDone.join(' and '),
      bar: 'at least 1',
      met: Math.min(...jobsDone) >= 1,
    },
  ]
}

async function main() {
  requireNode(ROOT)
  await launch(
    {
      local: LOCAL,
      lock: join(LOCAL, 'test.lock'),
      owner: { what: 'A run of two instances' },
      whenStopped: 130,
      onLoss: sayError,
    },
    twoInstances,
  )
}

main().catch((error) => {
  sayError(error)
  process.exit(1)
})
