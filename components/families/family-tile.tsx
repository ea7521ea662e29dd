'use client'

import { useDraggable } from '@dnd-kit/core'
import { Check, Pin } from 'lucide-react'
import type { KeyboardEvent } from 'react'

import { cn } from '@/components/ui/cn'
import { WoundSample } from '@/components/yarn/wound-sample'
import type { ShadeView } from '@/lib/shades/present'

/** What a tile says of its shade. */
function TileWords({ shade }: { shade: ShadeView }) {
  return (
    <>
      <span className="mt-1 block leading-snug break-words">{shade.label}</span>
      <span className="flex flex-wrap items-center gap-x-1.5 text-sm text-ink-soft">
        {shade.name ? <span>No. {shade.number}</span> : null}
        {shade.status === 'retired' ? <span>retired</span> : null}
        {shade.familyPinned ? (
          <span className="inline-flex items-center gap-1">
            <Pin aria-hidden="true" className="size-3.5" />
            pinned
          </span>
        ) : null}
      </span>
    </>
  )
}

/** A shade in its family, only to be looked at. */
export function StillTile({ shade }: { shade: ShadeView }) {
  return (
    <div className="p-1.5">
      <WoundSample hex={shade.hex} className="h-auto max-w-full" />
      <TileWords shade={shade} />
    </div>
  )
}

/** A shade in its family: pressed it is chosen, dragged it goes to another family. */
export function FamilyTile({
  shade,
  chosen,
  onChoose,
  onKey,
}: {
  shade: ShadeView
  chosen: boolean
  onChoose: () => void
  onKey: (event: KeyboardEvent) => void
}) {
  const { setNodeRef, listeners, isDragging } = useDraggable({ id: shade.id })
  return (
    <button
      type="button"
      ref={setNodeRef}
      {...listeners}
      aria-pressed={chosen}
      onClick={onChoose}
      onKeyDown={onKey}
      className={cn(
        'relative flex size-full touch-manipulation scroll-mb-40 flex-col items-start rounded border-2 p-1.5 text-left',
        chosen ? 'border-woad bg-wash' : 'border-transparent hover:border-hairline',
        isDragging && 'opacity-40',
      )}
    >
      <WoundSample hex={shade.hex} className="h-auto max-w-full" />
      {chosen ? (
        <span className="absolute top-1 right-1 inline-flex size-5 items-center justify-center rounded bg-woad text-on-woad">
          <Check aria-hidden="true" className="size-3.5" strokeWidth={3} />
        </span>
      ) : null}
      <TileWords shade={shade} />
    </button>
  )
}

/** A shade on its way, and how many go with it. */
export function CarriedTile({ shade, count }: { shade: ShadeView; count: number }) {
  return (
    <div className="shadow-drag w-28 rounded border border-rule bg-sheet p-1.5">
      <WoundSample hex={shade.hex} />
      <span className="mt-1 block leading-snug break-words">
        {count > 1 ? `${count} shades` : shade.label}
      </span>
    </div>
  )
}
