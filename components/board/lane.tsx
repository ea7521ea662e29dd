'use client'

import { useDraggable, useDroppable } from '@dnd-kit/core'
import { defaultRangeExtractor, measureElement, useVirtualizer } from '@tanstack/react-virtual'
import { GripVertical } from 'lucide-react'
import { useEffect, useImperativeHandle, useRef, type Ref } from 'react'

import { AppLink } from '@/components/ui/app-link'
import { Button } from '@/components/ui/button'
import { Checkbox } from '@/components/ui/checkbox'
import { cn } from '@/components/ui/cn'
import { LANE_WORDS, type Lane as LaneName } from '@/lib/combinations/constants'
import type { BoardCard, BoardView } from '@/lib/combinations/present'

import { CardFace } from './board-card'
import { moveButtonId, type Carry } from './use-carry'
import { standsInWords } from './words'

/** What a lane says of itself while a card is carried over it. */
export interface LaneHandle {
  /** The index that a card put down at this height of the window would get. */
  indexAt: (clientY: number) => number
}

/** What lanes and cards need of the board around them. */
export interface BoardHands {
  board: BoardView
  cards: ReadonlyMap<string, BoardCard>
  hrefOf: (card: BoardCard) => string
  selected: ReadonlySet<string>
  onSelect: (ids: readonly string[], on: boolean) => void
  carry: Carry | null
  /** Null for those who may not move. */
  onMoveKey: ((id: string) => void) | null
  onMovePress: (id: string) => void
  /** A card that stays drawn wherever the lane is scrolled to: the one that has the keyboard. */
  kept: string | null
  onKeep: (id: string) => void
  /** The element that says how cards are moved. */
  helpId: string
}

/** About how high a card is, in pixels; each is measured once it is drawn. */
const CARD_HEIGHT = 150

/** One lane of the board: it draws the cards that are in sight and no others. */
export function Lane({
  lane,
  ids,
  total,
  hands,
  className,
  ref,
}: {
  lane: LaneName
  /** The cards that are shown, top to bottom. */
  ids: readonly string[]
  /** How many the lane holds, shown or not. */
  total: number
  hands: BoardHands
  className?: string
  ref: Ref<LaneHandle>
}) {
  const { carry, kept, selected, onSelect } = hands
  const scroller = useRef<HTMLDivElement | null>(null)
  const list = useRef<HTMLOListElement>(null)
  const { setNodeRef } = useDroppable({ id: lane })
  const stays = kept === null ? -1 : ids.indexOf(kept)
  // Nothing of it is handed on: what it returns is read anew at every drawing.
  // eslint-disable-next-line react-hooks/incompatible-library
  const virtual = useVirtualizer({
    count: ids.length,
    getScrollElement: () => scroller.current,
    estimateSize: () => CARD_HEIGHT,
    getItemKey: (index) => ids[index]!,
    // A lane that is not shown has no heights: those of before are kept.
    measureElement: (card, entry, lanes) =>
      measureElement(card, entry, lanes) ||
      (lanes.measurementsCache[lanes.indexFromElement(card)]?.size ?? CARD_HEIGHT),
    initialRect: { width: 320, height: 800 },
    overscan: 3,
    rangeExtractor: (range) => {
      const drawn = defaultRangeExtractor(range)
      return stays < 0 || drawn.includes(stays) ? drawn : [...drawn, stays].sort((a, b) => a - b)
    },
  })

  useImperativeHandle(ref, () => ({
    indexAt: (clientY) => {
      const y = clientY - (list.current?.getBoundingClientRect().top ?? 0)
      const below = virtual.getVirtualItems().find(({ start, size }) => start + size / 2 > y)
      return below ? below.index : ids.length
    },
  }))

  // A card that is carried by keys is kept in sight.
  const carried = carry?.by === 'keys' && carry.lane === lane ? carry.at : null
  useEffect(() => {
    if (carried !== null) virtual.scrollToIndex(carried, { align: 'auto' })
  }, [carried, virtual])

  const line = carry?.by === 'pointer' && carry.lane === lane ? lineAt(virtual, ids, carry) : null
  const all = ids.length > 0 && ids.every((id) => selected.has(id))
  return (
    <section
      aria-labelledby={`lane-${lane}`}
      className={cn('@container flex min-h-0 min-w-0 flex-col', className)}
    >
      <header className="flex min-h-10 items-baseline justify-between gap-2 border-b border-rule pb-1 @max-[40rem]/board:justify-end">
        <h2
          id={`lane-${lane}`}
          className="text-xl whitespace-nowrap @max-[40rem]/board:sr-only @max-[17rem]:text-lg"
        >
          {LANE_WORDS[lane]}{' '}
          <span className="font-body text-sm text-ink-faint">
            {ids.length === total ? total : `${ids.length} of ${total}`}
          </span>
        </h2>
        {ids.length > 0 ? (
          <Button
            variant="quiet"
            size="small"
            className="shrink-0 whitespace-nowrap"
            aria-label={`${all ? 'Deselect' : 'Select'} all in ${LANE_WORDS[lane]}`}
            onClick={() => onSelect(ids, !all)}
          >
            {all ? 'Deselect all' : 'Select all'}
          </Button>
        ) : null}
      </header>
      <div
        ref={(node) => {
          scroller.current = node
          setNodeRef(node)
        }}
        data-lane={lane}
        className="relative min-h-0 grow overflow-y-auto"
      >
        {ids.length === 0 ? (
          <p className="py-6 text-ink-faint">
            {total === 0 ? EMPTY[lane] : 'None of its cards fits.'}
          </p>
        ) : null}
        <ol role="list" ref={list} className="relative" style={{ height: virtual.getTotalSize() }}>
          {virtual.getVirtualItems().map(({ key, index, start }) => (
            <li
              key={key}
              ref={virtual.measureElement}
              data-index={index}
              aria-setsize={ids.length}
              aria-posinset={index + 1}
              className="absolute inset-x-0 top-0 border-b border-hairline"
              style={{ transform: `translateY(${start}px)` }}
            >
              <LaneCard
                card={hands.cards.get(ids[index]!)!}
                lane={lane}
                at={index}
                of={ids.length}
                hands={hands}
              />
            </li>
          ))}
          {line !== null ? (
            <li
              role="presentation"
              className="pointer-events-none absolute inset-x-0 top-0 h-0.5 -translate-y-px bg-woad"
              style={{ top: line }}
            />
          ) : null}
        </ol>
      </div>
    </section>
  )
}

const EMPTY: Record<LaneName, string> = {
  sketched: 'First ideas lie here.',
  'short-listed': 'What is worth a swatch goes here.',
  chosen: 'What the line is shown with goes here.',
}

/** How high in the list the line is drawn at which the carried card would be put down. */
function lineAt(
  virtual: { getVirtualItems: () => { index: number; start: number; end: number }[] },
  ids: readonly string[],
  { id, at }: Carry,
): number {
  // `at` counts the others; the carried card still lies among them.
  const own = ids.indexOf(id)
  const index = own >= 0 && at > own ? at + 1 : at
  const items = virtual.getVirtualItems()
  const below = items.find((item) => item.index >= index)
  return below ? below.start : (items.at(-1)?.end ?? 1)
}

function LaneCard({
  card,
  lane,
  at,
  of,
  hands,
}: {
  card: BoardCard
  lane: LaneName
  at: number
  of: number
  hands: BoardHands
}) {
  const { board, hrefOf, selected, onSelect, carry, onMoveKey, onMovePress, onKeep, helpId } = hands
  const { id, title } = card
  const movable = onMoveKey !== null
  const { listeners, setNodeRef } = useDraggable({ id, disabled: !movable })
  const carried = carry?.id === id
  return (
    <div
      data-card={id}
      onFocus={() => onKeep(id)}
      className={cn(
        'py-4 pr-1',
        carried && carry.by === 'pointer' && 'opacity-40',
        carried && carry.by === 'keys' && 'relative z-10 bg-sheet shadow-dragged',
      )}
    >
      <CardFace
        board={board}
        card={card}
        title={
          <AppLink href={hrefOf(card)} className="hover:underline">
            {title}
          </AppLink>
        }
        wrap={{ ref: setNodeRef, ...listeners, className: movable ? 'cursor-grab' : undefined }}
        controls={
          <div className="flex shrink-0 flex-col items-center gap-1 @max-[17rem]:ml-auto">
            {movable ? (
              <button
                type="button"
                id={moveButtonId(id)}
                {...listeners}
                aria-label={`Move ${standsInWords(title, { lane, at, of })}`}
                aria-describedby={helpId}
                aria-pressed={carried && carry.by === 'keys'}
                onKeyDown={(event) => {
                  if (event.key !== ' ' || carry) return
                  event.preventDefault()
                  onMoveKey(id)
                }}
                onKeyUp={(event) => {
                  if (event.key === ' ') event.preventDefault()
                }}
                onClick={() => onMovePress(id)}
                className="inline-flex size-9 cursor-grab touch-none items-center justify-center rounded text-ink-faint hover:bg-wash hover:text-ink pointer-coarse:size-11"
              >
                <GripVertical aria-hidden="true" className="size-4" />
              </button>
            ) : null}
            <Checkbox
              hideLabel
              label={`Select ${title}`}
              className="[&>label]:px-2"
              checked={selected.has(id)}
              onChange={({ target }) => onSelect([id], target.checked)}
            />
          </div>
        }
      />
    </div>
  )
}
