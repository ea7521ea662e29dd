/**
 * `npm run scale-check`: how the product answers under load and how its lists grow. Prints requests
 * a second and p97.5 of the line page and of a JSON route beside those of a hello-world page in the
 * same run, and what each list costs at 1×, 10× and 100× rows and beside 100 other brands. Exits 1
 * when a bar is missed.
 *
 * The hello-world page is the front door as a stranger sees it: a page of this very build, with a
 * heading, a sentence and a link, without a query. What a page costs beyond it is what we make it
 * cost. (A page of an empty application is no page of ours: it has neither our frame nor our fonts.)
 *
 * Absolute figures depend on what else the machine does, so that only ratios have bars; the targets
 * take turns.
 *
 * Only Node's own modules are imported here and below until `npm ci` has run.
 */
import { join } from 'node:path'

import { ensureBuild } from './lib/build.mjs'
import { DEBIAN, ensureDebianPackages } from './lib/debian.mjs'
import { printFigures } from './lib/figures.mjs'
import { launch } from './lib/launcher.mjs'
import { ensurePackages, requireNode } from './lib/packages.mjs'
import { ROOT } from './lib/paths.mjs'
import { migrate, runTs, seed, startJobs, startWeb } from './lib/product.mjs'
import { say, sayError, table } from './lib/say.mjs'
import { photographsSettled } from './lib/settled.mjs'
import { demoOwner, signIn } from './lib/sign-in.mjs'
import { distOf } from './lib/test-steps.mjs'
import { makeTestWorld } from './lib/test-world.mjs'

const LOCAL = join(ROOT, '.local/test')
const LINE = '/teasel-and-tarn/lines/heronsway-dk'
/** Each target is asked this often, for so many seconds, by so many at once. */
const ROUNDS = 9
const SECONDS = 3
const CONNECTIONS = 10
const HELLO = 'hello-world page'

async function scaleCheck(fleet) {
  await Promise.all([
    ensurePackages(fleet, ROOT, process.env),
    ensureDebianPackages(fleet, [DEBIAN.postgresql], process.env),
  ])
  const world = await makeTestWorld(fleet, LOCAL, process.env)
  const env = { ...world.environment('e2e', 'production'), ...distOf(LOCAL) }
  await ensureBuild(fleet, ROOT, env)
  await world.renew('e2e')
  await migrate(fleet, env)
  await seed(fleet, env)
  await startJobs(fleet, env)
  await photographsSettled(env.DATABASE_URL)
  await fleet.stop('jobs')
  await startWeb(fleet, env, { host: '127.0.0.1', port: world.port })
  const load = printFigures(await measureLoad(env.APP_ORIGIN))
  await fleet.stop('web')

  await world.renew('e2e')
  await migrate(fleet, env)
  const lists = await runTs(fleet, env, ['scripts/scale/lists.ts'])
  return load || lists
}

async function measureLoad(origin) {
  const { default: autocannon } = await import('autocannon')
  const targets = await targetsOf(origin)
  const ask = (target, duration) =>
    autocannon({ ...target, connections: CONNECTIONS, duration, timeout: 30 })
  say('Warming up')
  for (const target of targets) await ask(target, SECONDS)
  say(`Asking each of ${targets.length} targets ${ROUNDS} times for ${SECONDS} s, in turns`)
  const results = new Map(targets.map(({ title }) => [title, []]))
  for (let round = 0; round < ROUNDS; round++)
    for (const target of targets) results.get(target.title).push(await ask(target, SECONDS))

  const rows = targets.map(({ title, bar }) => {
    const runs = results.get(title)
    return {
      title,
      bar,
      rate: median(runs.map(({ requests }) => requests.average)),
      p975: median(runs.map(({ latency }) => latency.p97_5)),
      wrong: runs.reduce((sum, run) => sum + run.non2xx + run.errors, 0),
      ratio: totalOf(runs) / totalOf(results.get(HELLO)),
    }
  })
  process.stdout.write(
    `\n${table([
      ['', 'requests a second', 'p97.5', 'of hello-world'],
      ...rows.map(({ title, rate, p975, ratio }) => [
        title,
        rate.toFixed(1),
        `${p975} ms`,
        ratio.toFixed(2),
      ]),
    ])}\n\n`,
  )
  return [
    ...rows
      .filter(({ bar }) => bar)
      .map(({ title, ratio, bar }) => ({
        what: `requests a second of the ${title}, of hello-world's`,
        value: ratio.toFixed(2),
        bar: `≥ ${bar}`,
        met: ratio >= bar,
      })),
    ...rows.map(({ title, wrong }) => ({
      what: `answers of the ${title} that were none`,
      value: String(wrong),
      bar: '0',
      met: wrong === 0,
    })),
  ]
}

async function targetsOf(origin) {
  const cookie = await signIn(origin, demoOwner())
  const gallery = await fetch(`${origin}${LINE}/photographs`, { headers: { cookie } })
  const ids = [...(await gallery.text()).matchAll(/\/photographs\/([0-9a-f-]{36})/g)]
  const states = `/api/brands/teasel-and-tarn/photographs/states?ids=${[...new Set(ids.map(([, id]) => id))]}`
  return [
    { title: HELLO, url: `${origin}/` },
    { title: 'line page', url: origin + LINE, headers: { cookie }, bar: 0.4 },
    { title: 'JSON route', url: origin + states, headers: { cookie }, bar: 0.6 },
  ]
}

const totalOf = (runs) => runs.reduce((sum, { requests }) => sum + requests.total, 0)

function median(values) {
  const sorted = values.toSorted((one, other) => one - other)
  return sorted[sorted.length >> 1]
}

async function main() {
  requireNode(ROOT)
  await launch(
    {
      local: LOCAL,
      lock: join(LOCAL, 'test.lock'),
      owner: { what: 'A scale check' },
      whenStopped: 130,
      onLoss: sayError,
    },
    scaleCheck,
  )
}

main().catch((error) => {
  sayError(error)
  process.exit(1)
})
