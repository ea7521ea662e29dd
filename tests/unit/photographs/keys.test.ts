import { randomUUID } from 'node:crypto'

import { describe, expect, it } from 'vitest'

import { derivativeKey, originalKey, photographOfKey } from '@/lib/photographs/keys'

const photograph = { id: randomUUID(), brandId: randomUUID(), sha256: 'ab'.repeat(32) }

describe('the keys of a photograph’s objects', () => {
  it('tell the photograph they belong to', () => {
    const copy = derivativeKey(photograph, { width: 480, format: 'webp' })
    expect(copy.endsWith('/abababababab-480.webp')).toBe(true)
    expect(photographOfKey(copy)).toBe(photograph.id)
    expect(photographOfKey(originalKey(photograph))).toBe(photograph.id)
  })

  it.each(['originals/', 'originals/x/y', `exports/${photograph.brandId}/${photograph.id}`, ''])(
    '“%s” is none of ours',
    (key) => {
      expect(photographOfKey(key)).toBeNull()
    },
  )
})
