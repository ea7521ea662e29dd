import { existsSync, readFileSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'

import { NEXT } from './paths.mjs'
import { Refusal, say } from './say.mjs'
import { fingerprint } from './stamps.mjs'

const SOURCES = [
  'app',
  'components',
  'lib',
  'models',
  'public',
  'next.config.mjs',
  'postcss.config.mjs',
  'tailwind.config.ts',
  'tsconfig.json',
  'package-lock.json',
]

/** Builds the product for production when its sources have changed since it was last built. */
export async function ensureBuild(fleet, root, env) {
  const dist = join(root, env.WOADMAP_DIST_DIR ?? '.next')
  // Inside what it vouches for: whoever removes the build removes the stamp.
  const stamp = join(dist, 'woadmap-sources')
  const sources = fingerprint(root, SOURCES, publicSettings(env))
  if (existsSync(join(dist, 'BUILD_ID')) && readStamp(stamp) === sources) return
  say('Building; this takes a minute the first time')
  const code = await fleet.run({ command: process.execPath, args: [NEXT, 'build'], cwd: root, env })
  if (code !== 0) throw new Refusal('The build did not succeed; what it said is above.')
  writeFileSync(stamp, sources)
}

// Next.js writes settings with this prefix into the pages' code.
function publicSettings(env) {
  return Object.entries(env)
    .filter(([name]) => name.startsWith('NEXT_PUBLIC_'))
    .map(([name, value]) => `${name}=${value}`)
    .sort()
}

function readStamp(path) {
  return existsSync(path) ? readFileSync(path, 'utf8') : undefined
}
