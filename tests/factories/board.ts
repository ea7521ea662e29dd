import { BoardStore } from '@/components/board/board-store'
import { find, placeAmong } from '@/components/board/order'
import { orderNow } from '@/components/board/board-state'
import type { Actor } from '@/lib/auth/actor'
import { LANES, type Lane } from '@/lib/combinations/constants'
import { getBoard } from '@/lib/combinations/get-board'
import { moveCombination } from '@/lib/combinations/move-combination'
import { AppError } from '@/lib/errors'
import { Combination, type Line, type Shade } from '@/models'

import { makeCombination } from './combination'

/** So many combinations of these shades, spread over the lanes of the line's board. */
export async function makeBoard(
  line: Line,
  shades: readonly Shade[],
  count: number,
  values: { createdById?: string; photographId?: string } = {},
): Promise<Combination[]> {
  const made: Combination[] = []
  for (let n = 0; n < count; n++) {
    const five = Array.from({ length: 5 }, (_, at) => shades[(n * 5 + at) % shades.length]!)
    made.push(
      await makeCombination(line, five, {
        ...values,
        title: `Combination ${n + 1}`,
        lane: LANES[n % LANES.length],
      }),
    )
  }
  return made
}

/** Titles by lane, top to bottom, as the database has them. */
export async function lanesOf(line: Pick<Line, 'id'>): Promise<Record<Lane, string[]>> {
  const rows = await Combination.findAll({ where: { lineId: line.id }, order: [['rank', 'ASC']] })
  return Object.fromEntries(
    LANES.map((lane) => [lane, rows.filter((row) => row.lane === lane).map(({ title }) => title)]),
  ) as Record<Lane, string[]>
}

/** An editor at a board: the very store of the page, before the very command of its action. */
export interface Editor {
  store: BoardStore
  /** In how many words the server has refused a move. */
  refusals: number
  /** Moves some card of the board as it is seen here to some place. */
  moveSome: (random: () => number) => void
  /** Waits until every move is answered. */
  settled: () => Promise<void>
  /** Looks at the board as the server has it. */
  look: () => Promise<void>
}

/** Opens the board of a line for somebody. */
export async function openBoard(actor: Actor, lineSlug: string): Promise<Editor> {
  const board = (await getBoard(actor, lineSlug))!
  const store = new BoardStore(board, {
    storageKey: 'moves',
    onRefused: () => undefined,
    send: async (move) => {
      try {
        return { ok: true, data: await moveCombination(actor, move) }
      } catch (error) {
        if (!(error instanceof AppError)) throw error
        editor.refusals += 1
        return { ok: false, code: error.code, message: error.message }
      }
    },
  })
  store.start()
  const editor: Editor = {
    store,
    refusals: 0,
    moveSome: (random) => {
      const some = <T>(of: readonly T[]) => of[Math.floor(random() * of.length)]!
      const order = orderNow(store.read())
      const { id } = some(store.read().board.cards)
      const from = find(order, id)!.lane
      const lane = some(LANES)
      const shown = order[lane].filter((other) => other !== id)
      const at = Math.floor(random() * (shown.length + 1))
      store.move({ combinationId: id, from, ...placeAmong(order, id, { lane, at, shown }) })
    },
    settled: () =>
      new Promise((resolve) => {
        const done = () => store.read().pending.length === 0
        if (done()) return resolve()
        const stop = store.subscribe(() => {
          if (!done()) return
          stop()
          resolve()
        })
      }),
    look: async () => {
      const latest = await getBoard(actor, lineSlug, store.read().board.revision)
      if (latest) store.hear(latest)
    },
  }
  return editor
}

/**
 * Has two editors move cards at random at the same time, each looking at the other's work only now
 * and then, and waits until all is answered and both have looked.
 */
export async function moveAtOnce(
  editors: readonly Editor[],
  moves: number,
  randoms: readonly (() => number)[],
): Promise<void> {
  await Promise.all(
    editors.map(async (editor, who) => {
      const random = randoms[who]!
      for (let made = 0; made < moves; made++) {
        editor.moveSome(random)
        // Some moves are made before the one before is answered.
        if (random() < 0.6) await editor.settled()
        if (random() < 0.2) await editor.look()
      }
      await editor.settled()
    }),
  )
  for (const editor of editors) await editor.look()
}
