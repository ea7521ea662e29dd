import { describe, expect, it } from 'vitest'

import { createLineSchema } from '@/lib/lines/schema'
import { LINE_FORM } from '@/tests/fixtures/line-form'

const values = {
  name: 'A line',
  ...LINE_FORM,
  price: '21.50',
  launchDate: '',
  requestKey: '0b0e6f0a-4c9e-4f6e-9a4f-8a3f0a2d9c11',
}

function problems(changed: object): string[] {
  const result = createLineSchema.safeParse({ ...values, ...changed })
  return result.success ? [] : result.error.issues.map((issue) => issue.path.join('.'))
}

describe('the form of a line', () => {
  it('takes a whole one, and an empty launch date as undecided', () => {
    expect(problems({})).toEqual([])
    expect(createLineSchema.parse(values).launchDate).toBeNull()
  })

  it.each([
    ['fibres that do not come to 100 %', { fibres: [{ fibre: 'wool', percent: 99 }] }, 'fibres'],
    [
      'fibres that are not descending',
      {
        fibres: [
          { fibre: 'silk', percent: 30 },
          { fibre: 'wool', percent: 70 },
        ],
      },
      'fibres',
    ],
    ['no fibre', { fibres: [] }, 'fibres'],
    ['an empty name', { name: '  ' }, 'name'],
    ['yarn weight 8', { weightNumber: 8 }, 'weightNumber'],
    ['a ball without length', { length: 0 }, 'length'],
    ['words for a number', { netGrams: 'a hundred' }, 'netGrams'],
    ['a price to the tenth of a penny', { price: '21.505' }, 'price'],
    ['a currency that is none', { currency: 'XXX' }, 'currency'],
    ['a day that does not exist', { launchDate: '2027-02-30' }, 'launchDate'],
  ])('refuses %s', (_, changed, field) => {
    expect(problems(changed)).toContain(field)
  })

  it('refuses fields it does not know', () => {
    expect(createLineSchema.safeParse({ ...values, brandId: 'x' }).success).toBe(false)
  })
})
