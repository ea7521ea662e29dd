import { randomBytes } from 'node:crypto'
import { mkdirSync, readFileSync, writeFileSync } from 'node:fs'
import { dirname } from 'node:path'

/**
 * The secret kept in a file only its owner can read; made the first time.
 * @param {string} path
 * @returns {string} 32 random bytes as base64url
 */
export function keepSecret(path) {
  try {
    return readFileSync(path, 'utf8').trim()
  } catch (error) {
    if (error.code !== 'ENOENT') throw error
  }
  const secret = randomBytes(32).toString('base64url')
  mkdirSync(dirname(path), { recursive: true })
  writeFileSync(path, `${secret}\n`, { mode: 0o600, flag: 'wx' })
  return secret
}
