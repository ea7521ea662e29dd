'use client'

import {
  DndContext,
  DragOverlay,
  MouseSensor,
  pointerWithin,
  TouchSensor,
  useDraggable,
  useDroppable,
  useSensor,
  useSensors,
  type DragEndEvent,
  type DragOverEvent,
  type DragStartEvent,
} from '@dnd-kit/core'
import { useId, type ReactNode } from 'react'

import { WoundSample } from '@/components/yarn/wound-sample'
import type { ShadeView } from '@/lib/shades/present'

import type { Held } from './held'

const heldOf = ({ active }: Pick<DragStartEvent, 'active'>) => active.data.current as Held
const placeOf = ({ over }: Pick<DragOverEvent, 'over'>) =>
  (over?.data.current as { place: number } | undefined)?.place ?? null

/** What {@link EditorDrag} tells of. */
export interface DragTold {
  onTakeUp: (held: Held) => void
  onOver: (held: Held, place: number | null) => void
  onPutDown: (held: Held, place: number | null) => void
  onGiveUp: (held: Held) => void
}

/**
 * Where shades are dragged to places with a mouse or, after a short press, a finger. The keyboard
 * has its own way (HandBar), so what is spoken is said by whoever is told.
 */
export function EditorDrag({
  dragged,
  told: { onTakeUp, onOver, onPutDown, onGiveUp },
  children,
}: {
  /** What hangs at the pointer. */
  dragged: ShadeView | null
  told: DragTold
  children: ReactNode
}) {
  const id = useId()
  const sensors = useSensors(
    useSensor(MouseSensor, { activationConstraint: { distance: 6 } }),
    useSensor(TouchSensor, { activationConstraint: { delay: 200, tolerance: 8 } }),
  )
  const silent = () => undefined
  return (
    <DndContext
      id={id}
      sensors={sensors}
      collisionDetection={pointerWithin}
      onDragStart={(event: DragStartEvent) => onTakeUp(heldOf(event))}
      onDragOver={(event: DragOverEvent) => onOver(heldOf(event), placeOf(event))}
      onDragEnd={(event: DragEndEvent) => onPutDown(heldOf(event), placeOf(event))}
      onDragCancel={(event) => onGiveUp(heldOf(event))}
      accessibility={{
        announcements: {
          onDragStart: silent,
          onDragOver: silent,
          onDragEnd: silent,
          onDragCancel: silent,
        },
        screenReaderInstructions: { draggable: '' },
      }}
    >
      {children}
      <DragOverlay dropAnimation={null}>
        {dragged ? (
          <div className="inline-flex items-center gap-2 rounded bg-sheet p-1 pr-3 shadow-dragged">
            <WoundSample hex={dragged.hex} />
            <span className="font-title text-ink">{dragged.label}</span>
          </div>
        ) : null}
      </DragOverlay>
    </DndContext>
  )
}

/** Makes an element something that can be dragged. @param spot tells several of one thing apart */
export function useHeldDrag(held: Held, spot: string, disabled: boolean) {
  const { setNodeRef, listeners, isDragging } = useDraggable({
    id: `${spot} ${held.kind === 'shade' ? held.shadeId : held.place}`,
    data: held,
    disabled,
  })
  return { setNode: setNodeRef, listeners, isDragging }
}

/** Makes an element a place to drop on. @param spot tells several of one place apart */
export function usePlaceDrop(place: number, spot: string, disabled: boolean) {
  const { setNodeRef, isOver } = useDroppable({ id: `${spot} ${place}`, data: { place }, disabled })
  return { setNode: setNodeRef, isOver }
}
