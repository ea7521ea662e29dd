import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'

import { orderNow } from '@/components/board/board-state'
import { BoardStore, pauseAfter } from '@/components/board/board-store'
import type { Move } from '@/components/board/order'
import type { ActionResult } from '@/lib/errors'

import { card, smallBoard } from './fixtures'

type Answer = ActionResult<{ revision: number }>
const ok = (revision: number): Answer => ({ ok: true, data: { revision } })
const failed = (code: 'conflict' | 'unavailable' | 'unauthenticated', message = 'no'): Answer => ({
  ok: false,
  code,
  message,
})

/** A server whose answers are given by hand, in the order they are asked for. */
function server() {
  const asked: { move: Move; answer: (with_: Answer) => void; fail: () => void }[] = []
  const send = (move: Move) =>
    new Promise<Answer>((resolve, reject) =>
      asked.push({ move, answer: resolve, fail: () => reject(new TypeError('fetch failed')) }),
    )
  return { asked, send }
}

function storage() {
  const items = new Map<string, string>()
  return {
    items,
    getItem: (key: string) => items.get(key) ?? null,
    setItem: (key: string, value: string) => void items.set(key, value),
  }
}

const toChosen = (id: string, from: Move['from'] = 'sketched'): Move => ({
  combinationId: id,
  from,
  lane: 'chosen',
  after: null,
  before: null,
})

let at: ReturnType<typeof server>
let held: ReturnType<typeof storage>
const onRefused = vi.fn()
const open = (board = smallBoard()) => {
  const store = new BoardStore(board, {
    send: at.send,
    storage: () => held,
    storageKey: 'moves',
    onRefused,
  })
  return { store, close: store.start() }
}
const chosen = (store: BoardStore) => orderNow(store.read()).chosen
const settle = () => vi.advanceTimersByTimeAsync(0)

beforeEach(() => {
  vi.useFakeTimers()
  onRefused.mockClear()
  at = server()
  held = storage()
})
afterEach(() => vi.useRealTimers())

describe('a move', () => {
  it('shows at once, and stays when it is answered', async () => {
    const { store } = open()
    expect(store.move(toChosen('a'))).toBe(true)
    expect(chosen(store)).toEqual(['a'])
    at.asked[0]!.answer(ok(6))
    await settle()
    expect(store.read()).toMatchObject({ pending: [], answered: 6, board: { revision: 6 } })
    expect(chosen(store)).toEqual(['a'])
  })

  it('to where the card stands already is none', () => {
    const { store } = open()
    const stays = { combinationId: 'b', from: 'sketched', lane: 'sketched' } as const
    expect(store.move({ ...stays, after: 'a', before: 'c' })).toBe(false)
    expect(at.asked).toEqual([])
  })

  it('is sent only once the one before is answered', async () => {
    const { store } = open()
    store.move(toChosen('a'))
    store.move(toChosen('b'))
    expect(at.asked).toHaveLength(1)
    at.asked[0]!.answer(ok(6))
    await settle()
    expect(at.asked.map(({ move }) => move.combinationId)).toEqual(['a', 'b'])
  })

  it('that is refused goes back, is told, and the board is looked at again', async () => {
    const { store } = open()
    store.move(toChosen('a'))
    at.asked[0]!.answer(failed('conflict', '“Title of a” was not moved: …'))
    await settle()
    expect(chosen(store)).toEqual([])
    expect(store.read().refused.map(({ words }) => words)).toEqual([
      '“Title of a” was not moved: …',
    ])
    expect(store.read().undo).toEqual([])
    expect(onRefused).toHaveBeenCalledOnce()
    store.dismiss()
    expect(store.read().refused).toEqual([])
  })
})

describe('without a connection', () => {
  it('a move is kept and sent again until it is answered, others after it', async () => {
    const { store } = open()
    store.move(toChosen('a'))
    at.asked[0]!.fail()
    await settle()
    store.move(toChosen('b'))
    expect(store.read()).toMatchObject({ waits: 'unreached', pending: { length: 2 } })
    expect(chosen(store)).toEqual(['a', 'b'].toReversed())
    expect(at.asked).toHaveLength(1)
    await vi.advanceTimersByTimeAsync(pauseAfter(0))
    at.asked[1]!.answer(ok(6))
    await settle()
    at.asked[2]!.answer(ok(7))
    await settle()
    expect(at.asked.map(({ move }) => move.combinationId)).toEqual(['a', 'a', 'b'])
    expect(store.read()).toMatchObject({ waits: null, pending: [] })
  })

  it('an answer that never comes counts as lost', async () => {
    const { store } = open()
    store.move(toChosen('a'))
    await vi.advanceTimersByTimeAsync(12_000)
    expect(store.read().waits).toBe('unreached')
    store.sendNow()
    expect(at.asked).toHaveLength(2)
  })

  it('a session that has ended keeps the move for the next one', async () => {
    const { store } = open()
    store.move(toChosen('a'))
    at.asked[0]!.answer(failed('unauthenticated'))
    await settle()
    expect(store.read()).toMatchObject({ waits: 'signed-out', pending: { length: 1 } })
  })

  it('waits longer from try to try, and never longer than 10 s', () => {
    expect([0, 1, 2].map(pauseAfter)).toEqual([...[0, 1, 2].map(pauseAfter)].sort((a, b) => a - b))
    expect(pauseAfter(100)).toBe(10_000)
  })

  it('a reload of the page loses no move', async () => {
    const first = open()
    first.store.move(toChosen('a'))
    at.asked[0]!.fail()
    await settle()
    first.close()
    const { store } = open()
    expect(chosen(store)).toEqual(['a'])
    expect(at.asked).toHaveLength(2)
    at.asked[1]!.answer(ok(6))
    await settle()
    expect(JSON.parse(held.items.get('moves')!)).toEqual([])
  })

  it('a browser that keeps nothing still moves', async () => {
    const store = new BoardStore(smallBoard(), {
      send: at.send,
      storage: () => {
        throw new DOMException('denied', 'SecurityError')
      },
      storageKey: 'moves',
      onRefused,
    })
    store.start()
    store.move(toChosen('a'))
    at.asked[0]!.answer(ok(6))
    await settle()
    expect(chosen(store)).toEqual(['a'])
  })
})

describe('what others do', () => {
  const theirs = (revision: number) =>
    smallBoard({
      revision,
      cards: [card('c', 'sketched'), card('a', 'sketched'), card('b', 'sketched')],
    })

  it('is shown, with the moves that still wait on top of it', () => {
    const { store } = open()
    store.move(toChosen('a'))
    store.hear(theirs(6))
    expect(orderNow(store.read())).toMatchObject({ sketched: ['c', 'b'], chosen: ['a'] })
  })

  it('is not shown when it was said before the last move was answered', async () => {
    const { store } = open()
    store.move(toChosen('a'))
    at.asked[0]!.answer(ok(6))
    await settle()
    store.hear(theirs(5))
    expect(chosen(store)).toEqual(['a'])
  })

  it('is asked for when an answer shows that something came in between', async () => {
    const { store } = open()
    store.move(toChosen('a'))
    at.asked[0]!.answer(ok(9))
    await settle()
    // The next look asks what has changed since 5, and is told.
    expect(store.read().board.revision).toBe(5)
    store.hear(theirs(8))
    expect(chosen(store)).toEqual(['a'])
    store.hear(theirs(9))
    expect(chosen(store)).toEqual([])
  })
})

describe('taking back', () => {
  it('brings cards back one after another, the last first', () => {
    const { store } = open()
    const before = orderNow(store.read())
    store.move(toChosen('b'))
    store.move({ ...toChosen('d', 'short-listed'), before: 'b' })
    expect(store.undo()).toMatchObject({ combinationId: 'd', lane: 'short-listed' })
    expect(store.undo()).toMatchObject({ combinationId: 'b', after: 'a', before: 'c' })
    expect(orderNow(store.read())).toEqual(before)
    expect(store.undo()).toBeNull()
  })

  it('a refused move leaves nothing to take back', async () => {
    const { store } = open()
    store.move(toChosen('a'))
    at.asked[0]!.answer(failed('conflict', 'not moved'))
    await settle()
    expect(store.undo()).toBeNull()
    expect(store.read().refused).toHaveLength(1)
  })

  it('does not touch a card that somebody has moved since it was put down', async () => {
    const { store } = open()
    store.move(toChosen('a'))
    at.asked[0]!.answer(ok(6))
    await settle()
    store.hear(smallBoard({ revision: 7, cards: [card('a', 'short-listed')] }))
    expect(store.undo()).toBeNull()
    expect(store.read().refused[0]!.words).toContain('cannot be taken back')
    expect(store.read().undo).toEqual([])
  })
})
