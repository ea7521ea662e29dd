import { readFileSync } from 'node:fs'

import { describe, expect, it } from 'vitest'

const SOURCES = Object.keys(import.meta.glob('../../../app/**/*.ts', { query: '?url' }))
const text = SOURCES.map((path) => readFileSync(new URL(path, import.meta.url), 'utf8')).join('\n')

describe('what is asked for', () => {
  it('has one name: an action’s is that of its export', () => {
    const made = [...text.matchAll(/\bdefine(?:Person|Public)?Action\(/g)]
    const named = [
      ...text.matchAll(/export const (\w+)Action = define(?:Person|Public)?Action\(\s*'(\w+)'/g),
    ]
    expect(named.length).toBeGreaterThan(10)
    expect(named).toHaveLength(made.length)
    for (const [, exported, name] of named) expect(name).toBe(exported)
  })

  it('is not called like anything else', () => {
    const names = [...text.matchAll(/\bdefine(?:Person|Public)?(?:Action|Route)\(\s*'(\w+)'/g)]
    const all = names.map(([, name]) => name)
    expect(all.filter((name, at) => all.indexOf(name) !== at)).toEqual([])
  })
})
