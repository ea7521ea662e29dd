import pino from 'pino'

import { env } from './env'

let instance: pino.Logger | undefined

/** The one logger, made on first use; secrets are redacted by name. */
export function logger(): pino.Logger {
  return (instance ??= pino({
    level: env().LOG_LEVEL,
    base: undefined,
    redact: ['password', '*.password', 'passwordHash', '*.passwordHash', 'token', '*.token'],
  }))
}
