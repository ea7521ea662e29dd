/**
 * `npm run restore -- folder`: puts a backup into an empty database and an empty bucket, and checks
 * what is there then by counts and hashes.
 *
 * Only Node's own modules are imported here and below until `npm ci` has run.
 */
import { resolve } from 'node:path'

import { launchInPlace } from './lib/place.mjs'
import { runTs } from './lib/product.mjs'
import { Refusal, sayError } from './lib/say.mjs'

async function main() {
  const [folder] = process.argv.slice(2)
  if (!folder) throw new Refusal('Name the folder of the backup: npm run restore -- <folder>')
  await launchInPlace('A restore', (fleet, env) =>
    runTs(fleet, env, ['scripts/backup/put-back.ts', resolve(folder)]),
  )
}

main().catch((error) => {
  sayError(error)
  process.exit(1)
})
