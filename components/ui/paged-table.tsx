'use client'

import type { ReactTable } from '@tanstack/react-table'
import { ArrowDown, ArrowUp } from 'lucide-react'
import type { ReactNode } from 'react'

import { cn } from './cn'
import { Ledger } from './ledger'
import type { features } from './use-paged-table'

/** A table of {@link usePagedTable} as a ledger; its heads sort. */
export function PagedTable<Row extends object>({
  table,
  caption,
  hint,
  loading,
  keyOf,
  numberColumns = [],
}: {
  table: ReactTable<typeof features, Row>
  caption: string
  /** How its cells are edited. */
  hint?: ReactNode
  loading: boolean
  /** What a row is known by while its id may change; its id by default. */
  keyOf?: (row: Row) => string
  /** Columns whose cells stand at the right. */
  numberColumns?: readonly string[]
}) {
  const classOf = (column: string) => {
    if (column === 'select') return 'print:hidden'
    return numberColumns.includes(column) ? 'number' : undefined
  }
  return (
    <div className={cn('mt-3 transition-opacity', loading && 'opacity-60')} aria-busy={loading}>
      {hint ? <p className="mb-1 text-sm text-ink-faint print:hidden">{hint}</p> : null}
      <Ledger caption={caption}>
        <thead>
          {table.getHeaderGroups().map((group) => (
            <tr key={group.id}>
              {group.headers.map((header) => {
                const sorted = header.column.getIsSorted()
                return (
                  <th
                    key={header.id}
                    scope="col"
                    className={classOf(header.column.id)}
                    aria-sort={sorted ? (sorted === 'asc' ? 'ascending' : 'descending') : undefined}
                  >
                    {header.column.getCanSort() ? (
                      <button
                        type="button"
                        onClick={header.column.getToggleSortingHandler()}
                        className={cn(HEADER, 'hover:text-ink hover:underline')}
                      >
                        <table.FlexRender header={header} />
                        {sorted === 'asc' ? <ArrowUp {...ARROW} /> : null}
                        {sorted === 'desc' ? <ArrowDown {...ARROW} /> : null}
                      </button>
                    ) : (
                      <span className={HEADER}>
                        <table.FlexRender header={header} />
                      </span>
                    )}
                  </th>
                )
              })}
            </tr>
          ))}
        </thead>
        <tbody>
          {table.getRowModel().rows.map((row) => (
            <tr
              key={keyOf ? keyOf(row.original) : row.id}
              className={row.getIsSelected() ? 'bg-wash' : undefined}
            >
              {row.getAllCells().map((cell) => (
                <td key={cell.column.id} className={classOf(cell.column.id)}>
                  <table.FlexRender cell={cell} />
                </td>
              ))}
            </tr>
          ))}
        </tbody>
      </Ledger>
    </div>
  )
}

const HEADER = 'inline-flex min-h-8 items-center gap-1 pointer-coarse:min-h-11'
const ARROW = { 'aria-hidden': true, className: 'size-3.5' } as const
