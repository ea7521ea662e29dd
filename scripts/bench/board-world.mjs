/**
 * The part of `npm run bench -- board` that stands on services: makes a world of its own, measures
 * the board's page and its queries and moves there, and writes the figures as JSON to the file it
 * is given.
 *
 * Only Node's own modules are imported here and below until `npm ci` has run.
 */
import { readFileSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'

import { ensureBuild } from '../lib/build.mjs'
import { DEBIAN, ensureDebianPackages } from '../lib/debian.mjs'
import { launch } from '../lib/launcher.mjs'
import { ensurePackages } from '../lib/packages.mjs'
import { ROOT } from '../lib/paths.mjs'
import { migrate, runTs, seed, startWeb } from '../lib/product.mjs'
import { sayError } from '../lib/say.mjs'
import { BOARD_SCRIPT_BAR, scriptBytesOf } from '../lib/script-bytes.mjs'
import { demoOwner, signIn } from '../lib/sign-in.mjs'
import { distOf } from '../lib/test-steps.mjs'
import { makeTestWorld } from '../lib/test-world.mjs'

const LOCAL = join(ROOT, '.local/test')
const BOARD = '/teasel-and-tarn/lines/heronsway-dk/combinations'
const [file] = process.argv.slice(2)

async function measure(fleet) {
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
  const code = await runTs(fleet, env, ['scripts/bench/board-figures.ts', file])
  if (code !== 0) return code
  await startWeb(fleet, env, { host: '127.0.0.1', port: world.port })
  const figures = [await firstLoad(env.APP_ORIGIN), ...JSON.parse(readFileSync(file, 'utf8'))]
  writeFileSync(file, JSON.stringify(figures))
  return 0
}

async function firstLoad(origin) {
  const cookie = await signIn(origin, demoOwner())
  const get = async (address) => {
    const answer = await fetch(new URL(address, origin), { headers: { cookie } })
    return Buffer.from(await answer.arrayBuffer())
  }
  const bytes = await scriptBytesOf(get, BOARD)
  return {
    what: 'board: JavaScript of the first load, gzip',
    value: `${(bytes / 1000).toFixed(1)} kB`,
    bar: `≤ ${BOARD_SCRIPT_BAR / 1000} kB`,
    met: bytes <= BOARD_SCRIPT_BAR,
  }
}

launch(
  {
    local: LOCAL,
    lock: join(LOCAL, 'test.lock'),
    owner: { what: 'A bench of the board' },
    whenStopped: 130,
    onLoss: sayError,
  },
  measure,
).catch((error) => {
  sayError(error)
  process.exit(1)
})
