'use client'

import { FileRows, type RowOutcomes } from '@/components/shades/file-rows'
import { Status } from '@/components/ui/status'
import { WoundSample } from '@/components/yarn/wound-sample'
import type { IdeaRowView, IdeasPreview } from '@/lib/names/present'

const OUTCOMES: RowOutcomes<IdeaRowView['outcome']> = {
  new: { word: 'New', kind: 'draft' },
  there: { word: 'There already', kind: 'attention' },
  bad: { word: 'Bad', kind: 'problem' },
}

/** The rows of a pile of names with what would become of each. */
export function HeapRows({ preview, fileName }: { preview: IdeasPreview; fileName: string }) {
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
          <th scope="col">Name</th>
          <th scope="col">Goes to</th>
          <th scope="col">What becomes of it</th>
        </>
      }
    >
      {(at) => <PreviewRow key={rows[at]!.row} row={rows[at]!} />}
    </FileRows>
  )
}

function PreviewRow({
  row: { row, outcome, text, note, shade, where, errors },
}: {
  row: IdeaRowView
}) {
  const { word, kind } = OUTCOMES[outcome]
  return (
    <tr>
      <td className="number text-ink-faint">{row}</td>
      <td className="max-w-80 min-w-40 wrap-anywhere">
        <span className="font-title">{text}</span>
        {note ? <span className="block text-sm text-ink-soft">{note}</span> : null}
      </td>
      <td className="whitespace-nowrap">
        {outcome === 'bad' ? null : shade ? (
          <span className="flex items-center gap-2">
            <WoundSample hex={shade.hex} className="h-9 w-auto" />
            {shade.label}
          </span>
        ) : (
          'The heap'
        )}
      </td>
      <td className="min-w-44">
        <Status kind={kind}>{word}</Status>
        <ul className="text-sm text-ink-soft">
          {errors.map((words) => (
            <li key={words}>{words}</li>
          ))}
          {where ? <li>{where}</li> : null}
        </ul>
      </td>
    </tr>
  )
}
