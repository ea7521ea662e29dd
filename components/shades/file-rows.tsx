'use client'

import { Download } from 'lucide-react'
import { useState, type ReactNode } from 'react'

import { Button } from '@/components/ui/button'
import { Ledger } from '@/components/ui/ledger'
import { SegmentedControl } from '@/components/ui/radio-group'
import type { StatusKind } from '@/components/ui/status'

/** What may become of a row, as it is shown; `bad` are those that are shown first. */
export type RowOutcomes<Outcome extends string> = Record<
  Outcome,
  { word: string; kind: StatusKind }
>

const PER_PAGE = 50

/** The rows of a file with what would become of each, narrowed to one outcome, page by page. */
export function FileRows<Outcome extends string>({
  rows: all,
  counts,
  outcomes,
  badCsv,
  fileName,
  head,
  children,
}: {
  rows: readonly { row: number; outcome: Outcome }[]
  counts: Record<Outcome, number>
  outcomes: RowOutcomes<Outcome>
  /** The bad rows with their reasons; null when there is none. */
  badCsv: string | null
  fileName: string
  /** The heads of the columns after that of the row. */
  head: ReactNode
  /** The row of the table at this place among `rows`. */
  children: (at: number) => ReactNode
}) {
  const names = Object.keys(outcomes) as Outcome[]
  const [shown, setShown] = useState<string>(badCsv === null ? 'all' : 'bad')
  const [page, setPage] = useState(0)
  // A kind that a new choice of columns emptied is no longer offered.
  const kind = names.find((name) => name === shown && counts[name] > 0) ?? 'all'
  const places = all.flatMap(({ outcome }, at) => (kind === 'all' || outcome === kind ? [at] : []))
  const pages = Math.max(1, Math.ceil(places.length / PER_PAGE))
  const at = Math.min(page, pages - 1)
  const first = at * PER_PAGE
  const visible = places.slice(first, first + PER_PAGE)

  return (
    <>
      <div className="flex flex-wrap items-center justify-between gap-3">
        <SegmentedControl
          legend="Rows shown"
          hideLegend
          value={kind as string}
          onValueChange={(next) => {
            setShown(next)
            setPage(0)
          }}
          options={[
            { value: 'all', label: `All ${all.length}` },
            ...names.map((name) => ({
              value: name as string,
              label: `${outcomes[name].word} ${counts[name]}`,
              disabled: counts[name] === 0,
            })),
          ]}
        />
        {badCsv ? (
          <Button
            size="small"
            icon={<Download aria-hidden="true" />}
            onClick={() => keep(badCsv, `bad-rows-${fileName.replace(/\.\w+$/, '')}.csv`)}
          >
            Download bad rows
          </Button>
        ) : null}
      </div>
      <Ledger caption="Rows of the file" className="mt-3">
        <thead>
          <tr>
            <th scope="col" className="number">
              Row
            </th>
            {head}
          </tr>
        </thead>
        <tbody>{visible.map(children)}</tbody>
      </Ledger>
      {pages > 1 ? (
        <nav aria-label="Pages of rows" className="mt-3 flex flex-wrap items-center gap-3">
          <Button size="small" disabled={at === 0} onClick={() => setPage(at - 1)}>
            Previous rows
          </Button>
          <Button size="small" disabled={at === pages - 1} onClick={() => setPage(at + 1)}>
            Next rows
          </Button>
          <p className="text-sm text-ink-faint">
            {first + 1}–{first + visible.length} of {places.length}
          </p>
        </nav>
      ) : null}
    </>
  )
}

/** Hands a text to the browser to keep as a file. */
function keep(text: string, name: string) {
  const url = URL.createObjectURL(new Blob([text], { type: 'text/csv;charset=utf-8' }))
  const link = document.createElement('a')
  link.href = url
  link.download = name
  link.click()
  URL.revokeObjectURL(url)
}
