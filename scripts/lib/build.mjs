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
  'proxy.ts',
  'instrumentation.ts',
  'next.config.mjs',
  'postcss.config.mjs',
  'tailwind.config.ts',
  'tsconfig.json',
  'package-lock.json',
]

const BUILT_IN = ['NEXT_SERVER_ACTIONS_ENCRYPTION_KEY', 'NEXT_DEPLOYMENT_ID']

/** Builds the product for production when its sources have changed since it was last built. */
export async function ensureBuild(fleet, root, env) {
  const { dist, stamp } = placesOf(root, env)
  if (existsSync(join(dist, 'BUILD_ID')) && readStamp(stamp) === sourcesOf(root, env)) return
  say('Building; this takes a minute the first time')
  if ((await build(fleet, root, env)) !== 0) {
    throw new Refusal('The build did not succeed; what it said is above.')
  }
}

/**
 * Builds the product for production.
 * @returns {Promise<number>} the builder's exit code
 */
export async function build(fleet, root, env) {
  // Taken before: what changes while it is being built is not in it.
  const sources = sourcesOf(root, env)
  const code = await fleet.run({ command: process.execPath, args: [NEXT, 'build'], cwd: root, env })
  if (code === 0) writeFileSync(placesOf(root, env).stamp, sources)
  return code
}

function placesOf(root, env) {
  const dist = join(root, env.WOADMAP_DIST_DIR ?? '.next')
  // Inside what it vouches for: whoever removes the build removes the stamp.
  return { dist, stamp: join(dist, 'woadmap-sources') }
}

function sourcesOf(root, env) {
  return fingerprint(root, SOURCES, builtInSettings(env))
}

// Next.js writes these settings into what it builds.
function builtInSettings(env) {
  return Object.entries(env)
    .filter(([name]) => name.startsWith('NEXT_PUBLIC_') || BUILT_IN.includes(name))
    .map(([name, value]) => `${name}=${value}`)
    .sort()
}

function readStamp(path) {
  return existsSync(path) ? readFileSync(path, 'utf8') : undefined
}
