import { readFileSync } from 'node:fs'
import { join } from 'node:path'

import { Refusal, say } from './say.mjs'

/**
 * Makes sure this Node.js can run Woadmap.
 * @param {string} root where package.json is
 * @throws {Refusal} when it is too old
 */
export function requireNode(root, version = process.versions.node) {
  const wanted = readJson(join(root, 'package.json')).engines.node.replace(/[^\d.]/g, '')
  const [major, minor = 0] = wanted.split('.').map(Number)
  const [hasMajor, hasMinor] = version.split('.').map(Number)
  if (hasMajor > major || (hasMajor === major && hasMinor >= minor)) return
  throw new Refusal(`Woadmap needs Node.js ${wanted} or newer; this is ${version}.`)
}

/**
 * Whether node_modules holds exactly what package-lock.json asks for, by the record npm leaves
 * there when it has finished. Packages for other platforms may be absent.
 */
export function packagesAreCurrent(root) {
  let wanted, present
  try {
    wanted = readJson(join(root, 'package-lock.json')).packages
    present = readJson(join(root, 'node_modules/.package-lock.json')).packages
  } catch {
    return false
  }
  const same = (a, b) => a?.version === b?.version && a?.integrity === b?.integrity
  return (
    Object.entries(wanted).every(
      ([path, entry]) =>
        path === '' || (!present[path] && entry.optional) || same(entry, present[path]),
    ) && Object.keys(present).every((path) => path in wanted)
  )
}

/** Runs `npm ci` when node_modules is not what the lock asks for. */
export async function ensurePackages(fleet, root, env) {
  if (packagesAreCurrent(root)) return
  say('Installing packages (npm ci); this takes a minute the first time')
  const code = await fleet.run({
    command: 'npm',
    // Building and testing need the development packages, whatever NODE_ENV says.
    args: ['ci', '--include=dev', '--no-audit', '--no-fund', '--loglevel=error'],
    cwd: root,
    env,
  })
  if (code !== 0) {
    throw new Refusal('npm ci did not succeed; what it said is above. Mend that and start again.')
  }
}

function readJson(path) {
  return JSON.parse(readFileSync(path, 'utf8'))
}
