import { Shade, type Line } from '@/models'

type Values = Partial<
  Pick<Shade, 'number' | 'name' | 'labL' | 'labA' | 'labB' | 'observer' | 'hex' | 'status'>
> & { position?: number }

/** A shade of the line, with whatever matters to the test. */
export function makeShade(line: Line, values: Values = {}): Promise<Shade> {
  const position = values.position ?? 0
  return Shade.create({
    brandId: line.brandId,
    lineId: line.id,
    number: `S${position + 1}`,
    name: null,
    labL: 54.2,
    labA: -12,
    labB: 8.1,
    illuminant: 'D65',
    observer: 10,
    hex: null,
    status: 'target',
    position,
    ...values,
  })
}

/** So many shades in order, numbered S1, S2, … from light to dark. */
export function makeShades(line: Line, count: number): Promise<Shade[]> {
  return Promise.all(
    Array.from({ length: count }, (_, position) =>
      makeShade(line, { position, labL: 95 - (90 * position) / count }),
    ),
  )
}
