import { isDeepStrictEqual } from 'node:util'

/**
 * The fields of `after` that were different in `before`, as they were and as they are; null when
 * none was. A field that is undefined in `after` counts as left alone.
 */
export function changesOf(
  before: object,
  after: object,
): { before: Record<string, unknown>; after: Record<string, unknown> } | null {
  const old = before as Record<string, unknown>
  const differing = Object.entries(after).filter(
    ([field, value]) => value !== undefined && !isDeepStrictEqual(old[field], value),
  )
  if (differing.length === 0) return null
  return {
    before: Object.fromEntries(differing.map(([field]) => [field, old[field] ?? null])),
    after: Object.fromEntries(differing),
  }
}
