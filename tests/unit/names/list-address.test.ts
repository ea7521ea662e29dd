import fc from 'fast-check'
import { expect, it } from 'vitest'

import { listHref } from '@/components/names/list-address'
import { LISTED_STATES, NAME_SORTS } from '@/lib/names/constants'
import { nameListSchema } from '@/lib/names/schema'

const place = { brand: 'teasel', lineSlug: 'dk' }

it('leaves what is the default out of the address', () => {
  expect(listHref(place, nameListSchema.parse({}))).toBe('/teasel/lines/dk/names')
})

it('puts the whole state of the list into the address, to be read back from there', () => {
  const filters = fc.record({
    q: fc.string({ maxLength: 60 }).map((q) => q.trim()),
    state: fc.subarray([...LISTED_STATES]),
    family: fc.oneof(fc.constantFrom('', 'none'), fc.uuid()),
    warned: fc.boolean(),
    sort: fc.constantFrom(...NAME_SORTS),
    dir: fc.constantFrom('asc' as const, 'desc' as const),
    page: fc.integer({ min: 1, max: 10_000 }),
  })
  fc.assert(
    fc.property(filters, (filter) => {
      const { searchParams } = new URL(listHref(place, filter), 'http://localhost')
      expect(nameListSchema.parse(Object.fromEntries(searchParams))).toEqual(filter)
    }),
  )
})

it('gives the default for a part of the address that is nonsense', () => {
  const nonsense = {
    q: ['a', 'b'],
    state: 'put-by,gone',
    family: 'the blue ones',
    warned: 'yes',
    sort: 'password',
    dir: 'sideways',
    page: '-1',
  }
  expect(nameListSchema.parse(nonsense)).toEqual(nameListSchema.parse({}))
})
