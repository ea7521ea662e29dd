import { resolve } from 'node:path'

import { Refusal } from './say.mjs'

/**
 * What the launcher itself needs to know, out of the environment.
 * @param {Record<string, string | undefined>} env as readEnvironment gives it
 * @param {string} root what relative folders are relative to
 * @throws {Refusal} naming the setting that does not fit
 */
export function readSettings(env, root) {
  const port = portOf(env, 'PORT', 3000)
  return {
    host: env.HOST ?? '127.0.0.1',
    port,
    appOrigin: (env.APP_ORIGIN ?? `http://localhost:${port}`).replace(/\/+$/, ''),
    local: resolve(root, env.WOADMAP_LOCAL ?? '.local'),
    uploads: resolve(root, env.LOCAL_UPLOADS ?? 'uploads'),
    databasePort: portOf(env, 'LOCAL_DATABASE_PORT', 5499),
    objectStorePort: portOf(env, 'LOCAL_OBJECT_STORE_PORT', 4568),
    mailPort: portOf(env, 'LOCAL_MAIL_PORT', 2525),
    seedDemo: flagOf(env, 'SEED_DEMO', true),
  }
}

function portOf(env, name, standard) {
  const text = env[name] ?? String(standard)
  const port = Number(text)
  if (!/^\d+$/.test(text) || port < 1 || port > 65_535) {
    throw new Refusal(`${name} is "${text}", which is no port. Give a number from 1 to 65535.`)
  }
  return port
}

function flagOf(env, name, standard) {
  const text = env[name] ?? String(standard)
  if (text !== 'true' && text !== 'false') {
    throw new Refusal(`${name} is "${text}". Write true or false.`)
  }
  return text === 'true'
}
