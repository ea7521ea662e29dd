import { CsvError, parse } from 'csv-parse/sync'

import { InvalidError } from '@/lib/errors'

import { SHADE_LIMITS } from './constants'

/** What may stand between the cells of a row. */
export const DELIMITERS = [',', ';', '\t'] as const
/** One of DELIMITERS. */
export type Delimiter = (typeof DELIMITERS)[number]

/** A CSV file as a sheet: the first row is the header. */
export interface Sheet {
  delimiter: Delimiter
  header: string[]
  /** The rows with something in them; `row` counts as a spreadsheet does, the header being row 1. */
  rows: { row: number; cells: string[] }[]
}

/** The delimiter that stands most often in the header outside quotes; a comma when none does. */
export function sniffDelimiter(text: string): Delimiter {
  const counts = new Map<string, number>(DELIMITERS.map((delimiter) => [delimiter, 0]))
  let quoted = false
  for (const character of text) {
    if (character === '"') quoted = !quoted
    else if (!quoted && (character === '\n' || character === '\r')) break
    else if (!quoted && counts.has(character)) counts.set(character, counts.get(character)! + 1)
  }
  return DELIMITERS.reduce((best, one) => (counts.get(one)! > counts.get(best)! ? one : best))
}

/** What the rows of a file are, for the words of what is wrong with it. */
export interface SheetOf {
  noun: string
  /** Columns that a header may name. */
  columns: string
  mostRows: number
}

const OF_SHADES: SheetOf = {
  noun: 'shade',
  columns: 'number, L, a, b',
  mostRows: SHADE_LIMITS.importRows,
}

/**
 * Reads CSV text (RFC 4180; also semicolons, tabs, a byte-order mark, any line ends).
 * @throws InvalidError in words: empty, a quote that does not close, too many rows
 */
export function parseSheet(text: string, { noun, columns, mostRows }: SheetOf = OF_SHADES): Sheet {
  const content = text.replace(/^\uFEFF/, '')
  const delimiter = sniffDelimiter(content)
  const records = parseRecords(content, delimiter).map((cells) => cells.map(restoreCell))
  const [header, ...others] = records
  if (!header || isBlank(header)) {
    throw new InvalidError(`The first row is empty. It must name the columns, such as ${columns}.`)
  }
  const rows = others
    .map((cells, index) => ({ row: index + 2, cells }))
    .filter(({ cells }) => !isBlank(cells))
  if (rows.length === 0) throw new InvalidError(`There is no ${noun} in it, only the header row.`)
  if (rows.length > mostRows) {
    throw new InvalidError(
      `The file has more than ${mostRows.toLocaleString('en-GB')} rows, which is the most that is read at once. Import it in smaller parts.`,
    )
  }
  return { delimiter, header: header.map((cell) => cell.trim()), rows }
}

function parseRecords(content: string, delimiter: Delimiter): string[][] {
  try {
    return parse(content, {
      delimiter,
      relax_column_count: true,
      record_delimiter: ['\r\n', '\n', '\r'],
    })
  } catch (error) {
    if (!(error instanceof CsvError)) throw error
    const line = typeof error.lines === 'number' ? ` near line ${error.lines}` : ''
    throw new InvalidError(
      `The quotation marks do not match${line}: a cell that begins with " must end with ", and a " within it is doubled.`,
    )
  }
}

/**
 * Which columns, from 0, seem to hold which fields, by the words of the header without blanks and
 * marks; the first word and then the first column that fits is taken.
 */
export function guessColumns<Field extends string>(
  header: readonly string[],
  synonyms: Readonly<Record<Field, readonly string[]>>,
): Record<Field, number | null> {
  const words = header.map((cell) => cell.toLowerCase().replace(/[^\p{L}\p{N}]/gu, ''))
  const taken = new Set<number>()
  const mapping = {} as Record<Field, number | null>
  for (const field of Object.keys(synonyms) as Field[]) {
    const found = synonyms[field]
      .map((word) => words.findIndex((one, at) => one === word && !taken.has(at)))
      .find((at) => at >= 0)
    mapping[field] = found ?? null
    if (found !== undefined) taken.add(found)
  }
  return mapping
}

/** What is wrong with a row that has something beyond the columns of its header; null when nothing. */
export const beyondHeader = (cells: readonly string[], columns: number): string | null =>
  cells.slice(columns).some((extra) => extra.trim() !== '')
    ? `the row has ${cells.length} cells and the header ${columns}: is there a comma in a cell without quotation marks?`
    : null

/** A message of a form as the end of "Row 14, L: …". */
export const asClause = (message: string): string =>
  message.charAt(0).toLowerCase() + message.slice(1).replace(/\.$/, '')

/** How what is wrong with a cell is said: "Row 14, L: “abc” is not a number: give L". */
export const describeError = (
  row: number,
  { field, message }: { field: string; message: string },
): string => `Row ${row}, ${field}: ${message}`

/** The bad rows as they stood in the file, with a column that says what is wrong. */
export function badRowsCsv(
  header: readonly string[],
  rows: readonly {
    row: number
    cells: readonly string[]
    errors: readonly { field: string; message: string }[]
  }[],
): string {
  const width = Math.max(header.length, ...rows.map(({ cells }) => cells.length))
  const pad = (cells: readonly string[]) =>
    Array.from({ length: width }, (_, at) => neutraliseText(cells[at] ?? ''))
  return writeCsv([
    [...pad(header), 'reason'],
    ...rows.map(({ row, cells, errors }) => [
      ...pad(cells),
      errors.map((error) => describeError(row, error)).join('; '),
    ]),
  ])
}

/** A cell of an unknown column: what reads as a number is one, everything else is text. */
const neutraliseText = (cell: string) =>
  /^[+-]?[\d.,]+(e[+-]?\d+)?$/i.test(cell) ? cell : neutraliseCell(cell)

const isBlank = (cells: readonly string[]) => cells.every((cell) => cell.trim() === '')

/*
 * A spreadsheet takes a cell that begins with = + - @, a tab or a line end for a formula. Such text
 * goes out with an apostrophe before it, and so does text that already looks like one that went
 * out: each export adds exactly one apostrophe and each import takes exactly one away.
 */
const LOOKS_LIKE_FORMULA = /^'*[=+\-@\t\r\n]/
const WENT_OUT = /^'+[=+\-@\t\r\n]/

/**
 * Text for a cell, such that no spreadsheet runs it. {@link restoreCell} gives it back.
 * @source OWASP, CSV Injection
 */
export const neutraliseCell = (text: string): string =>
  LOOKS_LIKE_FORMULA.test(text) ? `'${text}` : text

/** The text that {@link neutraliseCell} was given. */
export const restoreCell = (cell: string): string => (WENT_OUT.test(cell) ? cell.slice(1) : cell)

/** Rows as CSV (RFC 4180, CRLF), with a byte-order mark so that spreadsheets read it as UTF-8. */
export function writeCsv(rows: readonly (readonly string[])[]): string {
  const quote = (cell: string) =>
    /[",;\t\r\n]|^\s|\s$/.test(cell) ? `"${cell.replaceAll('"', '""')}"` : cell
  return `\uFEFF${rows.map((row) => row.map(quote).join(',')).join('\r\n')}\r\n`
}
