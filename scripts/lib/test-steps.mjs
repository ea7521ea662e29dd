import { join, relative } from 'node:path'

import { build, ensureBuild } from './build.mjs'
import { NEXT, ROOT } from './paths.mjs'
import { migrate, seed, startJobs, startWeb } from './product.mjs'
import { DEBIAN } from './debian.mjs'
import { copyWithoutProxy } from './without-proxy.mjs'
import { clearReport, readPlaywright, readVitest, tallyOfCheck, tallyOfReport } from './tally.mjs'

/** No step may take longer, in milliseconds. */
const LIMIT = 14 * 60_000

const bin = (path) => join(ROOT, 'node_modules', path)

/**
 * The steps of `npm test`, in order. `debian` is what a step needs installed, `world` whether it
 * stands on services, `after` the step without which it cannot run, `beside` the step in whose time
 * it is done, since that one leaves a processor idle. `run` gives its tally; the context is
 * {fleet, env, world, local, filters}.
 */
export const STEPS = [
  {
    name: 'lint',
    beside: 'integration',
    run: async ({ fleet, env }) =>
      tallyOfCheck(await node(fleet, env, [bin('eslint/bin/eslint.js'), '.', '--max-warnings=0'])),
  },
  {
    name: 'typecheck',
    beside: 'integration',
    run: async ({ fleet, env }) => {
      const types = await node(fleet, env, [NEXT, 'typegen'])
      return tallyOfCheck(
        types || (await node(fleet, env, [bin('typescript/bin/tsc'), '--noEmit'])),
      )
    },
  },
  {
    name: 'unit',
    debian: [DEBIAN.backgrounds],
    run: (context) => vitest(context, { ...context.env, NODE_ENV: 'test' }, ['unit', 'unit-dom']),
  },
  {
    name: 'integration',
    debian: [DEBIAN.postgresql, DEBIAN.backgrounds],
    world: true,
    run: async (context) => {
      const env = context.world.environment('integration', 'test')
      await context.world.renew('integration')
      await migrate(context.fleet, env)
      return vitest(context, env, ['integration'])
    },
  },
  {
    name: 'build',
    run: async ({ fleet, env, local }) => {
      const buildEnv = { ...env, ...distOf(local), NODE_ENV: 'production' }
      return tallyOfCheck(await build(fleet, ROOT, buildEnv))
    },
  },
  {
    name: 'e2e',
    debian: [DEBIAN.postgresql, DEBIAN.chromium, DEBIAN.backgrounds],
    world: true,
    after: 'build',
    run: async (context) => {
      const { fleet, world, local } = context
      const env = { ...world.environment('e2e', 'production'), ...distOf(local) }
      await ensureBuild(fleet, ROOT, env)
      await world.renew('e2e')
      await migrate(fleet, env)
      await seed(fleet, env)
      await startJobs(fleet, env)
      await startWeb(fleet, env, { host: '127.0.0.1', port: world.port })
      const bare = await startWithoutProxy(context, env)
      return playwright(context, { ...env, NODE_ENV: 'test', WITHOUT_PROXY_ORIGIN: bare })
    },
  },
]

// The same product on the same database, but for the proxy: what is closed stays closed.
async function startWithoutProxy({ fleet, local, world }, env) {
  const dist = join(local, 'next-without-proxy')
  copyWithoutProxy(join(ROOT, env.WOADMAP_DIST_DIR), dist)
  const [host, port] = ['127.0.0.1', world.secondPort]
  const origin = `http://localhost:${port}`
  await startWeb(
    fleet,
    { ...env, WOADMAP_DIST_DIR: relative(ROOT, dist), APP_ORIGIN: origin, NEXTAUTH_URL: origin },
    { name: 'web-without-proxy', host, port },
  )
  return origin
}

async function vitest({ fleet, local, filters }, env, projects) {
  const report = join(local, `${projects[0]}.json`)
  clearReport(report)
  const code = await node(fleet, env, [
    bin('vitest/vitest.mjs'),
    'run',
    ...projects.flatMap((name) => ['--project', name]),
    '--allowOnly=false',
    '--reporter=default',
    '--reporter=json',
    `--outputFile.json=${report}`,
    ...filters,
  ])
  return tallyOfReport(code, report, readVitest)
}

/**
 * Runs the browser tests whose files the filters choose against the product of this environment.
 * @returns their tally
 */
export async function playwright({ fleet, local, filters }, env) {
  const report = join(local, 'e2e.json')
  clearReport(report)
  const code = await node(fleet, { ...env, PLAYWRIGHT_JSON_OUTPUT_FILE: report }, [
    bin('@playwright/test/cli.js'),
    'test',
    '--reporter=list,json',
    ...filters,
  ])
  return tallyOfReport(code, report, readPlaywright)
}

function node(fleet, env, args) {
  return fleet.run({ command: process.execPath, args, cwd: ROOT, env, within: LIMIT })
}

/** Where tests build to: apart from .next, which a running product may be serving from. */
export function distOf(local) {
  return { WOADMAP_DIST_DIR: join(local, 'next').slice(ROOT.length + 1) }
}
