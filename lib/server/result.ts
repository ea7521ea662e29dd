import type { Failure } from './map-error'

export type { Failure }

/** What every action answers. Client-safe: types only. */
export type ActionResult<Data> = { ok: true; data: Data } | Failure
