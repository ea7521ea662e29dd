import { randomUUID } from 'node:crypto'

import {
  ConnectionAcquireTimeoutError,
  ConnectionError,
  DatabaseError,
  TimeoutError,
} from 'sequelize'
import { z } from 'zod'

import {
  AppError,
  InvalidError,
  TooManyError,
  UnavailableError,
  type Failure,
  type FieldErrors,
} from '@/lib/errors'
import { logger } from '@/lib/logger'
import { currentScope } from '@/models/scope'

/** PostgreSQL's classes for "I am going", "too many", "cannot reach": worth trying again. */
const PASSING = /^(57P0[1-4]|57014|53\d{3}|08\w{3}|55P03|40001|40P01|25P03)$/

function isDatabaseAway(error: unknown): boolean {
  if (error instanceof ConnectionError || error instanceof ConnectionAcquireTimeoutError)
    return true
  if (error instanceof TimeoutError) return true
  if (!(error instanceof DatabaseError)) return false
  const { code, message } = error.original as Error & { code?: string }
  return (
    PASSING.test(code ?? '') || /terminat|ECONN|EPIPE|read timeout|not queryable/i.test(message)
  )
}

function asAppError(error: unknown): AppError | undefined {
  if (error instanceof AppError) return error
  if (error instanceof z.ZodError) {
    return new InvalidError('Something in the form needs a second look.', fieldErrorsOf(error))
  }
  if (isDatabaseAway(error)) {
    return new UnavailableError(
      'The database did not answer. Nothing was lost on this page: try again in a moment.',
      { cause: error },
    )
  }
  return undefined
}

/** The messages of a zod error by dotted path. */
export function fieldErrorsOf(error: z.ZodError): FieldErrors {
  const errors: FieldErrors = {}
  for (const issue of error.issues) (errors[issue.path.join('.')] ??= []).push(issue.message)
  return errors
}

/** What names a masked error to the person who met it: the beginning of its request's id. */
export const referenceOf = (requestId: string = randomUUID()): string => requestId.slice(0, 8)

/**
 * Turns anything thrown into what may be shown. Expected errors keep their words; others are
 * masked, logged, and named by a reference that finds the log line.
 */
export function failureOf(error: unknown, where: string): Failure {
  const known = asAppError(error)
  const { requestId } = currentScope()
  if (known) {
    if (known.code === 'unavailable')
      logger().warn({ err: known.cause ?? known, where, requestId }, known.message)
    return {
      ok: false,
      code: known.code,
      message: known.message,
      ...(known.fieldErrors && { fieldErrors: known.fieldErrors }),
      ...(known instanceof TooManyError && { retryAfter: known.retryAfter }),
    }
  }
  const reference = referenceOf(requestId)
  logger().error({ err: error, where, reference, requestId }, 'unexpected error')
  return {
    ok: false,
    code: 'unexpected',
    message: `Something went wrong on our side (reference ${reference}). What you typed is still here; try again.`,
  }
}
