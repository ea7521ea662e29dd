'use client'

import { Download } from 'lucide-react'
import { useState } from 'react'

import { Button } from '@/components/ui/button'
import { Ledger } from '@/components/ui/ledger'
import { SegmentedControl } from '@/components/ui/radio-group'
import { Status, type StatusKind } from '@/components/ui/status'
import { WoundSample } from '@/components/yarn/wound-sample'
import type { ImportPreview, ImportPreviewRow } from '@/lib/shades/present'

import { BeyondScreen, STATUS_WORDS } from './shade-words'

type Outcome = ImportPreviewRow['outcome']

const OUTCOMES: Record<Outcome, { word: string; kind: StatusKind }> = {
  new: { word: 'New', kind: 'draft' },
  changed: { word: 'Changed', kind: 'attention' },
  unchanged: { word: 'Unchanged', kind: 'done' },
  bad: { word: 'Bad', kind: 'problem' },
}
const NAMES = Object.keys(OUTCOMES) as Outcome[]
const PER_PAGE = 50

/** The rows of a file with what would become of each, page by page. */
export function ImportRows({ preview, fileName }: { preview: ImportPreview; fileName: string }) {
  const { counts, badCsv } = preview
  const [shown, setShown] = useState<Outcome | 'all'>(counts.bad > 0 ? 'bad' : 'all')
  const [page, setPage] = useState(0)
  // A kind that a new choice of columns emptied is no longer offered.
  const kind = shown !== 'all' && counts[shown] === 0 ? 'all' : shown
  const rows =
    kind === 'all' ? preview.rows : preview.rows.filter(({ outcome }) => outcome === kind)
  const pages = Math.max(1, Math.ceil(rows.length / PER_PAGE))
  const at = Math.min(page, pages - 1)
  const first = at * PER_PAGE
  const visible = rows.slice(first, first + PER_PAGE)

  return (
    <>
      <div className="flex flex-wrap items-center justify-between gap-3">
        <SegmentedControl
          legend="Rows shown"
          hideLegend
          value={kind}
          onValueChange={(next) => {
            setShown(next)
            setPage(0)
          }}
          options={[
            { value: 'all' as const, label: `All ${preview.rows.length}` },
            ...NAMES.map((name) => ({
              value: name,
              label: `${OUTCOMES[name].word} ${counts[name]}`,
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
            <th scope="col">Sample</th>
            <th scope="col">Shade</th>
            <th scope="col">What becomes of it</th>
          </tr>
        </thead>
        <tbody>
          {visible.map((row) => (
            <PreviewRow key={row.row} row={row} />
          ))}
        </tbody>
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
            {first + 1}–{first + visible.length} of {rows.length}
          </p>
        </nav>
      ) : null}
    </>
  )
}

function PreviewRow({ row }: { row: ImportPreviewRow }) {
  const { word, kind } = OUTCOMES[row.outcome]
  return (
    <tr>
      <td className="number text-ink-faint">{row.row}</td>
      <td>{row.color ? <WoundSample hex={row.color.hex} className="h-9 w-auto" /> : null}</td>
      <td>
        <span className="font-title">{row.name ?? (row.number ? `No. ${row.number}` : '')}</span>
        <span className="block text-sm text-ink-faint">
          {[row.name && row.number && `No. ${row.number}`, row.status && STATUS_WORDS[row.status]]
            .filter(Boolean)
            .join(' · ')}
        </span>
      </td>
      <td className="min-w-56">
        <Status kind={kind}>{word}</Status>
        <ul className="text-sm text-ink-soft">
          {[...row.errors, ...row.changes].map((words) => (
            <li key={words}>{words}</li>
          ))}
          {row.outcome === 'new' && row.color ? <li>{row.color.words}</li> : null}
          {row.note ? <li>{row.note}</li> : null}
        </ul>
        {row.color && !row.color.inGamut ? <BeyondScreen /> : null}
      </td>
    </tr>
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
