'use client'

import { useRef, useState } from 'react'

import { reach } from '@/components/reach'
import { LiveRegion } from '@/components/ui/live-region'
import { PagedTable } from '@/components/ui/paged-table'
import { usePagedTable } from '@/components/ui/use-paged-table'
import { useSaveInTurn } from '@/components/use-save-in-turn'
import type { ActionResult } from '@/lib/errors'
import type { FamilyView } from '@/lib/families/present'
import { NAME_LIMITS } from '@/lib/names/constants'
import type { NameRow } from '@/lib/names/present'
import type { NameListFilter } from '@/lib/names/schema'

import { Findings } from './findings'
import type { ListActions } from './list-actions'
import { listHref } from './list-address'
import { findingsId, ListContext } from './list-cells'
import { ChosenNames } from './list-chosen'
import { LIST_COLUMNS } from './list-columns'
import { ListFilter } from './list-filter'
import type { NamesPlace } from './names-place'

/** Columns that a phone has no room for; it shows them under the name, or to narrow by. */
const UNDER_NAME: readonly string[] = ['state', 'checks', 'family']
const BULK_MOVES = ['send', 'recall', 'put-by'] as const

/** The shades of a line with their names as a ledger: narrowed, sorted and paged by the address. */
export function NamesTable({
  place,
  rows,
  total,
  filter: loaded,
  families,
  actions,
}: {
  place: NamesPlace
  rows: NameRow[]
  total: number
  filter: NameListFilter
  families: readonly Pick<FamilyView, 'id' | 'name'>[]
  actions: ListActions
}) {
  const { table, filter, loading, go, chosen, chooseOnly } = usePagedTable({
    columns: LIST_COLUMNS,
    rows,
    total,
    perPage: NAME_LIMITS.page,
    filter: loaded,
    // What is chosen are ideas: that is what moves.
    idOf: ({ id, idea }) => idea?.id ?? id,
    canChoose: ({ idea }) => BULK_MOVES.some((move) => idea?.moves.includes(move)),
    hrefOf: (next) => listHref(place, next),
  })
  const save = useSaveName(place, rows, actions)
  const [opened, setOpened] = useState<ReadonlySet<string>>(new Set())
  const toggle = (shadeId: string) => {
    const next = new Set(opened)
    if (!next.delete(shadeId)) next.add(shadeId)
    setOpened(next)
  }
  return (
    <div>
      <ListFilter filter={filter} families={families} onChange={go} />
      <LiveRegion>
        {loading ? 'Loading names…' : `${total} ${total === 1 ? 'shade fits' : 'shades fit'}.`}
      </LiveRegion>
      {rows.length > 0 ? (
        <ListContext value={{ place, save, opened, toggle }}>
          <PagedTable
            table={table}
            caption="Names"
            hint="Press a name to write it. Enter saves, Escape puts it back."
            loading={loading}
            keyOf={({ id }) => id}
            classOf={(column) => (UNDER_NAME.includes(column) ? 'max-sm:hidden' : undefined)}
            detailOf={(row) => (opened.has(row.id) ? <Detail row={row} /> : null)}
          />
        </ListContext>
      ) : null}
      <ChosenNames place={place} actions={actions} ideaIds={chosen} onChoose={chooseOnly} />
    </div>
  )
}

/** What the checks found about a row's name; it opens under the row. */
function Detail({ row }: { row: NameRow }) {
  if (!row.idea?.findings) return null
  const { findings, wordingReason } = row.idea
  return (
    <div id={findingsId(row)} className="space-y-3 pb-2">
      <Findings findings={findings} />
      {wordingReason ? <p className="text-sm text-ink-soft">It stands: {wordingReason}</p> : null}
    </div>
  )
}

/** A row, as far as its name is saved. */
interface Named {
  id: string
  idea: { id: string; version: number } | null
}

/** Saves what is typed for a shade: as a new draft, or as the words of the one it has. */
function useSaveName(
  { brand, lineSlug }: NamesPlace,
  rows: readonly NameRow[],
  { add, edit }: Pick<ListActions, 'add' | 'edit'>,
): (row: NameRow, text: string) => Promise<ActionResult<unknown>> {
  const saveInTurn = useSaveInTurn<Named>(rows)
  /** The key of each new draft: what is sent again after a lost answer is the same submit. */
  const keys = useRef(new Map<string, string>())
  const keyOf = (what: string) => {
    if (!keys.current.has(what)) keys.current.set(what, crypto.randomUUID())
    return keys.current.get(what)!
  }
  return (row, text) =>
    saveInTurn(row, async ({ id, idea }) => {
      const answer = await reach(
        idea
          ? edit(brand, { lineSlug, ideaId: idea.id, version: idea.version, text })
          : add(brand, { lineSlug, shadeId: id, text, requestKey: keyOf(`${id} ${text}`) }),
      )
      if (!answer.ok) return answer
      const { ideaId, version } = answer.data
      return { ok: true, data: { id, idea: { id: ideaId, version } } }
    })
}
