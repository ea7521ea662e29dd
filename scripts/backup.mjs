/**
 * `npm run backup [-- folder]`: the database and every object into a new folder, while the product
 * runs or not; by default backups/<time>.
 *
 * Only Node's own modules are imported here and below until `npm ci` has run.
 */
import { join, resolve } from 'node:path'

import { ROOT } from './lib/paths.mjs'
import { launchInPlace } from './lib/place.mjs'
import { runTs } from './lib/product.mjs'
import { sayError } from './lib/say.mjs'

const now = new Date().toISOString().slice(0, 19).replaceAll(':', '-')
const folder = resolve(process.argv[2] ?? join(ROOT, 'backups', now))

launchInPlace('A backup', (fleet, env) =>
  runTs(fleet, env, ['scripts/backup/take.ts', folder]),
).catch((error) => {
  sayError(error)
  process.exit(1)
})
