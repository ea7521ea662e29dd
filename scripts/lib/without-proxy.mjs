import { cpSync, readFileSync, rmSync, writeFileSync } from 'node:fs'
import { basename, join } from 'node:path'

/**
 * Copies a finished build and takes the proxy out of the copy: its code, and the entry that has it
 * called. Everything else is the same to the byte, so that what a test finds closed there is closed
 * by the pages, routes and actions themselves.
 * @param {string} from the build's folder
 * @param {string} to beside it, at the same depth: links in a build lead out of it
 */
export function copyWithoutProxy(from, to) {
  rmSync(to, { recursive: true, force: true })
  const unneeded = ['cache', 'diagnostics', 'trace', 'trace-build', 'turbopack']
  cpSync(from, to, {
    recursive: true,
    verbatimSymlinks: true,
    filter: (path) => !unneeded.includes(basename(path)) || path.includes('node_modules'),
  })
  const manifest = join(to, 'server/functions-config-manifest.json')
  const { functions, ...rest } = JSON.parse(readFileSync(manifest, 'utf8'))
  const { '/_middleware': proxy, ...others } = functions
  if (!proxy) throw new Error('This build has no proxy to take out.')
  writeFileSync(manifest, JSON.stringify({ ...rest, functions: others }))
  rmSync(join(to, 'server/middleware.js'))
}
