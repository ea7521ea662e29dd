import { AsyncLocalStorage } from 'node:async_hooks'

/** For whom the database is asked; row-level security lets nothing else be seen. */
export interface Scope {
  /** The brand whose rows may be seen and written. */
  readonly brandId?: string
  /** The person whose own memberships may be seen, in any brand. */
  readonly personId?: string
  /** Names the request in the log, in the activity record and in the jobs it leads to. */
  readonly requestId?: string
}

// Next.js bundles pages, routes and actions apart; all of them share one pool, and so one scope.
const shared = globalThis as typeof globalThis & { woadmapScope?: AsyncLocalStorage<Scope | null> }
const storage = (shared.woadmapScope ??= new AsyncLocalStorage<Scope | null>())

/** The scope this code runs in; empty outside of any. */
export const currentScope = (): Scope => storage.getStore() ?? {}

/**
 * Runs a statement to which it is all the same for whom the connection speaks, on one that goes on
 * speaking for whom it last did. Such a statement looks at no table itself: it asks a function that
 * answers as the owner of the tables, and stands in a file of this folder.
 */
export const withWhomever = <T>(ask: () => Promise<T>): Promise<T> => storage.run(null, ask)

/** Whether this code runs in {@link withWhomever}. */
export const isForWhomever = (): boolean => storage.getStore() === null

/** Runs `work`, and whatever it awaits, in a scope: what is given over what already holds. */
export const withinScope = <T>(scope: Scope, work: () => T): T =>
  storage.run({ ...currentScope(), ...scope }, work)
