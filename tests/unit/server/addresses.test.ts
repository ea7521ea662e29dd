import fc from 'fast-check'
import { describe, expect, it } from 'vitest'

import { GALLERY_MISSING, GALLERY_STATES } from '@/lib/photographs/constants'
import { galleryFilterSchema, matchParamsSchema } from '@/lib/photographs/schema'
import { SHADE_SORTS, SHADE_STATUSES } from '@/lib/shades/constants'
import { shadeTableSchema } from '@/lib/shades/schema'

/** What somebody may write into a parameter: text, one of these, or the same parameter again. */
const written = fc.oneof(
  fc.string(),
  fc.constantFrom(
    "order'; DROP TABLE shades; --",
    "' OR '1'='1",
    'position, (SELECT password_hash FROM people LIMIT 1)',
    'lab_l',
    '__proto__',
    'constructor',
    'toString',
    'ASC NULLS LAST',
    '1e3',
    '-1',
    '9'.repeat(40),
    '\0',
  ),
  fc.array(fc.string(), { maxLength: 3 }),
)
const address = (...names: string[]) =>
  fc.record(Object.fromEntries(names.map((name) => [name, written])), { requiredKeys: [] })

const isPage = (page: number) => Number.isInteger(page) && page >= 1 && page <= 10_000

describe('whatever stands in an address, what is sorted and filtered by is one of ours', () => {
  it('in the table of shades', () => {
    fc.assert(
      fc.property(address('q', 'status', 'outside', 'sort', 'dir', 'page', 'x'), (given) => {
        const filter = shadeTableSchema.parse(given)
        expect(SHADE_SORTS).toContain(filter.sort)
        expect(['asc', 'desc']).toContain(filter.dir)
        for (const status of filter.status) expect(SHADE_STATUSES).toContain(status)
        expect(isPage(filter.page)).toBe(true)
        expect(Object.keys(filter).sort()).toEqual([
          'dir',
          'outside',
          'page',
          'q',
          'sort',
          'status',
        ])
      }),
    )
  })

  it('in the gallery', () => {
    fc.assert(
      fc.property(address('q', 'state', 'missing', 'page', 'x'), (given) => {
        const filter = galleryFilterSchema.parse(given)
        expect([null, ...GALLERY_STATES]).toContain(filter.state)
        expect([null, ...GALLERY_MISSING]).toContain(filter.missing)
        expect(isPage(filter.page)).toBe(true)
        expect(Object.keys(filter).sort()).toEqual(['missing', 'page', 'q', 'state'])
      }),
    )
  })
})

describe('the wishes of a match', () => {
  it.each([
    { reading: 'true; DROP TABLE readings' },
    { reading: 'constructor' },
    { lock: "' OR '1'='1" },
    { exclude: '../../..' },
    { apart: '99' },
    { apart: 'NaN' },
    { sort: 'L' },
  ])('%j are refused', (wish) => {
    const photograph = crypto.randomUUID()
    expect(matchParamsSchema.safeParse({ photograph }).success).toBe(true)
    expect(matchParamsSchema.safeParse({ photograph, ...wish }).success).toBe(false)
  })
})
