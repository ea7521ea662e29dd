import { Button } from '@/components/ui/button'
import { Notice } from '@/components/ui/notice'

/** A field that the other person saved differently from what stands in the form. */
export interface DifferingField {
  label: string
  theirs: string
  mine: string
}

/** What somebody else saved meanwhile, beside what was typed here, and the choice. */
export function DetailsConflict({
  fields,
  pending,
  onTakeTheirs,
  onKeepMine,
}: {
  fields: readonly DifferingField[]
  pending: boolean
  onTakeTheirs: () => void
  onKeepMine: () => void
}) {
  return (
    <Notice
      kind="error"
      title="Somebody else saved this photograph while you were typing"
      actions={
        <>
          <Button size="small" disabled={pending} onClick={onTakeTheirs}>
            Take theirs
          </Button>
          <Button size="small" pending={pending} pendingLabel="Saving yours…" onClick={onKeepMine}>
            Keep mine
          </Button>
        </>
      }
    >
      <p>
        What you typed is still here. Keep mine saves what you changed over theirs; whatever you did
        not touch stays as they left it.
      </p>
      <dl className="mt-2 space-y-2">
        {fields.map(({ label, theirs, mine }) => (
          <div key={label}>
            <dt className="font-semibold text-ink">{label}</dt>
            <dd>Theirs: {theirs || 'left empty'}</dd>
            <dd>Yours: {mine || 'left empty'}</dd>
          </div>
        ))}
      </dl>
    </Notice>
  )
}
