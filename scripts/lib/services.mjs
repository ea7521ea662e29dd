import { join } from 'node:path'

import { startMail } from './mail.mjs'
import { LOCAL_KEYS, startObjectStore } from './object-store.mjs'
import { requireFreePort } from './ports.mjs'
import { startPostgres } from './postgres.mjs'
import { keepSecret } from './secrets.mjs'

/**
 * The services that no setting points elsewhere for, and so are to run on this machine.
 * @param {Record<string, string | undefined>} env as readEnvironment gives it
 */
export function localServices(env) {
  return { database: !env.DATABASE_URL, objectStore: !env.S3_ENDPOINT, mail: !env.SMTP_URL }
}

/** Makes sure, before anything long begins, that every port we are going to use is free. */
export async function requirePorts(env, settings) {
  const local = localServices(env)
  await requireFreePort({
    port: settings.port,
    host: settings.host,
    purpose: 'the product',
    setting: 'PORT',
  })
  const wanted = [
    [local.database, settings.databasePort, 'the local database', 'LOCAL_DATABASE_PORT'],
    [
      local.objectStore,
      settings.objectStorePort,
      'the local object store',
      'LOCAL_OBJECT_STORE_PORT',
    ],
    [local.mail, settings.mailPort, 'the local mail server', 'LOCAL_MAIL_PORT'],
  ]
  for (const [isLocal, port, purpose, setting] of wanted) {
    if (isLocal) await requireFreePort({ port, purpose, setting })
  }
}

/**
 * Starts the local services that are needed and completes the environment with where they are.
 * @param {import('./processes.mjs').Fleet} fleet
 * @returns {Promise<object>} the environment of every process of the product
 */
export async function startServices(fleet, env, settings, mode) {
  const local = localServices(env)
  const [database, objectStore, mail] = await Promise.all([
    local.database && startDatabase(fleet, settings),
    local.objectStore && startStore(fleet, env, settings),
    local.mail &&
      startMail(fleet, { folder: join(settings.local, 'mail'), port: settings.mailPort }).then(
        (url) => ({ SMTP_URL: url }),
      ),
  ])
  return {
    ...productEnvironment(env, settings, mode),
    ...database,
    ...objectStore,
    ...mail,
  }
}

/** The part of the product's environment that depends on no service. */
export function productEnvironment(env, settings, mode) {
  return {
    S3_REGION: 'us-east-1',
    S3_BUCKET: 'woadmap',
    MAIL_FROM: 'Woadmap <woadmap@localhost>',
    NEXTAUTH_SECRET: env.NEXTAUTH_SECRET ?? keepSecret(join(settings.local, 'auth-secret')),
    NEXTAUTH_URL: settings.appOrigin,
    // The ids of the actions are made with it: a page opened before a new build can still save.
    NEXT_SERVER_ACTIONS_ENCRYPTION_KEY:
      env.NEXT_SERVER_ACTIONS_ENCRYPTION_KEY ?? keepActionsKey(settings.local),
    ...env,
    NODE_ENV: mode,
    HOST: settings.host,
    PORT: String(settings.port),
    APP_ORIGIN: settings.appOrigin,
    SEED_DEMO: String(settings.seedDemo),
    NEXT_TELEMETRY_DISABLED: '1',
    // It says at every start that Node.js 20 will not be served for ever.
    AWS_SDK_JS_NODE_VERSION_SUPPORT_WARNING_DISABLED: 'true',
  }
}

// Next.js wants its key in plain base64.
function keepActionsKey(local) {
  return Buffer.from(keepSecret(join(local, 'actions-key')), 'base64url').toString('base64')
}

async function startDatabase(fleet, settings) {
  const postgres = await startPostgres(fleet, {
    local: settings.local,
    port: settings.databasePort,
  })
  await postgres.ensureDatabase('woadmap')
  return { DATABASE_URL: postgres.urlOf('woadmap'), DATABASE_WEB_URL: postgres.webUrlOf('woadmap') }
}

async function startStore(fleet, env, settings) {
  const endpoint = await startObjectStore(fleet, {
    folder: settings.uploads,
    port: settings.objectStorePort,
    buckets: [env.S3_BUCKET ?? 'woadmap'],
    origins: [settings.appOrigin],
  })
  return { S3_ENDPOINT: endpoint, ...LOCAL_KEYS }
}
