import { InvalidError } from '@/lib/errors'
import { wordsOf } from '@/lib/naming/words'
import { asClause, beyondHeader, guessColumns, parseSheet } from '@/lib/shades/csv-text'
import { oneLine } from '@/lib/shades/constants'

import { NAME_LIMITS } from './constants'
import { nameNote, nameText } from './schema'

/** What a column of a file of names may hold. */
type IdeaField = 'name' | 'note' | 'shade'

/** Headers as people write them; see guessColumns. */
const HEADERS: Record<IdeaField, readonly string[]> = {
  name: ['name', 'names', 'idea', 'ideas', 'shadename', 'title', 'text'],
  note: ['note', 'notes', 'thought', 'why', 'comment', 'comments', 'remark', 'remarks', 'meaning'],
  shade: ['shade', 'shadenumber', 'shadeno', 'number', 'no', 'nr', 'num'],
}
const FIELDS = Object.keys(HEADERS) as IdeaField[]

/** A row that somebody brings, good or not. */
export interface IdeaRow {
  /** As a spreadsheet counts, the header being row 1; of names one a line, the line. */
  row: number
  cells: string[]
  text: string
  note: string
  /** The number of a shade as it stands there; empty where the row names none. */
  number: string
  errors: { field: string; message: string }[]
}

/** Rows as read, and from which columns. */
export interface IdeaRows {
  header: string[]
  /** The header of the column that each was read from. */
  columns: Partial<Record<IdeaField, string>>
  /** Columns that say nothing of a name. */
  unread: string[]
  rows: IdeaRow[]
}

/** What a list of names begins its lines with: a dash, a bullet, "12." or "12)". */
const BULLET = /^\s*(?:[-–—*•·]|\d{1,4}[.)])\s+/u

/**
 * Names one a line, without the marks of a list before them; empty lines are passed over.
 * @throws InvalidError when there is none, or more than are read at once
 */
export function readLines(text: string): IdeaRows {
  const rows = text
    .replace(/^\uFEFF/, '')
    .split(/\r\n?|\n/)
    .map((line, at) => ({ row: at + 1, cells: [line.replace(BULLET, '')] }))
    .filter(({ cells: [line] }) => line!.trim() !== '')
  if (rows.length === 0) throw new InvalidError('There is no name in it.')
  if (rows.length > NAME_LIMITS.atOnce) {
    const most = NAME_LIMITS.atOnce.toLocaleString('en-GB')
    throw new InvalidError(
      `There are more than ${most} names in it, which is the most that is read at once. Bring them in smaller parts.`,
    )
  }
  const read = rows.map(({ row, cells }) => readRow(row, cells, { name: 0 }))
  return { header: ['name'], columns: {}, unread: [], rows: read }
}

/**
 * The names of a CSV file whose header names a column for them; notes and shade numbers may have
 * columns too.
 * @throws InvalidError when it is no CSV file, or no column holds names
 */
export function readSheetOfIdeas(text: string): IdeaRows {
  const { header, rows } = parseSheet(text, {
    noun: 'name',
    columns: FIELDS.join(', '),
    mostRows: NAME_LIMITS.atOnce,
  })
  const found = guessColumns(header, HEADERS)
  if (found.name === null) {
    const has = header.filter(Boolean).join(', ')
    throw new InvalidError(
      `No column is called “name”. The first row says: ${has}. Put “name” over the names, or paste them one a line.`,
    )
  }
  const held = FIELDS.filter((field) => found[field] !== null)
  const at = Object.fromEntries(held.map((field) => [field, found[field]!]))
  return {
    header,
    columns: Object.fromEntries(held.map((field) => [field, header[found[field]!]!])),
    unread: header.filter((name, column) => name && !Object.values(at).includes(column)),
    rows: rows.map(({ row, cells }) => {
      const read = readRow(row, cells, at)
      const beyond = beyondHeader(cells, header.length)
      if (beyond) read.errors.unshift({ field: 'name', message: beyond })
      return read
    }),
  }
}

function readRow(row: number, cells: string[], at: Partial<Record<IdeaField, number>>): IdeaRow {
  const errors: IdeaRow['errors'] = []
  const cell = (field: IdeaField) => (at[field] === undefined ? '' : (cells[at[field]] ?? ''))
  const take = (field: 'name' | 'note', schema: typeof nameText | typeof nameNote): string => {
    const parsed = schema.safeParse(cell(field))
    if (parsed.success) return parsed.data
    errors.push({ field, message: asClause(parsed.error.issues[0]!.message) })
    return oneLine(cell(field))
  }
  return {
    row,
    cells,
    text: take('name', nameText),
    note: take('note', nameNote),
    number: oneLine(cell('shade')).replace(/^no(?:\.\s*|\s+)(?=\S)/i, ''),
    errors,
  }
}

/** What two names have in common that are the same but for case, accents and punctuation. */
export const sameName = (text: string): string =>
  wordsOf(text).join(' ') || oneLine(text).toLowerCase()
