import fc from 'fast-check'
import { expect, it } from 'vitest'

import { tableHref } from '@/components/shades/table-address'
import { SHADE_SORTS, SHADE_STATUSES } from '@/lib/shades/constants'
import { shadeTableSchema } from '@/lib/shades/schema'

const place = { brand: 'teasel', lineSlug: 'dk' }

it('leaves what is the default out of the address', () => {
  expect(tableHref(place, shadeTableSchema.parse({}))).toBe('/teasel/lines/dk/shades?view=table')
})

it('puts the whole state of the table into the address, to be read back from there', () => {
  const filters = fc.record({
    q: fc.string({ maxLength: 60 }).map((q) => q.trim()),
    status: fc.subarray([...SHADE_STATUSES]),
    outside: fc.boolean(),
    sort: fc.constantFrom(...SHADE_SORTS),
    dir: fc.constantFrom('asc' as const, 'desc' as const),
    page: fc.integer({ min: 1, max: 10_000 }),
  })
  fc.assert(
    fc.property(filters, (filter) => {
      const { searchParams } = new URL(tableHref(place, filter), 'http://localhost')
      expect(shadeTableSchema.parse(Object.fromEntries(searchParams))).toEqual(filter)
    }),
  )
})
