import { existsSync, readFileSync } from 'node:fs'

import { table } from './say.mjs'

/**
 * The demo's accounts as a table to print, or nothing when there are none.
 * @param {string} path the seeder's JSON: [{role, brand, email, password}]
 */
export function demoAccountsTable(path) {
  if (!existsSync(path)) return ''
  const accounts = JSON.parse(readFileSync(path, 'utf8'))
  return table([
    ['Brand', 'Role', 'E-mail', 'Password'],
    ...accounts.map(({ brand, role, email, password }) => [brand, role, email, password]),
  ])
}
