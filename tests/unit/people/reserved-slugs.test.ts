import { readdirSync } from 'node:fs'
import { join } from 'node:path'

import { describe, expect, it } from 'vitest'

import { RESERVED_SLUGS } from '@/lib/people/constants'

/** The first parts of all addresses that the tree of app/ makes, but for the brand's own. */
function firstParts(folder: string): string[] {
  return readdirSync(folder, { withFileTypes: true })
    .filter((entry) => entry.isDirectory())
    .flatMap(({ name }) => {
      if (/^\(.*\)$/.test(name)) return firstParts(join(folder, name))
      return /^[[_@]/.test(name) ? [] : [name]
    })
}

describe('the addresses that no brand may have', () => {
  it('are all that the product itself stands at', () => {
    const parts = firstParts(join(import.meta.dirname, '../../../app'))
    expect(parts).toContain('sign-up')
    expect(parts.filter((part) => !RESERVED_SLUGS.includes(part))).toEqual([])
  })
})
