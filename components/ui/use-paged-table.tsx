'use client'

import {
  columnFilteringFeature,
  createColumnHelper,
  rowPaginationFeature,
  rowSelectionFeature,
  rowSortingFeature,
  tableFeatures,
  useTable,
  type ColumnDef,
  type ReactTable,
  type RowSelectionState,
  type SortingState,
  type Updater,
} from '@tanstack/react-table'
import { useRouter } from 'next/navigation'
import { useMemo, useOptimistic, useState, useTransition } from 'react'

import { Checkbox } from './checkbox'

/** What a table does; sorting, filtering and paging are the server's, by the address. */
export const features = tableFeatures({
  rowSortingFeature,
  columnFilteringFeature,
  rowPaginationFeature,
  rowSelectionFeature,
})
type Features = typeof features

/** A column of a table of these rows. */
// eslint-disable-next-line @typescript-eslint/no-explicit-any -- what a cell holds is its own affair
export type TableColumn<Row extends object> = ColumnDef<Features, Row, any>

/** The choice of rows, as a column. */
export function chooseColumn<Row extends object>(words: {
  all: string
  one: (row: Row) => string
}): TableColumn<Row> {
  return createColumnHelper<Features, Row>().display({
    id: 'select',
    header: ({ table }) => (
      <Checkbox
        hideLabel
        label={words.all}
        checked={table.getIsAllRowsSelected()}
        onChange={table.getToggleAllRowsSelectedHandler()}
      />
    ),
    cell: ({ row }) => (
      <Checkbox
        hideLabel
        label={words.one(row.original)}
        checked={row.getIsSelected()}
        disabled={!row.getCanSelect()}
        onChange={row.getToggleSelectedHandler()}
      />
    ),
  })
}

/** How the address of a table says where its reader is. */
interface PagedFilter {
  sort: string
  dir: 'asc' | 'desc'
  page: number
}

/** A table whose rows the server sends page by page. */
export interface PagedTableState<Row extends object, Filter extends PagedFilter> {
  table: ReactTable<Features, Row>
  /** As pressed; the rows follow when the server has them. */
  filter: Filter
  loading: boolean
  /** Narrows, sorts or turns the page; what is not named stays, but the page. */
  go: (change: Partial<Filter>) => void
  /** The ids of the chosen rows, on whichever page they stand. */
  chosen: string[]
  chooseOnly: (ids: readonly string[]) => void
}

/** A table sorted, filtered and paged by the address. Columns must stay the same objects. */
export function usePagedTable<Row extends object, Filter extends PagedFilter>({
  columns,
  rows,
  total,
  perPage,
  filter: loaded,
  idOf,
  canChoose,
  hrefOf,
}: {
  columns: readonly TableColumn<Row>[]
  rows: Row[]
  /** On all pages together. */
  total: number
  perPage: number
  filter: Filter
  idOf: (row: Row) => string
  canChoose?: (row: Row) => boolean
  hrefOf: (filter: Filter) => string
}): PagedTableState<Row, Filter> {
  const router = useRouter()
  const [loading, startLoading] = useTransition()
  const [filter, showFilter] = useOptimistic(loaded)
  const [rowSelection, setRowSelection] = useState<RowSelectionState>({})
  const go = (change: Partial<Filter>) =>
    startLoading(() => {
      const next = { ...filter, page: 1, ...change }
      showFilter(next)
      router.push(hrefOf(next) as never, { scroll: false })
    })
  const sorting = useMemo(
    (): SortingState => [{ id: filter.sort, desc: filter.dir === 'desc' }],
    [filter.sort, filter.dir],
  )
  const table = useTable({
    features,
    columns,
    data: rows,
    getRowId: idOf,
    enableRowSelection: canChoose ? ({ original }) => canChoose(original) : true,
    manualSorting: true,
    manualFiltering: true,
    manualPagination: true,
    enableSortingRemoval: false,
    enableMultiSort: false,
    rowCount: total,
    state: {
      sorting,
      rowSelection,
      pagination: { pageIndex: filter.page - 1, pageSize: perPage },
    },
    onRowSelectionChange: setRowSelection,
    onSortingChange: (update: Updater<SortingState>) => {
      const [next] = typeof update === 'function' ? update(sorting) : update
      if (next) go({ sort: next.id, dir: next.desc ? 'desc' : 'asc' } as Partial<Filter>)
    },
  })
  return {
    table,
    filter,
    loading,
    go,
    chosen: table.getSelectedRowIds(),
    chooseOnly: (ids) => setRowSelection(Object.fromEntries(ids.map((id) => [id, true]))),
  }
}
