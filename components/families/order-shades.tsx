'use client'

import {
  closestCenter,
  DndContext,
  KeyboardSensor,
  PointerSensor,
  useSensor,
  useSensors,
  type Announcements,
  type DragEndEvent,
  type UniqueIdentifier,
} from '@dnd-kit/core'
import {
  arrayMove,
  SortableContext,
  sortableKeyboardCoordinates,
  useSortable,
  verticalListSortingStrategy,
} from '@dnd-kit/sortable'
import { CSS } from '@dnd-kit/utilities'
import { ArrowDown, ArrowUp, GripVertical } from 'lucide-react'
import { useId, useState } from 'react'

import { Button } from '@/components/ui/button'
import { IconButton } from '@/components/ui/icon-button'
import { LedgerList } from '@/components/ui/ledger'
import { WoundSample } from '@/components/yarn/wound-sample'
import type { FamilyWithShades } from '@/lib/families/present'
import type { ShadeView } from '@/lib/shades/present'

/** The shades of a family, to be put in an order of one's own, or back from light to dark. */
export function OrderShades({
  family,
  onSave,
  onLeave,
}: {
  family: FamilyWithShades
  /** Null is light to dark. */
  onSave: (shadeIds: string[] | null) => void
  onLeave: () => void
}) {
  const id = useId()
  const [shades, setShades] = useState(family.shades)
  const sensors = useSensors(
    useSensor(PointerSensor),
    useSensor(KeyboardSensor, { coordinateGetter: sortableKeyboardCoordinates }),
  )
  const ids = shades.map((shade) => shade.id)
  const label = (shadeId: UniqueIdentifier) =>
    shades.find((shade) => shade.id === shadeId)?.label ?? ''
  const stands = (shadeId: UniqueIdentifier) =>
    `place ${ids.indexOf(String(shadeId)) + 1} of ${ids.length}`
  const move = (from: number, to: number) => setShades(arrayMove(shades, from, to))

  const announcements: Announcements = {
    onDragStart: ({ active }) => `${label(active.id)} taken up, ${stands(active.id)}.`,
    onDragOver: ({ active, over }) =>
      over ? `${label(active.id)}, ${stands(over.id)}` : undefined,
    onDragEnd: ({ active, over }) =>
      `${label(active.id)} put down, ${stands(over?.id ?? active.id)}.`,
    onDragCancel: ({ active }) => `${label(active.id)} is back where it was.`,
  }

  function onDragEnd({ active, over }: DragEndEvent) {
    if (over && over.id !== active.id) {
      move(ids.indexOf(String(active.id)), ids.indexOf(String(over.id)))
    }
  }

  return (
    <div className="max-w-xl">
      <DndContext
        id={id}
        sensors={sensors}
        collisionDetection={closestCenter}
        onDragEnd={onDragEnd}
        accessibility={{
          announcements,
          screenReaderInstructions: {
            draggable:
              'Space takes the shade up; the arrow keys move it; Space puts it down, Escape leaves it where it was.',
          },
        }}
      >
        <SortableContext items={ids} strategy={verticalListSortingStrategy}>
          <LedgerList aria-label={`Order of ${family.name}`}>
            {shades.map((shade, at) => (
              <OrderRow
                key={shade.id}
                shade={shade}
                at={at}
                count={shades.length}
                onMove={(by) => move(at, at + by)}
              />
            ))}
          </LedgerList>
        </SortableContext>
      </DndContext>
      <div className="mt-4 flex flex-wrap gap-3">
        <Button variant="primary" onClick={() => onSave(ids)}>
          Save order
        </Button>
        {family.ordered ? <Button onClick={() => onSave(null)}>Order light to dark</Button> : null}
        <Button onClick={onLeave}>Leave it as it was</Button>
      </div>
    </div>
  )
}

function OrderRow({
  shade,
  at,
  count,
  onMove,
}: {
  shade: ShadeView
  at: number
  count: number
  onMove: (by: 1 | -1) => void
}) {
  const {
    attributes,
    listeners,
    setNodeRef,
    setActivatorNodeRef,
    transform,
    transition,
    isDragging,
  } = useSortable({ id: shade.id })
  return (
    <li
      ref={setNodeRef}
      style={{ transform: CSS.Translate.toString(transform), transition }}
      className={isDragging ? 'shadow-drag relative z-10 bg-sheet' : undefined}
    >
      <div className="flex items-center gap-3 py-2">
        <button
          type="button"
          ref={setActivatorNodeRef}
          {...attributes}
          {...listeners}
          aria-label={`Move ${shade.label}, place ${at + 1} of ${count}`}
          className="inline-flex size-9 shrink-0 cursor-grab touch-none items-center justify-center rounded text-ink-faint hover:bg-wash pointer-coarse:size-11"
        >
          <GripVertical aria-hidden="true" className="size-4" />
        </button>
        <WoundSample hex={shade.hex} />
        <p className="min-w-0 grow leading-snug break-words">
          <span className="font-title">{shade.label}</span>
          {shade.name ? (
            <span className="block text-sm text-ink-faint">No. {shade.number}</span>
          ) : null}
        </p>
        <span className="flex shrink-0">
          <IconButton
            label={`Move ${shade.label} up`}
            icon={<ArrowUp />}
            disabled={at === 0}
            onClick={() => onMove(-1)}
          />
          <IconButton
            label={`Move ${shade.label} down`}
            icon={<ArrowDown />}
            disabled={at === count - 1}
            onClick={() => onMove(1)}
          />
        </span>
      </div>
    </li>
  )
}
