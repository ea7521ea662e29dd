'use client'

import {
  useTable,
  type RowSelectionState,
  type SortingState,
  type Updater,
} from '@tanstack/react-table'
import { ArrowDown, ArrowUp } from 'lucide-react'
import { useRouter } from 'next/navigation'
import { useMemo, useState, useTransition } from 'react'

import { reach } from '@/components/reach'
import { cn } from '@/components/ui/cn'
import { Ledger } from '@/components/ui/ledger'
import { LiveRegion } from '@/components/ui/live-region'
import type { ShadeView } from '@/lib/shades/present'
import { SHADE_LIMITS, type ShadeSort, type ShadeTableFilter } from '@/lib/shades/schema'

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
export function ShadeTable({ place, shades, total, filter, edits, actions }: ShadeTableProps) {
  const router = useRouter()
  const [loading, startLoading] = useTransition()
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
  const go = (next: Partial<ShadeTableFilter>) =>
    startLoading(() => {
      router.push(tableHref(place, { ...filter, page: 1, ...next }) as never, { scroll: false })
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
      {edits ? (
        <SelectedShades
          place={place}
          actions={actions}
          shadeIds={chosen}
          onClear={() => setRowSelection({})}
        />
      ) : null}
      {shades.length > 0 ? (
        <div className={cn('mt-4 transition-opacity', loading && 'opacity-60')} aria-busy={loading}>
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
                              className="inline-flex min-h-8 items-center gap-1 hover:text-ink hover:underline pointer-coarse:min-h-11"
                            >
                              <table.FlexRender header={header} />
                              {sorted === 'asc' ? (
                                <ArrowUp aria-hidden className="size-3.5" />
                              ) : null}
                              {sorted === 'desc' ? (
                                <ArrowDown aria-hidden className="size-3.5" />
                              ) : null}
                            </button>
                          ) : (
                            <table.FlexRender header={header} />
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
    </div>
  )
}

const classOf = (column: string) => (NUMBER_COLUMNS.includes(column) ? 'number' : undefined)
