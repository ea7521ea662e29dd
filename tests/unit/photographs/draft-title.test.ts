import { describe, expect, it } from 'vitest'

import { draftTitle } from '@/lib/photographs/draft-title'
import { PHOTOGRAPH_LIMITS } from '@/lib/photographs/constants'

describe('a title drafted from a file name', () => {
  it.each([
    ['heather_before-dark.JPG', 'Heather before dark'],
    ['IMG_2041.jpeg', 'IMG 2041'],
    ['2026-08-14.jpg', '2026-08-14'],
    ['C:\\pictures\\tarn.tif', 'Tarn'],
    ['élan.webp', 'Élan'],
    ['no ending at all', 'No ending at all'],
    ['v1.2 of the wall.png', 'V1.2 of the wall'],
    ['a\u202egpj.jpg', 'Agpj'],
    ['.jpg', 'Untitled photograph'],
    ['___.png', 'Untitled photograph'],
  ])('%s → %s', (fileName, title) => {
    expect(draftTitle(fileName)).toBe(title)
  })

  it('never exceeds what a title may be, nor cuts a character in half', () => {
    const title = draftTitle(`x${'🐑'.repeat(PHOTOGRAPH_LIMITS.title)}.jpg`)
    expect(title).not.toMatch(/\p{Cs}/u)
    expect(title.length).toBeLessThanOrEqual(PHOTOGRAPH_LIMITS.title)
  })
})
