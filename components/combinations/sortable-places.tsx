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
import { useId } from 'react'

import { IconButton } from '@/components/ui/icon-button'
import { LedgerList } from '@/components/ui/ledger'

import { PlaceRow } from './place-row'
import type { FilledPlace } from './words'

/** The five, to be put in another order: by dragging, by keyboard, or a press at a time. */
export function SortablePlaces({
  places,
  onChange,
}: {
  places: FilledPlace[]
  onChange: (places: FilledPlace[]) => void
}) {
  const id = useId()
  const sensors = useSensors(
    useSensor(PointerSensor),
    useSensor(KeyboardSensor, { coordinateGetter: sortableKeyboardCoordinates }),
  )
  const ids = places.map(({ shade }) => shade.id)
  const label = (shadeId: UniqueIdentifier) =>
    places.find(({ shade }) => shade.id === shadeId)?.shade.label ?? ''
  const stands = (shadeId: UniqueIdentifier) =>
    `place ${ids.indexOf(String(shadeId)) + 1} of ${ids.length}`
  const move = (from: number, to: number) => onChange(arrayMove(places, from, to))

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
        <LedgerList>
          {places.map((place, at) => (
            <SortableRow
              key={place.shade.id}
              place={place}
              at={at}
              last={at === places.length - 1}
              onMove={(by) => move(at, at + by)}
            />
          ))}
        </LedgerList>
      </SortableContext>
    </DndContext>
  )
}

function SortableRow({
  place,
  at,
  last,
  onMove,
}: {
  place: FilledPlace
  at: number
  last: boolean
  onMove: (by: 1 | -1) => void
}) {
  const { label, id } = place.shade
  const {
    attributes,
    listeners,
    setNodeRef,
    setActivatorNodeRef,
    transform,
    transition,
    isDragging,
  } = useSortable({ id })
  return (
    <li
      ref={setNodeRef}
      style={{ transform: CSS.Translate.toString(transform), transition }}
      className={isDragging ? 'shadow-drag relative z-10 bg-sheet' : undefined}
    >
      <PlaceRow
        place={place}
        at={at}
        before={
          <button
            type="button"
            ref={setActivatorNodeRef}
            {...attributes}
            {...listeners}
            aria-label={`Move ${label}, place ${at + 1} of 5`}
            className="inline-flex size-9 shrink-0 cursor-grab touch-none items-center justify-center rounded text-ink-faint hover:bg-wash pointer-coarse:size-11"
          >
            <GripVertical aria-hidden="true" className="size-4" />
          </button>
        }
        after={
          <span className="flex shrink-0">
            <IconButton
              label={`Move ${label} up`}
              icon={<ArrowUp />}
              disabled={at === 0}
              onClick={() => onMove(-1)}
            />
            <IconButton
              label={`Move ${label} down`}
              icon={<ArrowDown />}
              disabled={last}
              onClick={() => onMove(1)}
            />
          </span>
        }
      />
    </li>
  )
}
