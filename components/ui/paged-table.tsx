'use client'

import type { ReactTable } from '@tanstack/react-table'
import { ArrowDown, ArrowUp } from 'lucide-react'
import { Fragment, type ReactNode } from 'react'

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
  detailOf,
  classOf: classOfColumn,
}: {
  table: ReactTable<typeof features, Row>
  caption: string
  /** How its cells are edited. */
  hint?: ReactNode
  loading: boolean
  /** What a row is known by while its id may change; its id by default. */
  keyOf?: (row: Row) => string
  /** What stands under a row; null for nothing. */
  detailOf?: (row: Row) => ReactNode
  /** How the cells of a column stand: "number" for the right, by the column's id. */
  classOf?: (column: string) => string | undefined
}) {
  const classOf = (column: string) =>
    column === 'select' ? 'print:hidden' : classOfColumn?.(column)
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
          {table.getRowModel().rows.map((row) => {
            const detail = detailOf?.(row.original)
            const cells = row.getAllCells()
            return (
              <Fragment key={keyOf ? keyOf(row.original) : row.id}>
                <tr
                  className={cn(
                    row.getIsSelected() && 'bg-wash',
                    Boolean(detail) && '[&>td]:border-b-transparent',
                  )}
                >
                  {cells.map((cell) => (
                    <td key={cell.column.id} className={classOf(cell.column.id)}>
                      <table.FlexRender cell={cell} />
                    </td>
                  ))}
                </tr>
                {detail ? (
                  <tr>
                    <td colSpan={cells.length}>
                      {/* Where the table is wider than the window, it stays in sight. */}
                      <div className="sticky left-0 w-fit max-w-[calc(100vw-2rem)]">{detail}</div>
                    </td>
                  </tr>
                ) : null}
              </Fragment>
            )
          })}
        </tbody>
      </Ledger>
    </div>
  )
}

const HEADER = 'inline-flex min-h-8 items-center gap-1 pointer-coarse:min-h-11'
const ARROW = { 'aria-hidden': true, className: 'size-3.5' } as const
