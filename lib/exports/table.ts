import { neutraliseCell, writeCsv } from '@/lib/shades/csv-text'

import type { ExportDescription } from './description'

const HEADER = [
  'combination',
  'place',
  'role',
  'shade',
  'number',
  'share',
  'L',
  'a',
  'b',
  'illuminant',
  'observer',
  'hex',
]

/**
 * The shades of all combinations as CSV, a row a place. Text that a spreadsheet would run as a
 * formula begins with an apostrophe.
 * @source RFC 4180; OWASP, CSV Injection
 */
export function shadeTable({ combinations }: ExportDescription): string {
  const rows = combinations.flatMap(({ title, shades }) =>
    shades.map(({ label, number, lab, illuminant, observer, hex, share, role }, index) => [
      neutraliseCell(title),
      String(index + 1),
      neutraliseCell(role),
      neutraliseCell(label),
      neutraliseCell(number),
      String(Math.round(share * 1e4) / 1e4),
      ...lab.map(String),
      illuminant,
      String(observer),
      hex,
    ]),
  )
  return writeCsv([HEADER, ...rows])
}
