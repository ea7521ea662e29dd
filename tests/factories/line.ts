import { randomUUID } from 'node:crypto'

import { Line } from '@/models'

/** A line of the brand, with whatever matters to the test. */
export function makeLine(
  brand: { id: string },
  values: Partial<Pick<Line, 'name' | 'slug' | 'requestKey'>> = {},
): Promise<Line> {
  return Line.create({
    brandId: brand.id,
    slug: `line-${randomUUID()}`,
    name: 'A line',
    fibres: [{ fibre: 'wool', percent: 100 }],
    ply: 3,
    weightNumber: 3,
    netGrams: 100,
    length: 225,
    lengthUnit: 'm',
    needleMm: 4,
    gaugeStitches: 22,
    gaugeRows: 30,
    currency: 'GBP',
    priceMinor: 2150,
    ...values,
  })
}
