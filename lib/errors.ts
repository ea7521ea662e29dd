/** The codes a command may answer with; each maps to one HTTP status. */
export type ErrorCode =
  | 'invalid'
  | 'unauthenticated'
  | 'forbidden'
  | 'not-found'
  | 'conflict'
  | 'too-many'
  | 'unavailable'

export const HTTP_STATUS: Record<ErrorCode, number> = {
  invalid: 422,
  unauthenticated: 401,
  forbidden: 403,
  'not-found': 404,
  conflict: 409,
  'too-many': 429,
  unavailable: 503,
}

/** What is wrong with a form, by field name (dotted for nested fields). */
export type FieldErrors = Record<string, string[]>

/** An error whose message is written for the person who reads it. Everything else is masked. */
export class AppError extends Error {
  constructor(
    readonly code: ErrorCode,
    message: string,
    readonly fieldErrors?: FieldErrors,
    options?: ErrorOptions,
  ) {
    super(message, options)
    this.name = new.target.name
  }
}

/** The input does not fit; says which field and why. */
export class InvalidError extends AppError {
  constructor(message: string, fieldErrors?: FieldErrors) {
    super('invalid', message, fieldErrors)
  }
}

/** Nobody is signed in, or the session has ended. */
export class UnauthenticatedError extends AppError {
  constructor(message = 'Your session has ended. Sign in again; what you typed is still here.') {
    super('unauthenticated', message)
  }
}

/** The person is a member of the brand but their role does not do this. */
export class ForbiddenError extends AppError {
  constructor(message = 'Your role in this brand does not include this.') {
    super('forbidden', message)
  }
}

/** The brand asks its members for a second factor, and this one has none. */
export class SecondFactorNeededError extends ForbiddenError {
  constructor(brandName: string) {
    super(
      `${brandName} asks everybody for a second factor, and you have none yet. Set one up at /account/second-factor, then do this again; what you typed is still here.`,
    )
  }
}

/** No such row for this actor: absent, deleted, or another brand's. */
export class NotFoundError extends AppError {
  constructor(message = 'This does not exist, or is not yours to see.') {
    super('not-found', message)
  }
}

/** Somebody else saved first, or the name or number is taken. */
export class ConflictError extends AppError {
  constructor(message: string, fieldErrors?: FieldErrors) {
    super('conflict', message, fieldErrors)
  }
}

/** Asked for too often; says when it can be asked for again. */
export class TooManyError extends AppError {
  constructor(
    message: string,
    /** Seconds. */
    readonly retryAfter: number,
  ) {
    super('too-many', message)
  }
}

/** A service we stand on (database, object store) does not answer. */
export class UnavailableError extends AppError {
  constructor(message: string, options?: ErrorOptions) {
    super('unavailable', message, undefined, options)
  }
}

/** What a failed command or route answers; the message is written for people. */
export interface Failure {
  ok: false
  code: ErrorCode | 'unexpected'
  message: string
  fieldErrors?: FieldErrors
  /** Seconds until it can be asked for again. */
  retryAfter?: number
}

/** What every action answers. */
export type ActionResult<Data> = { ok: true; data: Data } | Failure
