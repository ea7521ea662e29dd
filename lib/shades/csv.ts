import { z } from 'zod'

import { colorColumns, type ColorColumns } from './color'
import {
  asClause,
  beyondHeader,
  guessColumns,
  neutraliseCell,
  writeCsv,
  type Sheet,
} from './csv-text'
import type { ShadeRow } from './present'
import {
  CSV_FIELDS,
  oneLine,
  READING_TERMS,
  SHADE_STATUSES,
  type CsvField,
  type CsvMapping,
  type ReadingTerms,
  type ShadeStatus,
} from './constants'
import { labFields, shadeHex, shadeName, shadeNumber } from './schema'

/** What is wrong with one cell, in words. */
export interface CellError {
  field: CsvField
  message: string
}

/** What a row says of a shade; a field whose column is missing is left out. */
export interface CsvShade {
  number: string
  /** Left out for an empty cell as well: a file takes no name away. */
  name?: string
  /** Left out for an empty cell as well. */
  status?: ShadeStatus
  color?: ColorColumns
  position?: number
}

/** A row as read: a shade, or what is wrong with it. */
export interface CsvRow {
  row: number
  cells: string[]
  /** As they stand in the file, good or not. */
  number: string
  name: string | null
  shade: CsvShade | null
  errors: CellError[]
  /** Something the person should know although the row is good. */
  note?: string
}

/** Headers as people write them, without blanks and marks; the first column that fits is taken. */
const HEADERS: Record<CsvField, readonly string[]> = {
  number: ['number', 'no', 'nr', 'num', 'shadenumber', 'shadeno', 'shade', 'code', 'id'],
  name: ['name', 'shadename', 'title'],
  status: ['status', 'state'],
  L: ['l', 'cielabl', 'labl', 'lightness'],
  a: ['a', 'cielaba', 'laba'],
  b: ['b', 'cielabb', 'labb'],
  illuminant: ['illuminant', 'light', 'lightsource', 'illuminantobserver'],
  observer: ['observer', 'observerangle', 'angle'],
  hex: ['hex', 'hexcode', 'srgb', 'rgb', 'screencolour', 'screencolor'],
  order: ['order', 'position', 'place', 'sort'],
}

/** Which columns seem to hold which fields, by the words of the header. */
export const guessMapping = (header: readonly string[]): CsvMapping => guessColumns(header, HEADERS)

/** What must be settled about the columns before any row can be read, in words; empty when nothing. */
export function mappingProblems(mapping: CsvMapping, terms: ReadingTerms | null): string[] {
  const problems: string[] = []
  if (mapping.number === null) problems.push('Choose the column that holds the shade numbers.')
  const columns = CSV_FIELDS.map((field) => mapping[field]).filter((column) => column !== null)
  if (new Set(columns).size < columns.length) {
    problems.push('One column is chosen for two things. Each column can hold one.')
  }
  const lab = [mapping.L, mapping.a, mapping.b].filter((column) => column !== null)
  if (lab.length === 1 || lab.length === 2) {
    problems.push('A Lab colour needs three columns: choose L, a and b, or none of them.')
  }
  // One column may hold both, as “D65/10°”.
  const says = mapping.illuminant !== null || mapping.observer !== null
  if (lab.length === 3 && !says && terms === null) {
    problems.push(
      'The file does not say under which light and observer L, a and b were read: choose.',
    )
  }
  return problems
}

/** Columns that hold a colour. */
const COLOR_FIELDS = ['L', 'a', 'b', 'hex'] as const

/**
 * Reads the rows of a sheet; a mapping with {@link mappingProblems} is not to be given. Numbers
 * that stand in the file twice are errors in each of their rows.
 */
export function readRows(sheet: Sheet, mapping: CsvMapping, terms: ReadingTerms | null): CsvRow[] {
  const rows = sheet.rows.map(({ row, cells }) =>
    readRow(row, cells, sheet.header.length, mapping, terms),
  )
  const byNumber = new Map<string, CsvRow[]>()
  for (const row of rows) {
    const key = numberKey(row.number)
    byNumber.set(key, [...(byNumber.get(key) ?? []), row])
  }
  byNumber.delete('')
  for (const same of byNumber.values()) {
    if (same.length < 2) continue
    for (const row of same) {
      const others = same.filter((other) => other !== row).map((other) => other.row)
      const where =
        others.length > 3 ? `${others.length} other rows` : `row ${others.join(' and ')}`
      row.shade = null
      row.errors.unshift({ field: 'number', message: `“${row.number}” stands in ${where} as well` })
    }
  }
  return rows
}

/** Numbers are the same whatever their case. */
export const numberKey = (number: string): string => number.toLowerCase()

function readRow(
  row: number,
  cells: string[],
  columns: number,
  mapping: CsvMapping,
  terms: ReadingTerms | null,
): CsvRow {
  const errors: CellError[] = []
  const cell = (field: CsvField) => {
    const column = mapping[field]
    return column === null ? undefined : (cells[column] ?? '').trim()
  }
  const take = <T>(field: CsvField, schema: z.ZodType<T, string>): T | undefined => {
    const text = cell(field)
    if (text === undefined) return undefined
    const parsed = schema.safeParse(text)
    if (parsed.success) return parsed.data
    errors.push({ field, message: asClause(parsed.error.issues[0]!.message) })
    return undefined
  }

  const beyond = beyondHeader(cells, columns)
  if (beyond) errors.push({ field: 'number', message: beyond })
  const number = take('number', shadeNumber)
  const name = take('name', shadeName as z.ZodType<string | null, string>) ?? undefined
  const status = cell('status') === '' ? undefined : take('status', statusCell)
  const position = cell('order') === '' ? undefined : take('order', orderCell)
  const hasLab = (['L', 'a', 'b'] as const).some((field) => cell(field))
  const hasHex = Boolean(cell('hex'))
  let color: ColorColumns | undefined
  if (hasLab) {
    const lab = { L: take('L', labCell.L), a: take('a', labCell.a), b: take('b', labCell.b) }
    const under = readTerms(cell('illuminant') ?? '', cell('observer') ?? '', terms, errors)
    if (lab.L !== undefined && lab.a !== undefined && lab.b !== undefined && under) {
      color = colorColumns({ kind: 'lab', L: lab.L, a: lab.a, b: lab.b, terms: under })
    }
  } else if (hasHex) {
    const hex = take('hex', shadeHex as z.ZodType<string, string>)
    // A hex colour is sRGB, which is D65 and 2°; a row that says otherwise means something else.
    const silent = !cell('illuminant') && !cell('observer')
    const under = silent
      ? 'D65/2'
      : readTerms(cell('illuminant') ?? '', cell('observer') ?? '', 'D65/2', errors)
    if (under === 'D65/10') {
      errors.push({ field: 'observer', message: 'a hex colour is D65 and 2°: leave this empty' })
    }
    if (hex !== undefined && under) color = colorColumns({ kind: 'hex', hex })
  } else {
    const field = COLOR_FIELDS.find((one) => mapping[one] !== null)
    if (field) errors.push({ field, message: 'there is no colour: give L, a and b, or a hex' })
  }

  const good = errors.length === 0 && number !== undefined
  return {
    row,
    cells,
    number: oneLine(cell('number') ?? ''),
    name: oneLine(cell('name') ?? '') || null,
    errors,
    shade: good
      ? {
          number,
          ...(name !== undefined && { name }),
          ...(status !== undefined && { status }),
          ...(color && { color }),
          ...(position !== undefined && { position }),
        }
      : null,
    ...(good && hasLab && hasHex && { note: 'The hex is left out: L, a and b are the record.' }),
  }
}

const labCell = labFields as Record<'L' | 'a' | 'b', z.ZodType<number, string>>

const statusCell = z
  .string()
  .toLowerCase()
  .pipe(
    z.enum(SHADE_STATUSES, {
      error: ({ input }) =>
        `“${String(input)}” is no status: write ${SHADE_STATUSES.slice(0, -1).join(', ')} or ${SHADE_STATUSES.at(-1)}`,
    }),
  )

const orderCell = z
  .string()
  .regex(/^\d{1,6}$/, { error: ({ input }) => `“${String(input)}” is not a whole number` })
  .transform(Number)
  .refine((order) => order >= 1, 'the first place is 1')
  .transform((order) => order - 1)

/** The terms a row gives, in one cell or two; what it does not say is as chosen for the file. */
function readTerms(
  illuminant: string,
  observer: string,
  chosen: ReadingTerms | null,
  errors: CellError[],
): ReadingTerms | null {
  const words = `${illuminant} ${observer}`
    .toLowerCase()
    .replace(/°|deg(rees?)?\b/g, ' ')
    .split(/[\s/,;|]+/)
    .filter(Boolean)
  const said = (fits: (word: string) => boolean) => [...new Set(words.filter(fits))].join(' ')
  const isAngle = (word: string) => /^\d+$/.test(word)
  const light = said((word) => !isAngle(word)).toUpperCase() || chosen?.split('/')[0]
  const angle = said(isAngle) || chosen?.split('/')[1]
  if (light === undefined) {
    errors.push({
      field: 'illuminant',
      message: 'the row does not say under which light it was read',
    })
  } else if (light !== 'D65') {
    errors.push({
      field: 'illuminant',
      message: `“${light}” is not D65: only readings under D65 are taken, and none is converted`,
    })
  }
  if (angle === undefined) {
    errors.push({ field: 'observer', message: 'the row does not say by which observer, 2 or 10' })
  } else if (angle !== '2' && angle !== '10') {
    errors.push({ field: 'observer', message: `“${angle}” is no observer: write 2 or 10` })
  }
  return READING_TERMS.find((one) => one === `${light}/${angle}`) ?? null
}

/** Shades as the CSV that imports again unchanged; the header is CSV_FIELDS. */
export function shadesToCsv(shades: readonly ShadeRow[]): string {
  return writeCsv([CSV_FIELDS, ...shades.map(shadeCells)])
}

function shadeCells(shade: ShadeRow): string[] {
  const reading = shade.hex === null
  return [
    neutraliseCell(shade.number),
    neutraliseCell(shade.name ?? ''),
    shade.status,
    reading ? String(shade.labL) : '',
    reading ? String(shade.labA) : '',
    reading ? String(shade.labB) : '',
    reading ? shade.illuminant : '',
    reading ? String(shade.observer) : '',
    shade.hex ?? '',
    String(shade.position + 1),
  ]
}
