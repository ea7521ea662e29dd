import { randomUUID } from 'node:crypto'

import { Line } from '@/models'
import { LINE_FORM } from '@/tests/fixtures/line-form'

const { price, ...FORM } = LINE_FORM

/** A line of the brand, with whatever matters to the test. */
export function makeLine(
  brand: { id: string },
  values: Partial<Pick<Line, 'name' | 'slug' | 'requestKey'>> = {},
): Promise<Line> {
  return Line.create({
    brandId: brand.id,
    slug: `line-${randomUUID()}`,
    name: 'A line',
    ...FORM,
    fibres: [...FORM.fibres],
    priceMinor: price * 100,
    ...values,
  })
}
