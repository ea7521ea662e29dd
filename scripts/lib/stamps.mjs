import { createHash } from 'node:crypto'
import { readFileSync, readdirSync, statSync } from 'node:fs'
import { join, relative } from 'node:path'

/**
 * A fingerprint of the named files and everything in the named folders: names and contents.
 * @param {string} root what the names are relative to, so that a moved checkout stays current
 * @param {string[]} names those that do not exist count as absent
 * @param {string[]} more further values the result depends on
 * @returns {string} SHA-256 in hexadecimal
 */
export function fingerprint(root, names, more = []) {
  const hash = createHash('sha256')
  for (const path of names.flatMap((name) => filesIn(join(root, name)))) {
    const content = readFileSync(path)
    hash.update(`${relative(root, path)}\0${content.length}\0`).update(content)
  }
  for (const value of more) hash.update(`${value}\0`)
  return hash.digest('hex')
}

function filesIn(path) {
  const stat = statSync(path, { throwIfNoEntry: false })
  if (!stat) return []
  if (!stat.isDirectory()) return [path]
  return readdirSync(path)
    .sort()
    .flatMap((name) => filesIn(join(path, name)))
}
