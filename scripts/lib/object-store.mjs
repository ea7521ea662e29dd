import { mkdirSync } from 'node:fs'
import { join } from 'node:path'

import { ROOT } from './paths.mjs'
import { waitForPort } from './ports.mjs'
import { Refusal } from './say.mjs'

/** The local object store knows this one pair of keys. */
export const LOCAL_KEYS = { S3_ACCESS_KEY_ID: 'S3RVER', S3_SECRET_ACCESS_KEY: 'S3RVER' }

/**
 * Starts the local object store on 127.0.0.1.
 * @param {import('./processes.mjs').Fleet} fleet
 * @param {{folder: string, port: number, buckets: string[], origins: string[]}} options `origins` are
 *   the pages that may post to the buckets from a browser
 * @returns {Promise<string>} its endpoint
 */
export async function startObjectStore(fleet, { folder, port, buckets, origins }) {
  mkdirSync(folder, { recursive: true })
  await fleet.start({
    name: 'object-store',
    command: process.execPath,
    // s3rver asks for MD4, which OpenSSL 3 keeps among its legacy algorithms.
    args: ['--openssl-legacy-provider', join(ROOT, 'scripts/services/object-store.mjs')],
    cwd: ROOT,
    env: {
      PATH: process.env.PATH,
      OBJECT_STORE_FOLDER: folder,
      OBJECT_STORE_PORT: String(port),
      OBJECT_STORE_BUCKETS: buckets.join(','),
      OBJECT_STORE_ORIGINS: origins.join(','),
    },
    restart: true,
  })
  const alive = () => fleet.isRunning('object-store')
  if (!(await waitForPort(port, { alive }))) {
    throw new Refusal(`The local object store did not start.\n${fleet.tail('object-store')}`)
  }
  return `http://127.0.0.1:${port}`
}
