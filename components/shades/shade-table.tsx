'use client'

import { reach } from '@/components/reach'
import { LiveRegion } from '@/components/ui/live-region'
import { PagedTable } from '@/components/ui/paged-table'
import { usePagedTable } from '@/components/ui/use-paged-table'
import type { ShadeView } from '@/lib/shades/present'
import { SHADE_LIMITS } from '@/lib/shades/constants'
import type { ShadeTableFilter } from '@/lib/shades/schema'

import { ShadeTableContext } from './shade-cells'
import { EDIT_COLUMNS, NUMBER_COLUMNS, READ_COLUMNS } from './shade-columns'
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
  /** Whether this person sees the ideas for names. */
  seesIdeas: boolean
  actions: Pick<ShadesActions, 'update' | 'setStatus' | 'reorder' | 'remove' | 'restore'>
}

/** The shades of a line as a ledger: sorted, filtered and paged by the address, edited in place. */
export function ShadeTable({
  place,
  shades,
  total,
  filter: loaded,
  edits,
  seesIdeas,
  actions,
}: ShadeTableProps) {
  const { table, filter, loading, go, chosen, chooseOnly } = usePagedTable({
    columns: edits ? EDIT_COLUMNS : READ_COLUMNS,
    rows: shades,
    total,
    perPage: SHADE_LIMITS.tablePage,
    filter: loaded,
    idOf: ({ id }) => id,
    hrefOf: (next) => tableHref(place, next),
  })
  const save = useSaveShade(place, shades, actions.update)
  const terms = {
    place,
    seesIdeas,
    save,
    move: (shade: ShadeView, typed: string) => {
      const { brand, lineSlug } = place
      return reach(actions.reorder(brand, { lineSlug, shadeIds: [shade.id], place: typed }))
    },
  }
  return (
    <div>
      <ShadeFilter filter={filter} onChange={go} />
      <LiveRegion>
        {loading ? 'Loading shades…' : `${total} ${total === 1 ? 'shade fits' : 'shades fit'}.`}
      </LiveRegion>
      {shades.length > 0 ? (
        <ShadeTableContext value={terms}>
          <PagedTable
            table={table}
            caption="Shades"
            hint={edits ? 'Press what you want to change. Enter saves, Escape puts it back.' : null}
            loading={loading}
            classOf={(column) => (NUMBER_COLUMNS.includes(column) ? 'number' : undefined)}
          />
        </ShadeTableContext>
      ) : null}
      {edits ? (
        <SelectedShades
          place={place}
          actions={actions}
          shadeIds={chosen}
          onClear={() => chooseOnly([])}
        />
      ) : null}
    </div>
  )
}
