'use client'

import { Lock, X } from 'lucide-react'
import { useEffect, useRef } from 'react'

import { cn } from '@/components/ui/cn'
import { IconButton } from '@/components/ui/icon-button'
import { WoundSample } from '@/components/yarn/wound-sample'
import type { ShadeView } from '@/lib/shades/present'

import type { DraftPlace } from './draft'
import { placeInWords } from './draft-words'
import { usePlaceDrop } from './editor-drag'
import type { ShadeOf } from './shade-of'

/**
 * What is held, and the five places to put it in, at the lower edge of the window, where a thumb
 * is. The keyboard comes here when something is taken up; Escape puts it back.
 */
export function HandBar({
  shade,
  from,
  places,
  shadeOf,
  dragging,
  onPut,
  onGiveUp,
}: {
  shade: ShadeView
  /** The place it stands in (from 0); -1 for none. */
  from: number
  places: readonly DraftPlace[]
  shadeOf: ShadeOf
  /** It hangs at the pointer: the places are for dropping. */
  dragging: boolean
  onPut: (place: number) => void
  onGiveUp: () => void
}) {
  const first = useRef<HTMLDivElement>(null)
  useEffect(() => {
    if (!dragging) {
      first.current?.querySelector<HTMLButtonElement>('button:not(:disabled)')?.focus()
    }
  }, [dragging])
  return (
    <div className="fixed inset-x-0 bottom-0 z-40 border-t border-rule bg-sheet px-3 pt-2 pb-[max(0.75rem,env(safe-area-inset-bottom))] margins:left-[14.5rem] print:hidden">
      <div role="group" aria-label={`Where ${shade.label} goes`} className="mx-auto max-w-2xl">
        <div className="mb-1 flex items-center justify-between gap-3">
          <p className="min-w-0 truncate">
            <span className="font-title">{shade.label}</span>: choose a place
          </p>
          {dragging ? null : (
            <IconButton label={`Leave ${shade.label}`} icon={<X />} onClick={onGiveUp} />
          )}
        </div>
        <div ref={first} className="grid grid-cols-5 gap-1 sm:gap-2">
          {places.map((place, at) => (
            <PlaceTarget
              key={at}
              at={at}
              place={place}
              held={shadeOf(place.shadeId)}
              name={shade.label}
              here={at === from}
              onPut={onPut}
            />
          ))}
        </div>
      </div>
    </div>
  )
}

function PlaceTarget({
  at,
  place: { role, locked },
  held,
  name,
  here,
  onPut,
}: {
  at: number
  place: DraftPlace
  held: ShadeView | null
  name: string
  here: boolean
  onPut: (place: number) => void
}) {
  const { setNode, isOver } = usePlaceDrop(at, 'hand', locked)
  const stands = locked ? `${held?.label ?? 'empty'}, locked` : (held?.label ?? 'empty')
  return (
    <button
      ref={setNode}
      type="button"
      aria-label={`Put ${name} in ${placeInWords(at)}: ${stands}`}
      disabled={locked || here}
      onClick={() => onPut(at)}
      className={cn(
        'flex min-h-14 min-w-0 flex-col items-center rounded border border-rule px-1 py-1 text-sm',
        'enabled:hover:border-ink enabled:hover:bg-wash disabled:border-hairline disabled:text-ink-faint',
        isOver && 'outline-focus border-ink bg-wash outline-2',
      )}
    >
      <span className="flex items-center gap-1">
        {at + 1} · {role}
        {locked ? <Lock aria-hidden="true" className="size-3.5" /> : null}
      </span>
      {held ? (
        <WoundSample hex={held.hex} className="h-6 w-auto max-w-full" />
      ) : (
        <span className="text-ink-faint">empty</span>
      )}
      <span className="hidden w-full truncate sm:block">{held?.label}</span>
    </button>
  )
}
