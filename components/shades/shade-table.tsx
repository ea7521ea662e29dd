'use client'

import {
  useTable,
  type RowSelectionState,
  type SortingState,
  type Updater,
} from '@tanstack/react-table'
import { ArrowDown, ArrowUp } from 'lucide-react'
import { useRouter } from 'next/navigation'
import { useMemo, useOptimistic, useState, useTransition } from 'react'

import { reach } from '@/components/reach'
import { cn } from '@/components/ui/cn'
import { Ledger } from '@/components/ui/ledger'
import { LiveRegion } from '@/components/ui/live-region'
import type { ShadeView } from '@/lib/shades/present'
import { SHADE_LIMITS, type ShadeSort } from '@/lib/shades/constants'
import type { ShadeTableFilter } from '@/lib/shades/schema'

import { ShadeTableContext } from './shade-cells'
import { EDIT_COLUMNS, features, NUMBER_COLUMNS, READ_COLUMNS } from './shade-columns'
import { ShadeFilter } from './shade-filter'
import { type LinePlace, type ShadesActions } from './shades-actions'
import { SelectedShades } from './selected-shades'
import { tableHref } from './table-address'
import { useSaveShade } from './use-save-shade'

/** Props of {@link ShadeTable}. */
export interface ShadeTableProps {
  place: LinePlace
  shades: ShadeView[]
  total: number
  filter: ShadeTableFilter
  /** Whether this person edits; otherwise the table only reads. */
  edits: boolean
  actions: Pick<ShadesActions, 'update' | 'setStatus' | 'reorder' | 'remove' | 'restore'>
}

/** The shades of a line as a ledger: sorted, filtered and paged by the address, edited in place. */
export function ShadeTable({
  place,
  shades,
  total,
  filter: loaded,
  edits,
  actions,
}: ShadeTableProps) {
  const router = useRouter()
  const [loading, startLoading] = useTransition()
  // What was pressed shows at once; the rows follow when the server has them.
  const [filter, showFilter] = useOptimistic(loaded)
  const [rowSelection, setRowSelection] = useState<RowSelectionState>({})
  const save = useSaveShade(place, shades, actions.update)
  const terms = {
    place,
    save,
    move: (shade: ShadeView, typed: string) => {
      const { brand, lineSlug } = place
      return reach(actions.reorder(brand, { lineSlug, shadeIds: [shade.id], place: typed }))
    },
  }
  const go = (change: Partial<ShadeTableFilter>) =>
    startLoading(() => {
      const next = { ...filter, page: 1, ...change }
      showFilter(next)
      router.push(tableHref(place, next) as never, { scroll: false })
    })

  const sorting = useMemo(
    (): SortingState => [{ id: filter.sort, desc: filter.dir === 'desc' }],
    [filter.sort, filter.dir],
  )
  const table = useTable({
    features,
    columns: edits ? EDIT_COLUMNS : READ_COLUMNS,
    data: shades,
    getRowId: (shade) => shade.id,
    manualSorting: true,
    manualFiltering: true,
    manualPagination: true,
    enableSortingRemoval: false,
    enableMultiSort: false,
    rowCount: total,
    state: {
      sorting,
      rowSelection,
      pagination: { pageIndex: filter.page - 1, pageSize: SHADE_LIMITS.tablePage },
    },
    onRowSelectionChange: setRowSelection,
    onSortingChange: (update: Updater<SortingState>) => {
      const [next] = typeof update === 'function' ? update(sorting) : update
      if (next) go({ sort: next.id as ShadeSort, dir: next.desc ? 'desc' : 'asc' })
    },
  })
  const chosen = table.getSelectedRowIds()

  return (
    <div>
      <ShadeFilter filter={filter} onChange={go} />
      <LiveRegion>
        {loading ? 'Loading shades…' : `${total} ${total === 1 ? 'shade fits' : 'shades fit'}.`}
      </LiveRegion>
      {shades.length > 0 ? (
        <div className={cn('mt-3 transition-opacity', loading && 'opacity-60')} aria-busy={loading}>
          {edits ? (
            <p className="mb-1 text-sm text-ink-faint print:hidden">
              Press what you want to change. Enter saves, Escape puts it back.
            </p>
          ) : null}
          <ShadeTableContext value={terms}>
            <Ledger caption="Shades">
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
                          aria-sort={
                            sorted ? (sorted === 'asc' ? 'ascending' : 'descending') : undefined
                          }
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
                  <tr key={row.id} className={row.getIsSelected() ? 'bg-wash' : undefined}>
                    {row.getAllCells().map((cell) => (
                      <td key={cell.id} className={classOf(cell.column.id)}>
                        <table.FlexRender cell={cell} />
                      </td>
                    ))}
                  </tr>
                ))}
              </tbody>
            </Ledger>
          </ShadeTableContext>
        </div>
      ) : null}
      {edits ? (
        <SelectedShades
          place={place}
          actions={actions}
          shadeIds={chosen}
          onClear={() => setRowSelection({})}
        />
      ) : null}
    </div>
  )
}

const HEADER = 'inline-flex min-h-8 items-center gap-1 pointer-coarse:min-h-11'
const ARROW = { 'aria-hidden': true, className: 'size-3.5' } as const

const classOf = (column: string) => {
  if (column === 'select') return 'print:hidden'
  return NUMBER_COLUMNS.includes(column) ? 'number' : undefined
}
