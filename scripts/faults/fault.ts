import type { World } from './world'

/** One thing that goes wrong, and what has to be seen when it does. */
export interface Fault {
  /** What it is called on the command line. */
  name: string
  what: string
  expected: string
  /** How long it may take in all, in seconds; 60 when it does not say. */
  within?: number
  /**
   * Breaks something, looks, and mends it (whatever is given to `world.undo` is undone in any
   * case).
   * @returns what was seen, in words
   * @throws Missed when it is not what is expected
   */
  run: (world: World) => Promise<string>
}

/** Something else was seen than expected. */
export class Missed extends Error {}

/** @throws Missed saying what was seen */
export function must(condition: unknown, seen: string): asserts condition {
  if (!condition) throw new Missed(seen)
}
