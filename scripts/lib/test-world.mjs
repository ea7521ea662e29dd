import { rmSync } from 'node:fs'
import { join } from 'node:path'

import { startMail } from './mail.mjs'
import { LOCAL_KEYS, startObjectStore } from './object-store.mjs'
import { findFreePorts } from './ports.mjs'
import { startPostgres } from './postgres.mjs'

/**
 * The services that tests stand on, apart from any that a running product uses: a PostgreSQL
 * cluster, an object store and a mail server of their own, on free ports.
 * @param {import('./processes.mjs').Fleet} fleet
 * @param {string} local the folder that holds all of it; objects and letters of the last run go
 * @param {{durable?: boolean}} [options] whether the database must survive being killed
 * @returns {Promise<{environment: (name: string, mode: string) => object, renew: (name: string) => Promise<void>,
 *   port: number, secondPort: number}>} `port` is the product's, `secondPort` that of a further instance; `environment(name)` is a product's whole environment on a database and a bucket
 *   of that name; `renew(name)` empties the database
 */
export async function makeTestWorld(fleet, local, given, { durable = false } = {}) {
  const [databasePort, objectStorePort, mailPort, port, secondPort] = await findFreePorts(5)
  const origin = `http://localhost:${port}`
  const uploads = join(local, 'uploads')
  const letters = join(local, 'mail')
  for (const folder of [uploads, letters]) rmSync(folder, { recursive: true, force: true })

  const [postgres, endpoint, smtp] = await Promise.all([
    startPostgres(fleet, { local, port: databasePort, durable }),
    startObjectStore(fleet, {
      folder: uploads,
      port: objectStorePort,
      buckets: WORLDS.map(bucketOf),
      origins: [origin],
    }),
    startMail(fleet, { folder: letters, port: mailPort }),
  ])
  return {
    port,
    secondPort,
    renew: (name) => postgres.renewDatabase(databaseOf(name)),
    // Every setting is given, so that neither a shell nor a .env can send a test elsewhere.
    environment: (name, mode) => ({
      ...given,
      NODE_ENV: mode,
      WOADMAP_TESTS: 'true',
      WOADMAP_LOCAL: local,
      HOST: '127.0.0.1',
      PORT: String(port),
      APP_ORIGIN: origin,
      NEXTAUTH_URL: origin,
      NEXTAUTH_SECRET: 'a secret that guards nothing but tests',
      DATABASE_URL: postgres.urlOf(databaseOf(name)),
      DATABASE_WEB_URL: postgres.webUrlOf(databaseOf(name)),
      DATABASE_POOL_MAX: '10',
      S3_ENDPOINT: endpoint,
      S3_PUBLIC_ENDPOINT: endpoint,
      S3_REGION: 'us-east-1',
      S3_BUCKET: bucketOf(name),
      ...LOCAL_KEYS,
      SMTP_URL: smtp,
      MAIL_FROM: 'Woadmap <woadmap@localhost>',
      LOG_LEVEL: 'info',
      SEED_DEMO: 'true',
      NEXT_TELEMETRY_DISABLED: '1',
      // It says at every start that Node.js 20 will not be served for ever.
      AWS_SDK_JS_NODE_VERSION_SUPPORT_WARNING_DISABLED: 'true',
    }),
  }
}

const WORLDS = ['integration', 'e2e', 'faults']

function databaseOf(name) {
  return `woadmap_${name}`
}

function bucketOf(name) {
  return `woadmap-${name}`
}
