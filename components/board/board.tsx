'use client'

import {
  DndContext,
  DragOverlay,
  MouseSensor,
  pointerWithin,
  TouchSensor,
  useSensor,
  useSensors,
  type CollisionDetection,
  type DragStartEvent,
  type Modifier,
} from '@dnd-kit/core'
import { getEventCoordinates } from '@dnd-kit/utilities'
import { Undo2 } from 'lucide-react'
import dynamic from 'next/dynamic'
import { useSearchParams } from 'next/navigation'
import { useEffect, useEffectEvent, useId, useRef, useState } from 'react'

import { SheetHeader } from '@/components/layout/sheet-header'
import { Button } from '@/components/ui/button'
import { LinkButton } from '@/components/ui/link-button'
import { LiveRegion } from '@/components/ui/live-region'
import { EmptyState, NotFoundState } from '@/components/ui/states'
import { WrapCard } from '@/components/yarn/wrap-card'
import { LANES, type Lane as LaneName } from '@/lib/combinations/constants'
import type { BoardView } from '@/lib/combinations/present'

import { BoardFilterFields } from './board-filter-fields'
import { isNarrowed, passes, readFilter, writeFilter, type BoardFilter } from './board-filter'
import { BoardNotices } from './board-notices'
import { orderNow, titleOf } from './board-state'
import { Lane, type BoardHands, type LaneHandle } from './lane'
import { LaneSwitch } from './lane-switch'
import { applyMove, find, placeAmong, type Order, type Place } from './order'
import { SelectionBar, type OnOne } from './selection-bar'
import { SketchButton, type SketchCombination } from './sketch-button'
import { useBoard, type MoveCombination } from './use-board'
import { moveButtonId, useCarryKeys, type Carry } from './use-carry'
import { bandsOf, standsInWords } from './words'

// Only those who choose a place from a list need it.
const MoveDialog = dynamic(() => import('./move-dialog').then((it) => it.MoveDialog))

const HELP =
  'Enter offers all places in a list. Space takes the card up; then the arrow keys move it, Space puts it down, and Escape leaves it where it was.'

/** Nothing is said by dnd-kit: the board speaks for itself, by name and place. */
const SILENT = {
  onDragStart: () => undefined,
  onDragOver: () => undefined,
  onDragEnd: () => undefined,
  onDragCancel: () => undefined,
}

/** All combinations of a line in three lanes, to be looked through and put in order. */
export function Board({
  brand,
  line,
  board: rendered,
  canMove,
  move,
  sketch,
  remove,
  restore,
}: {
  brand: string
  line: string
  board: BoardView
  canMove: boolean
  move: MoveCombination
  /** Null, as `remove`, for those who may not. */
  sketch: SketchCombination | null
  remove: OnOne | null
  restore: OnOne
}) {
  const { store, state, outOfTouch, lookNow } = useBoard({ brand, line, board: rendered, move })
  const { board } = state
  const here = `/${brand}/lines/${line}/combinations`
  const order = orderNow(state)
  const cards = new Map(board.cards.map((card) => [card.id, card]))

  const filter = readFilter(useSearchParams(), board)
  const narrow = (change: Partial<BoardFilter>) =>
    window.history.replaceState(null, '', here + writeFilter({ ...filter, ...change }))
  const fits = passes(board, filter)
  const shown = byLane((lane) => order[lane].filter((id) => cards.has(id) && fits(cards.get(id)!)))
  const count = LANES.reduce((sum, lane) => sum + shown[lane].length, 0)

  const [spoken, setSpoken] = useState('')
  const [carry, setCarry] = useState<Carry | null>(null)
  const [dialogFor, setDialogFor] = useState<string>()
  const [kept, setKept] = useState<string | null>(null)
  const [laneShown, setLaneShown] = useState<LaneName>('sketched')
  const [chosen, setChosen] = useState<ReadonlySet<string>>(new Set())
  const selected = new Set([...chosen].filter((id) => cards.has(id)))

  // While a card is carried by keys, it is shown where it would be put down.
  const others = byLane((lane) => shown[lane].filter((id) => id !== carry?.id))
  const drawn =
    carry?.by === 'keys'
      ? { ...others, [carry.lane]: others[carry.lane].toSpliced(carry.at, 0, carry.id) }
      : shown

  const orderWith = (held: Carry) =>
    applyMove(order, { combinationId: held.id, ...placeOfCarry(held) })
  const placeOfCarry = ({ id, lane, at }: Carry): Place =>
    placeAmong(order, id, { lane, at, shown: others[lane] })
  const standing = (id: string, now: Order) => {
    const { lane, at } = find(now, id)!
    return standsInWords(titleOf(state, id), { lane, at, of: now[lane].length })
  }
  const wouldStand = (held: Carry) => standing(held.id, orderWith(held))
  const drawnOrder = carry?.by === 'keys' ? orderWith(carry) : order

  function putAt(id: string, place: Place) {
    const from = find(order, id)?.lane
    if (!from) return
    const put = { combinationId: id, from, ...place }
    store.move(put)
    setSpoken(`Put down. ${standing(id, applyMove(order, put))}.`)
  }

  function takeUp(id: string, by: Carry['by']) {
    const lane = find(order, id)!.lane
    setCarry({ id, lane, at: shown[lane].indexOf(id), by })
    setKept(id)
    setSpoken(`Taken up. ${standing(id, order)}.`)
  }

  function carryTo(held: Carry) {
    if (carry && held.lane === carry.lane && held.at === carry.at) return
    setCarry(held)
    setLaneShown(held.lane)
    setSpoken(`${wouldStand(held)}.`)
  }

  function putDown() {
    if (!carry) return
    setCarry(null)
    putAt(carry.id, placeOfCarry(carry))
  }

  function leave() {
    if (!carry) return
    const { lane } = find(order, carry.id) ?? { lane: carry.lane }
    setCarry(null)
    setLaneShown(lane)
    setSpoken(`${titleOf(state, carry.id)} is back where it was.`)
  }

  function undo() {
    const back = store.undo()
    if (!back) return
    setLaneShown(back.lane)
    setSpoken(`Taken back. ${standing(back.combinationId, applyMove(order, back))}.`)
  }

  useCarryKeys(carry, others, { move: carryTo, drop: putDown, cancel: leave })
  useFocusOnCarried(carry, kept)

  const onUndoKey = useEffectEvent((event: KeyboardEvent) => {
    const typing = event.target instanceof HTMLElement && event.target.closest('input, select')
    const asked = (event.ctrlKey || event.metaKey) && !event.shiftKey && event.key === 'z'
    if (!asked || (typing && !(typing as HTMLInputElement).matches('[type=checkbox]'))) return
    event.preventDefault()
    undo()
  })
  useEffect(() => {
    if (!canMove) return
    const listen = (event: KeyboardEvent) => onUndoKey(event)
    document.addEventListener('keydown', listen)
    return () => document.removeEventListener('keydown', listen)
  }, [canMove])

  const id = useId()
  const lanes = useRef<Partial<Record<LaneName, LaneHandle | null>>>({})
  const pointer = useRef<{ x: number; y: number } | null>(null)
  const underPointer: CollisionDetection = (terms) => {
    pointer.current = terms.pointerCoordinates
    return pointerWithin(terms)
  }
  const sensors = useSensors(
    useSensor(MouseSensor, { activationConstraint: { distance: 6 } }),
    useSensor(TouchSensor, { activationConstraint: { delay: 220, tolerance: 8 } }),
  )

  function carryOver(over: string | undefined) {
    const lane = LANES.find((one) => over === one || over === `switch-${one}`)
    if (!carry || !lane || !pointer.current) return
    if (over !== lane) return carryTo({ ...carry, lane, at: 0 })
    const at = lanes.current[lane]?.indexAt(pointer.current.y) ?? 0
    // The card still lies in its lane, so that what is under it counts one less.
    const own = shown[lane].indexOf(carry.id)
    carryTo({ ...carry, lane, at: own >= 0 && at > own ? at - 1 : at })
  }

  const hands: BoardHands = {
    board,
    cards,
    hrefOf: (card) => `${here}/${card.id}`,
    selected,
    onSelect: (ids, on) =>
      setChosen(on ? new Set([...selected, ...ids]) : without(selected, new Set(ids))),
    carry,
    onMoveKey: canMove ? (one) => takeUp(one, 'keys') : null,
    onMovePress: setDialogFor,
    kept,
    onKeep: setKept,
    helpId: `${id}-help`,
  }
  const carriedCard = carry?.by === 'pointer' ? cards.get(carry.id) : undefined
  const dialogCard = dialogFor === undefined ? undefined : cards.get(dialogFor)

  return (
    <>
      <SheetHeader
        title="Combinations"
        meta={
          <>
            {inWords(board.cards.length, count, isNarrowed(filter))}
            {canMove && count > 0 ? (
              <span className="max-lg:hidden">
                {' '}
                · drag a card by its yarn, or press its handle to choose a place
              </span>
            ) : null}
          </>
        }
        actions={sketch && <SketchButton {...{ brand, line, here, sketch }} />}
      />
      <LiveRegion>{spoken}</LiveRegion>
      <p id={hands.helpId} hidden>
        {HELP}
      </p>
      <BoardNotices
        waits={state.waits}
        waiting={state.pending.length}
        outOfTouch={outOfTouch}
        refused={state.refused}
        onRetry={store.sendNow}
        onDismiss={() => store.dismiss()}
      />
      {board.cards.length === 0 ? (
        <EmptyState
          title="No combination yet"
          action={
            <LinkButton href={`/${brand}/lines/${line}/photographs`}>
              Open the photographs
            </LinkButton>
          }
        >
          <p>
            Five shades that you keep from a photograph, or put together yourself, lie here as a
            wrap card: sketched at first, then short-listed, then chosen.
          </p>
        </EmptyState>
      ) : (
        <>
          <BoardFilterFields here={here} board={board} filter={filter} onChange={narrow}>
            {canMove ? (
              <Button
                icon={<Undo2 aria-hidden="true" />}
                disabled={state.undo.length === 0}
                onClick={undo}
              >
                <span className="max-md:sr-only">Undo move</span>
              </Button>
            ) : null}
          </BoardFilterFields>
          {count === 0 ? (
            <NotFoundState
              title="No combination fits that"
              action={
                <Button onClick={() => narrow({ q: '', family: '', photograph: '', author: '' })}>
                  Show all combinations
                </Button>
              }
            />
          ) : (
            <DndContext
              id={id}
              sensors={sensors}
              collisionDetection={underPointer}
              accessibility={{
                announcements: SILENT,
                screenReaderInstructions: { draggable: HELP },
                restoreFocus: false,
              }}
              onDragStart={({ active }: DragStartEvent) => takeUp(String(active.id), 'pointer')}
              onDragMove={({ over }) => carryOver(over ? String(over.id) : undefined)}
              // A move tells what it came from: what it came to is told here.
              onDragOver={({ over }) => carryOver(over ? String(over.id) : undefined)}
              onDragEnd={({ over }) => (over ? putDown() : leave())}
              onDragCancel={leave}
            >
              <div className="@container/board">
                <LaneSwitch
                  lane={laneShown}
                  counts={byLane((lane) => shown[lane].length)}
                  onChoose={setLaneShown}
                />
                <div className="grid h-[max(24rem,calc(100dvh-9rem))] gap-x-6 @min-[40rem]/board:grid-cols-3 @min-[60rem]/board:gap-x-10">
                  {LANES.map((lane) => (
                    <Lane
                      key={lane}
                      ref={(handle) => {
                        lanes.current[lane] = handle
                      }}
                      lane={lane}
                      ids={drawn[lane]}
                      total={drawnOrder[lane].length}
                      hands={hands}
                      className={lane === laneShown ? undefined : '@max-[40rem]/board:hidden'}
                    />
                  ))}
                </div>
              </div>
              <DragOverlay dropAnimation={null} modifiers={[toPointer]}>
                {carriedCard ? (
                  <WrapCard
                    compact
                    bands={bandsOf(board, carriedCard)}
                    title={carriedCard.title}
                    className="w-full cursor-grabbing rounded shadow-dragged"
                  />
                ) : null}
              </DragOverlay>
            </DndContext>
          )}
        </>
      )}
      <SelectionBar
        brand={brand}
        kitsHref={`/${brand}/lines/${line}/kits`}
        // In the order of the board, whatever order they were chosen in.
        selected={LANES.flatMap((lane) => order[lane].filter((one) => selected.has(one))).map(
          (one) => ({ id: one, title: titleOf(state, one) }),
        )}
        onClear={() => setChosen(new Set())}
        remove={remove}
        restore={restore}
        onChanged={lookNow}
      />
      {dialogCard ? (
        <MoveDialog
          key={dialogCard.id}
          card={dialogCard}
          order={order}
          titleOf={(one) => titleOf(state, one)}
          onMove={(place) => {
            setLaneShown(place.lane)
            setKept(dialogCard.id)
            putAt(dialogCard.id, place)
          }}
          onClose={() => setDialogFor(undefined)}
        />
      ) : null}
    </>
  )
}

const byLane = <T,>(of: (lane: LaneName) => T) =>
  Object.fromEntries(LANES.map((lane) => [lane, of(lane)])) as Record<LaneName, T>

const without = (all: ReadonlySet<string>, some: ReadonlySet<string>) =>
  new Set([...all].filter((one) => !some.has(one)))

const inWords = (total: number, count: number, narrowed: boolean) =>
  narrowed ? `${count} of ${total} shown` : `${total} on the board`

/** How far the pointer is from the corner of the card that it carries, in pixels. */
const HOLD = 24

/** Carries the card under the pointer, by whatever it was taken up. */
const toPointer: Modifier = ({ activatorEvent, draggingNodeRect, transform }) => {
  const start = activatorEvent && getEventCoordinates(activatorEvent)
  if (!start || !draggingNodeRect) return transform
  return {
    ...transform,
    x: transform.x + start.x - draggingNodeRect.left - HOLD,
    y: transform.y + start.y - draggingNodeRect.top - HOLD,
  }
}

/** The keyboard follows the card it carries, and stays with it once it is put down. */
function useFocusOnCarried(carry: Carry | null, kept: string | null): void {
  const following = useRef(false)
  const place = carry && `${carry.lane} ${carry.at}`
  const byKeys = carry?.by === 'keys'
  useEffect(() => {
    if (!byKeys && !following.current) return
    following.current = byKeys
    if (kept) document.getElementById(moveButtonId(kept))?.focus({ preventScroll: true })
  }, [byKeys, place, kept])
}
