'use client'

import { useRef } from 'react'

import { cn } from '@/components/ui/cn'
import { portraitEdges, WrapCard } from '@/components/yarn/wrap-card'

import { percentOf, type CombinationDraft } from './draft'
import { EdgeSlider } from './edge-slider'
import { useHeldDrag, usePlaceDrop } from './editor-drag'
import type { ShadeOf } from './shade-of'

/** The grips stand in two columns, so that those of thin bands do not lie on each other. */
const GRIP_COLUMNS = ['left-0', 'left-8'] as const

/** Props of {@link CardStage}. */
export interface CardStageProps {
  draft: CombinationDraft
  shadeOf: ShadeOf
  canEdit: boolean
  /** The edge under a place is being dragged to give it that many percent; null: no more. */
  onPreview: (edge: { place: number; percent: number } | null) => void
  onMoveEdge: (place: number, percent: number) => void
  onLeaveEdge: () => void
  /** A band was pressed; only while something is held. */
  onPress?: (place: number) => void
}

/** The wrap card, large; its bands take what is dragged there, and its edges move. */
export function CardStage({
  draft: { title, places },
  shadeOf,
  canEdit,
  onPreview,
  onMoveEdge,
  onLeaveEdge,
  onPress,
}: CardStageProps) {
  const frame = useRef<HTMLDivElement>(null)
  const bands = places.map(({ shadeId, share }) => {
    const shade = shadeOf(shadeId)
    return { hex: shade?.hex ?? null, share, name: shade?.label ?? 'Empty' }
  })
  const { left, right, edges } = portraitEdges(bands)
  const top = (at: number) => `${edges[at]! * 100}%`
  const height = (at: number) => `${(edges[at + 1]! - edges[at]!) * 100}%`
  const pixelsPerPercent = () =>
    ((frame.current?.clientHeight ?? 400) * (edges.at(-1)! - edges[0]!)) / 100

  return (
    <div className={cn('flex justify-center', canEdit && 'pr-16 print:pr-0')}>
      <div ref={frame} className="relative w-full max-w-[17.5rem] print:w-[75mm] print:max-w-none">
        <WrapCard bands={bands} title={title} className="block w-full" />
        {canEdit
          ? places.map(({ shadeId, locked }, at) => (
              <BandOverlay
                key={at}
                place={at}
                empty={shadeId === null}
                locked={locked}
                onPress={onPress}
                style={{
                  left: `${left * 100}%`,
                  width: `${(right - left) * 100}%`,
                  top: top(at),
                  height: height(at),
                }}
              />
            ))
          : null}
        {canEdit
          ? places.slice(0, -1).map((_, at) => (
              <div
                key={at}
                className="absolute left-full w-14 -translate-y-1/2 print:hidden"
                style={{ top: top(at + 1) }}
              >
                <span
                  aria-hidden="true"
                  className={cn(
                    'absolute top-1/2 -left-1 h-px bg-rule',
                    at % 2 === 0 ? 'w-2' : 'w-9',
                  )}
                />
                <EdgeSlider
                  above={{ name: nameOf(bands, at), percent: percentOf(places[at]!.share) }}
                  below={{ name: nameOf(bands, at + 1), percent: percentOf(places[at + 1]!.share) }}
                  pixelsPerPercent={pixelsPerPercent}
                  onPreview={(percent) =>
                    onPreview(percent === null ? null : { place: at, percent })
                  }
                  onMove={(percent) => onMoveEdge(at, percent)}
                  onLeave={onLeaveEdge}
                  className={cn('relative ml-1', GRIP_COLUMNS[at % 2])}
                />
              </div>
            ))
          : null}
      </div>
    </div>
  )
}

const nameOf = (bands: readonly { name: string; hex: string | null }[], at: number) =>
  bands[at]!.hex === null ? `empty place ${at + 1}` : bands[at]!.name

/** For the pointer alone: the rows beside the card do the same for everybody. */
function BandOverlay({
  place,
  empty,
  locked,
  onPress,
  style,
}: {
  place: number
  empty: boolean
  locked: boolean
  onPress?: (place: number) => void
  style: React.CSSProperties
}) {
  const { setNode: setDrop, isOver } = usePlaceDrop(place, 'band', locked)
  const { setNode: setDrag, listeners } = useHeldDrag(
    { kind: 'place', place },
    'band',
    locked || empty,
  )
  return (
    <div
      ref={(node) => {
        setDrop(node)
        setDrag(node)
      }}
      {...listeners}
      aria-hidden="true"
      onClick={onPress && !locked ? () => onPress(place) : undefined}
      style={style}
      className={cn(
        'absolute touch-manipulation print:hidden',
        empty && 'border border-dashed border-rule',
        !empty && !locked && 'cursor-grab',
        onPress && !locked && 'cursor-pointer',
        isOver && 'outline-focus outline-3 -outline-offset-2',
      )}
    />
  )
}
