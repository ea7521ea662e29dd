import pino from 'pino'

import { env } from './env'

/**
 * An error as the log keeps it: its kind, its words and where it was thrown. What else hangs on it
 * stays out: a database error carries the values of its statement, hashes and tokens among them.
 */
export function serializeError(error: unknown): unknown {
  if (!(error instanceof Error)) return error
  const { name: type, message, stack, cause } = error
  const { code } = ((error as { original?: unknown }).original ?? error) as { code?: unknown }
  return {
    type,
    message,
    stack,
    ...(typeof code === 'string' && { code }),
    ...(cause !== undefined && { cause: serializeError(cause) }),
  }
}

let instance: pino.Logger | undefined

/** The one logger, made on first use; secrets are redacted by name. */
export function logger(): pino.Logger {
  return (instance ??= pino({
    level: env().LOG_LEVEL,
    base: undefined,
    serializers: { err: serializeError },
    redact: ['password', '*.password', 'passwordHash', '*.passwordHash', 'token', '*.token'],
  }))
}
