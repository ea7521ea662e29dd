import { Button } from '@/components/ui/button'
import { Notice } from '@/components/ui/notice'

import type { CombinationDraft } from './draft'
import type { DraftPart } from './draft-merge'
import { heldInWords, partInWords, type Names } from './draft-words'

/** What both changed, field by field and place by place, and the choice. */
export function ConflictNotice({
  parts,
  mine,
  theirs,
  names,
  onChoose,
}: {
  parts: readonly DraftPart[]
  mine: CombinationDraft
  theirs: CombinationDraft
  names: Names
  onChoose: (preferred: 'mine' | 'theirs') => void
}) {
  return (
    <Notice
      kind="error"
      className="mb-6 print:hidden"
      title="Somebody else changed the same, and saved first"
      actions={
        <>
          <Button size="small" onClick={() => onChoose('theirs')}>
            Take theirs
          </Button>
          <Button size="small" onClick={() => onChoose('mine')}>
            Keep mine
          </Button>
        </>
      }
    >
      <p>
        Yours is still here and not saved. Whatever only one of you changed is in already; choose
        for the rest. Undo brings yours back after you take theirs.
      </p>
      <table className="mt-2 text-ink">
        <thead>
          <tr className="text-left text-sm text-ink-faint">
            <td />
            <th scope="col" className="py-1 pr-5 font-normal">
              Theirs
            </th>
            <th scope="col" className="py-1 font-normal">
              Yours
            </th>
          </tr>
        </thead>
        <tbody>
          {parts.map((part) => (
            <tr key={part} className="border-t border-hairline align-top">
              <th scope="row" className="py-1 pr-5 text-left font-semibold whitespace-nowrap">
                {partInWords(part)}
              </th>
              <td className="py-1 pr-5">{heldInWords(theirs, part, names)}</td>
              <td className="py-1">{heldInWords(mine, part, names)}</td>
            </tr>
          ))}
        </tbody>
      </table>
    </Notice>
  )
}
