import { readFileSync } from 'node:fs'
import { parse } from 'csv-parse/sync'
import { z } from 'zod'
import type { DemoShade } from './types'

const Row = z.object({
  number: z.string().min(1),
  name: z.string(),
  status: z.enum(['target', 'dipped', 'approved', 'retired']),
  L: z.string(),
  a: z.string(),
  b: z.string(),
  illuminant: z.enum(['D65', '']),
  observer: z.enum(['10', '']),
  hex: z.string(),
  order: z.coerce.number().int().positive(),
})

/**
 * The shades of a CSV file beside this module, in the line's order.
 * Lab is relative to the reading's own white, D65 and 10° observer. Throws when a row has neither
 * a whole reading nor a hex colour.
 */
export function readShades(file: string): DemoShade[] {
  const text = readFileSync(new URL(file, import.meta.url), 'utf8')
  const rows = z.array(Row).parse(parse(text, { columns: true }))
  return rows.map(({ number, name, status, L, a, b, illuminant, observer, hex, order }) => {
    const measured = L !== '' && a !== '' && b !== '' && illuminant !== '' && observer !== ''
    if (measured === (hex !== '')) {
      throw new Error(`${file}: shade ${number} needs either a reading or a hex colour`)
    }
    const lab = measured ? { L: Number(L), a: Number(a), b: Number(b), illuminant, observer } : null
    return { number, name: name || null, status, lab, hex: hex || null, order }
  })
}
