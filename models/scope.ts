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
const shared = globalThis as typeof globalThis & { woadmapScope?: AsyncLocalStorage<Scope> }
const storage = (shared.woadmapScope ??= new AsyncLocalStorage<Scope>())

/** The scope this code runs in; empty outside of any. */
export const currentScope = (): Scope => storage.getStore() ?? {}

/** Runs `work`, and whatever it awaits, in a scope: what is given over what already holds. */
export const withinScope = <T>(scope: Scope, work: () => T): T =>
  storage.run({ ...currentScope(), ...scope }, work)
