/**
 * `npm run restore-drill`: makes a product with the demo in it, backs it up, throws it away, and
 * restores the backup into a place that never knew it. Prints what was checked beside what it has
 * to be; exits 1 when one misses.
 *
 * Only Node's own modules are imported here and below until `npm ci` has run.
 */
import { execFile } from 'node:child_process'
import { createHash } from 'node:crypto'
import { rmSync } from 'node:fs'
import { join } from 'node:path'
import { promisify } from 'node:util'

import { ensureBuild } from './lib/build.mjs'
import { DEBIAN, ensureDebianPackages } from './lib/debian.mjs'
import { printFigures } from './lib/figures.mjs'
import { launch } from './lib/launcher.mjs'
import { ensurePackages, requireNode } from './lib/packages.mjs'
import { ROOT } from './lib/paths.mjs'
import { migrate, seed, startJobs, startWeb } from './lib/product.mjs'
import { say, sayError } from './lib/say.mjs'
import { photographsSettled } from './lib/settled.mjs'
import { demoOwner, signIn } from './lib/sign-in.mjs'
import { distOf } from './lib/test-steps.mjs'
import { makeTestWorld } from './lib/test-world.mjs'

const LOCAL = join(ROOT, '.local/test')
const DRILL = join(LOCAL, 'drill')
const BACKUP = join(DRILL, 'backup')

async function drill(fleet) {
  await Promise.all([
    ensurePackages(fleet, ROOT, process.env),
    ensureDebianPackages(fleet, [DEBIAN.postgresql], process.env),
  ])
  rmSync(DRILL, { recursive: true, force: true })

  const lost = await makePlace(fleet, 'lost')
  await migrate(fleet, lost.env)
  await seed(fleet, lost.env)
  say('Waiting until the photographs of the demo are read')
  await startJobs(fleet, lost.env)
  await photographsSettled(lost.env.DATABASE_URL)
  await fleet.stop('jobs')
  const before = await inventory(lost.env)

  const backup = await timed(() => command(fleet, lost.env, 'backup'))
  say('Restoring over what is there must be refused')
  const overwriting = await timed(() => command(fleet, lost.env, 'restore'))
  const untouched = same(await inventory(lost.env), before)

  say('Throwing the first place away')
  for (const name of ['web', 'jobs', 'mail', 'object-store', 'postgres']) {
    if (fleet.isRunning(name)) await fleet.stop(name)
  }
  rmSync(join(DRILL, 'lost'), { recursive: true, force: true })

  const found = await makePlace(fleet, 'found')
  const restore = await timed(() => command(fleet, found.env, 'restore'))
  const after = await inventory(found.env)
  await ensureBuild(fleet, ROOT, found.env)
  await migrate(fleet, found.env)
  await startJobs(fleet, found.env)
  await startWeb(fleet, found.env, { host: '127.0.0.1', port: found.port })
  return printFigures([
    exit('the backup is taken', backup, 0),
    exit('a restore over what is there is refused', overwriting, 1),
    figure('  and leaves it as it was', untouched ? 'as it was' : 'changed', 'as it was'),
    exit('the restore into an empty place', restore, 0),
    ...compare(before, after),
    ...(await visit(found.env, after)),
  ])
}

async function makePlace(fleet, name) {
  const world = await makeTestWorld(fleet, join(DRILL, name), process.env)
  await world.renew('e2e')
  return {
    port: world.port,
    env: { ...world.environment('e2e', 'production'), ...distOf(LOCAL) },
  }
}

async function inventory(env) {
  const { stdout } = await promisify(execFile)(
    process.execPath,
    ['--import', 'tsx', 'scripts/backup/inventory.ts'],
    { cwd: ROOT, env, maxBuffer: 64e6 },
  )
  const { tables, objects } = JSON.parse(stdout)
  // Nobody stays signed in over a restore.
  return { tables: { ...tables, 'public.sessions': 0 }, objects }
}

function command(fleet, env, name) {
  return fleet.run({
    command: process.execPath,
    args: [`scripts/${name}.mjs`, BACKUP],
    cwd: ROOT,
    env,
  })
}

async function timed(work) {
  const began = Date.now()
  const code = await work()
  return { code, seconds: ((Date.now() - began) / 1000).toFixed(1) }
}

const same = (one, other) => JSON.stringify(one) === JSON.stringify(other)

const figure = (what, value, bar) => ({ what, value, bar, met: value === bar })

function exit(what, { code, seconds }, bar) {
  return { what, value: `exit ${code} in ${seconds} s`, bar: `exit ${bar}`, met: code === bar }
}

function compare(before, after) {
  const alike = (part) => {
    const names = Object.keys(before[part])
    const kept = names.filter((name) => before[part][name] === after[part][name]).length
    const more = Object.keys(after[part]).length - names.length
    return `${kept}${more > 0 ? ` and ${more} more` : ''}`
  }
  const all = (part) => `${Object.keys(before[part]).length}`
  const rows = ({ tables }) => `${Object.values(tables).reduce((sum, count) => sum + count, 0)}`
  return [
    figure('tables with the rows they had', alike('tables'), all('tables')),
    figure('rows', rows(after), rows(before)),
    figure('objects with the hash they had', alike('objects'), all('objects')),
  ]
}

/** Signs in to the restored product and looks at a line, a photograph and a copy of it. */
async function visit({ APP_ORIGIN: origin }, { objects }) {
  const owner = demoOwner()
  const line = `/${owner.brand}/lines/heronsway-dk`
  const stranger = await signIn(origin, { ...owner, password: 'not the one that was backed up' })
  const cookie = await signIn(origin, owner)
  const open = (path) => fetch(origin + path, { headers: { cookie }, redirect: 'manual' })
  const book = await open(`${line}/shades`)
  const gallery = await (await open(`${line}/photographs`)).text()
  const copy = /\/api\/brands\/[^" ]+\/derivatives\/[^" ,]+\.webp/.exec(gallery)?.[0]
  const bytes = copy ? Buffer.from(await (await open(copy)).arrayBuffer()) : Buffer.alloc(0)
  const hash = createHash('sha256').update(bytes).digest('hex')
  const stored = Object.values(objects).includes(hash)
  return [
    figure('signing in with the password of before', cookie ? 'let in' : 'refused', 'let in'),
    figure('signing in with another', stranger ? 'let in' : 'refused', 'refused'),
    figure('the sample book answers', String(book.status), '200'),
    figure(
      'the gallery shows a stored copy',
      stored ? 'byte for byte' : (copy ?? 'no picture'),
      'byte for byte',
    ),
  ]
}

async function main() {
  requireNode(ROOT)
  await launch(
    {
      local: LOCAL,
      lock: join(LOCAL, 'test.lock'),
      owner: { what: 'A restore drill' },
      whenStopped: 130,
      onLoss: sayError,
    },
    drill,
  )
}

main().catch((error) => {
  sayError(error)
  process.exit(1)
})
