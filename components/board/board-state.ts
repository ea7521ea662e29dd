import type { BoardView } from '@/lib/combinations/present'

import {
  applyMove,
  find,
  moveBack,
  orderOf,
  placeOf,
  type Move,
  type Order,
  type Place,
} from './order'

/** How many moves can be taken back. */
export const UNDO_STEPS = 50

/** A move under its key, until the server has answered it. */
export interface PendingMove extends Move {
  key: string
  title: string
}

/** Where a moved card stood before, and which lane the move took it to. */
interface UndoStep {
  key: string
  combinationId: string
  to: Move['lane']
  was: Place
}

/** A move that was not done, in words. */
export interface RefusedMove {
  key: string
  words: string
}

/**
 * What the board knows: what the server said last, the moves it has not answered yet, the way back,
 * and what was refused.
 */
export interface BoardState {
  /** As the server has it, as far as it is known here. */
  board: BoardView
  /** The order of `board` with every answered move. */
  settled: Order
  /** The revision of the last answered move: what is older does not know of it yet. */
  answered: number
  pending: readonly PendingMove[]
  undo: readonly UndoStep[]
  refused: readonly RefusedMove[]
  /** Why moves wait: no connection, or no session. */
  waits: 'unreached' | 'signed-out' | null
}

/** What happens to a board. */
export type BoardEvent =
  | { kind: 'moved'; move: Move; key: string; undoes?: true }
  | { kind: 'restored'; moves: readonly PendingMove[] }
  | { kind: 'answered'; key: string; revision: number }
  | { kind: 'refused'; key: string; words: string }
  | { kind: 'waits'; why: 'unreached' | 'signed-out' }
  | { kind: 'heard'; board: BoardView }
  | { kind: 'dismissed' }

/** A board as the server sent it. */
export const beginBoard = (board: BoardView): BoardState => ({
  board,
  settled: orderOf(board.cards),
  answered: board.revision,
  pending: [],
  undo: [],
  refused: [],
  waits: null,
})

/** The order that is shown: the settled one with the moves that wait for an answer. */
export const orderNow = ({ settled, pending }: Pick<BoardState, 'settled' | 'pending'>): Order =>
  pending.reduce(applyMove, settled)

/** What a card is called; "The combination" when it is gone. */
export const titleOf = ({ board }: Pick<BoardState, 'board'>, id: string): string =>
  board.cards.find((card) => card.id === id)?.title ?? 'The combination'

/**
 * The move that takes back the last one; null when there is none or somebody else has moved its
 * card elsewhere since.
 */
export function undoOf(state: BoardState): Move | null {
  const step = state.undo.at(-1)
  if (!step) return null
  const order = orderNow(state)
  if (find(order, step.combinationId)?.lane !== step.to) return null
  return moveBack(order, step.combinationId, step.was)
}

/** The board after an event. */
export function boardAfter(state: BoardState, event: BoardEvent): BoardState {
  switch (event.kind) {
    case 'moved':
      return moved(state, event)
    case 'restored': {
      const known = new Set(state.pending.map(({ key }) => key))
      const moves = event.moves.filter(({ key }) => !known.has(key))
      return { ...state, pending: [...moves, ...state.pending] }
    }
    case 'answered':
      return answered(state, event)
    case 'refused':
      return {
        ...state,
        waits: null,
        pending: state.pending.filter(({ key }) => key !== event.key),
        undo: state.undo.filter(({ key }) => key !== event.key),
        refused: [...state.refused, { key: event.key, words: event.words }],
      }
    case 'waits':
      return { ...state, waits: event.why }
    case 'heard':
      // An answer that was under way while a move was answered does not know of the move.
      if (event.board.revision < state.answered) return state
      return { ...state, board: event.board, settled: orderOf(event.board.cards) }
    case 'dismissed':
      return { ...state, refused: [] }
  }
}

function moved(
  state: BoardState,
  { move, key, undoes }: Extract<BoardEvent, { kind: 'moved' }>,
): BoardState {
  const { combinationId, lane } = move
  const was = placeOf(orderNow(state), combinationId)
  if (!was) return state
  const pending = [...state.pending, { ...move, key, title: titleOf(state, combinationId) }]
  const undo = undoes
    ? state.undo.slice(0, -1)
    : [...state.undo, { key, combinationId, to: lane, was }].slice(-UNDO_STEPS)
  return { ...state, pending, undo }
}

function answered(
  state: BoardState,
  { key, revision }: Extract<BoardEvent, { kind: 'answered' }>,
): BoardState {
  const move = state.pending.find((one) => one.key === key)
  const rest: BoardState = {
    ...state,
    waits: null,
    answered: Math.max(state.answered, revision),
    pending: state.pending.filter((one) => one !== move),
  }
  // What was heard since the answer knows of the move, and of what came after it.
  if (!move || state.board.revision >= revision) return rest
  // Had others moved something in between, the revision stays behind, and what they did is heard.
  const next = revision === state.board.revision + 1
  return {
    ...rest,
    settled: applyMove(state.settled, move),
    board: next ? { ...state.board, revision } : state.board,
  }
}
