import { readFileSync } from 'node:fs'

import { describe, expect, it } from 'vitest'

import { ACTIONS } from '@/lib/activity/constants'

const SOURCES = Object.keys(
  import.meta.glob('../../../{app,lib}/**/*.{ts,tsx}', { query: '?url' }),
).filter((path) => !path.endsWith('lib/activity/constants.ts'))

/** Every "noun.happened" that a source hands to the record. */
const used = new Set(
  SOURCES.flatMap((path) => {
    const text = readFileSync(new URL(path, import.meta.url), 'utf8')
    if (!/record(Activity|Changes|InBrands)|tellBrands/.test(text)) return []
    return [...text.matchAll(/'([a-z][a-z-]*\.[a-z][a-z-]*)'/g)].map(([, action]) => action!)
  }),
)

describe('the words of the activity record', () => {
  it('stand in its table for every action that the product records', () => {
    expect(used.size).toBeGreaterThan(20)
    expect([...used].filter((action) => !(action in ACTIONS))).toEqual([])
  })

  it('make a sentence of an entry that says nothing but its action', () => {
    for (const [action, { label, says }] of Object.entries(ACTIONS)) {
      expect(label, action).toMatch(/^[A-Z][^.]+$/)
      expect(says({ label: 'it', before: {}, after: {} }), action).toMatch(/^[a-z]/)
    }
  })
})
