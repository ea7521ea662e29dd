import type { BoardView } from '@/lib/combinations/present'
import type { ActionResult } from '@/lib/errors'

import {
  beginBoard,
  boardAfter,
  orderNow,
  undoOf,
  type BoardEvent,
  type BoardState,
  type PendingMove,
} from './board-state'
import { standsAt, type Move } from './order'

/** Sends one move to the server. */
export type SendMove = (move: Move) => Promise<ActionResult<{ revision: number }>>

/** The part of the browser's storage that is used. */
export type MoveStorage = Pick<Storage, 'getItem' | 'setItem'>

/** Milliseconds until a move is sent again, after so many tries: 1 s at first, 10 s in the end. */
export const pauseAfter = (tries: number): number => Math.min(10_000, 1_000 * 1.7 ** tries)

/** A move that is not answered by then counts as lost and is sent again, in milliseconds. */
const PATIENCE = 12_000

/** Why a move waits after these failures; after any other it is refused. */
const WAITS = {
  unavailable: 'unreached',
  'too-many': 'unreached',
  unauthenticated: 'signed-out',
} as const

interface Terms {
  send: SendMove
  /** Keeps unanswered moves over a reload of the page. */
  storage?: () => MoveStorage
  /** What they are kept under. */
  storageKey: string
  /** Called when a move was refused: what is shown is out of date. */
  onRefused: () => void
}

/**
 * The board of one line in this tab. Moves show at once and are sent one after another; a move
 * that did not reach the server is kept and sent again until it is answered.
 */
export class BoardStore {
  private state: BoardState
  private listeners = new Set<() => void>()
  private sending = false
  private tries = 0
  private timer: ReturnType<typeof setTimeout> | undefined
  private open = false

  constructor(
    board: BoardView,
    private terms: Terms,
  ) {
    this.state = beginBoard(board)
  }

  /** What is known now; the same object until something happens. */
  read = (): BoardState => this.state

  /** Calls `listener` after every change. @returns how to stop it */
  subscribe = (listener: () => void): (() => void) => {
    this.listeners.add(listener)
    return () => this.listeners.delete(listener)
  }

  /** Takes up what an earlier page could not send, and sends. @returns how to close it */
  start(): () => void {
    this.open = true
    const moves = this.stored()
    if (moves.length > 0) this.happen({ kind: 'restored', moves })
    this.sendNow()
    return () => {
      this.open = false
      clearTimeout(this.timer)
    }
  }

  /** Moves a card. @returns false when it stands there already */
  move(move: Move): boolean {
    const order = orderNow(this.state)
    if (standsAt(order, move.combinationId, move)) return false
    this.add(move)
    return true
  }

  /** Takes the last move back. @returns the move that does it; null when it cannot be taken back */
  undo(): Move | null {
    const move = undoOf(this.state)
    if (move) this.add(move, true)
    else if (this.state.undo.length > 0) {
      const step = this.state.undo.at(-1)!
      const words =
        'The last move cannot be taken back: somebody else has moved or deleted that combination since. It stays where it is now.'
      this.happen({ kind: 'refused', key: step.key, words })
    }
    return move
  }

  /** Takes in the board as the server has it. */
  hear(board: BoardView): void {
    this.happen({ kind: 'heard', board })
  }

  /** Puts what was refused out of sight. */
  dismiss(): void {
    this.happen({ kind: 'dismissed' })
  }

  /** Sends what waits at once: the connection may be back. */
  sendNow = (): void => {
    clearTimeout(this.timer)
    void this.pump()
  }

  private add(move: Move, undoes?: true) {
    const key = crypto.randomUUID()
    this.happen({ kind: 'moved', move, key, undoes })
    const added = this.state.pending.find((one) => one.key === key)
    if (!added) return
    this.store([...this.stored(), added])
    // While there is no connection, the next try has its time.
    if (!this.state.waits) this.sendNow()
  }

  private happen(event: BoardEvent) {
    const next = boardAfter(this.state, event)
    if (next === this.state) return
    this.state = next
    this.listeners.forEach((listener) => listener())
  }

  private async pump() {
    if (this.sending) return
    this.sending = true
    try {
      while (this.open) {
        const next = this.state.pending[0]
        if (!next || !(await this.deliver(next))) return
      }
    } finally {
      this.sending = false
    }
  }

  /** Sends one move. @returns whether it was answered */
  private async deliver({ key, title: _title, ...move }: PendingMove): Promise<boolean> {
    const answer = await withPatience(this.terms.send(move))
    if (answer.ok) {
      this.tries = 0
      this.forget(key)
      this.happen({ kind: 'answered', key, revision: answer.data.revision })
      return true
    }
    if (answer.code in WAITS) {
      this.happen({ kind: 'waits', why: WAITS[answer.code as keyof typeof WAITS] })
      if (this.open) this.timer = setTimeout(() => void this.pump(), pauseAfter(this.tries++))
      return false
    }
    this.tries = 0
    this.forget(key)
    this.happen({ kind: 'refused', key, words: answer.message })
    this.terms.onRefused()
    return true
  }

  // Another page of this tab may keep moves there too: each takes away its own.
  private forget(key: string) {
    this.store(this.stored().filter((move) => move.key !== key))
  }

  private stored(): PendingMove[] {
    try {
      const text = this.terms.storage?.().getItem(this.terms.storageKey)
      return text ? (JSON.parse(text) as PendingMove[]) : []
    } catch {
      return []
    }
  }

  private store(moves: readonly PendingMove[]) {
    try {
      this.terms.storage?.().setItem(this.terms.storageKey, JSON.stringify(moves))
    } catch {
      // A browser that keeps nothing still moves.
    }
  }
}

/** An answer, or after a while the failure of one that did not come. */
function withPatience<Data>(answer: Promise<ActionResult<Data>>): Promise<ActionResult<Data>> {
  const lost: ActionResult<Data> = { ok: false, code: 'unavailable', message: '' }
  return new Promise((resolve) => {
    const timer = setTimeout(() => resolve(lost), PATIENCE)
    const settle = (result: ActionResult<Data>) => {
      clearTimeout(timer)
      resolve(result)
    }
    answer.then(settle, () => settle(lost))
  })
}
