'use client'

import { Status } from '@/components/ui/status'
import { WoundSample } from '@/components/yarn/wound-sample'
import type { ImportPreview, ImportPreviewRow } from '@/lib/shades/present'

import { FileRows, type RowOutcomes } from './file-rows'
import { BeyondScreen, STATUS_WORDS } from './shade-words'

const OUTCOMES: RowOutcomes<ImportPreviewRow['outcome']> = {
  new: { word: 'New', kind: 'draft' },
  changed: { word: 'Changed', kind: 'attention' },
  unchanged: { word: 'Unchanged', kind: 'done' },
  bad: { word: 'Bad', kind: 'problem' },
}

/** The rows of a file of shades with what would become of each. */
export function ImportRows({ preview, fileName }: { preview: ImportPreview; fileName: string }) {
  const { rows, counts, badCsv } = preview
  return (
    <FileRows
      rows={rows}
      counts={counts}
      outcomes={OUTCOMES}
      badCsv={badCsv}
      fileName={fileName}
      head={
        <>
          <th scope="col">Sample</th>
          <th scope="col">Shade</th>
          <th scope="col">What becomes of it</th>
        </>
      }
    >
      {(at) => <PreviewRow key={rows[at]!.row} row={rows[at]!} />}
    </FileRows>
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
