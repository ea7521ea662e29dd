import { Button } from '@/components/ui/button'
import { Status } from '@/components/ui/status'
import { WoundSample } from '@/components/yarn/wound-sample'
import type { DealtShadeView } from '@/lib/names/present'

/** What became of a proposal. */
export type Fate = 'laid' | 'left'

/** How well a name suits, from its fit of 0–1. */
const suits = (fit: number): string =>
  fit >= 0.6 ? 'Suits it well.' : fit >= 0.35 ? 'Suits it.' : 'Suits it loosely.'

/** A shade of the page with the name proposed for it, if it waits for one. */
export function DealtShade({
  shade: { number, label, hex, waits, dealt },
  fate,
  pending,
  onAccept,
  onTakeBack,
  onLeave,
  onPropose,
}: {
  shade: DealtShadeView
  fate: Fate | undefined
  pending: boolean
  onAccept: (ideaId: string) => void
  onTakeBack: (ideaId: string) => void
  onLeave: (ideaId: string) => void
  onPropose: (ideaId: string) => void
}) {
  const sample = <WoundSample hex={hex} size="card" className="h-auto w-full max-w-37" />
  if (!dealt) {
    return (
      <li className="min-w-0">
        {sample}
        <p className="mt-1.5 font-title leading-snug break-words text-ink-soft">{label}</p>
        <p className="text-sm text-ink-faint">
          {waits ? 'No idea suits it.' : label === `No. ${number}` ? 'In review.' : `No. ${number}`}
        </p>
      </li>
    )
  }
  const { ideaId, text, note, fit, why } = dealt
  return (
    <li className="min-w-0">
      {sample}
      <p
        className={`mt-1.5 font-title text-lg leading-snug break-words ${fate === 'left' ? 'line-through decoration-1' : ''}`}
      >
        {text}
      </p>
      <p className="text-sm text-ink-soft">No. {number}</p>
      {note ? <p className="mt-1 text-sm break-words">{note}</p> : null}
      <p className="mt-1 text-sm text-ink-soft">
        {suits(fit)} {why}
      </p>
      <div className="mt-2 flex flex-wrap items-center gap-2">
        {fate === undefined ? (
          <>
            <Button
              size="small"
              pending={pending}
              aria-label={`Accept ${text} for No. ${number}`}
              onClick={() => onAccept(ideaId)}
            >
              Accept name
            </Button>
            <Button
              size="small"
              variant="quiet"
              aria-label={`Leave ${text} in the heap`}
              onClick={() => onLeave(ideaId)}
            >
              Leave it
            </Button>
          </>
        ) : (
          <>
            <Status kind={fate === 'laid' ? 'done' : 'none'}>
              {fate === 'laid' ? 'Laid on it' : 'Stays in the heap'}
            </Status>
            <Button
              size="small"
              variant="quiet"
              pending={pending}
              aria-label={
                fate === 'laid' ? `Take ${text} back to the heap` : `Propose ${text} again`
              }
              onClick={() => (fate === 'laid' ? onTakeBack(ideaId) : onPropose(ideaId))}
            >
              {fate === 'laid' ? 'Take it back' : 'Propose it again'}
            </Button>
          </>
        )}
      </div>
    </li>
  )
}
