'use client'

import { useEffect, useState, useSyncExternalStore } from 'react'
import useSWR, { mutate } from 'swr'

import { reach } from '@/components/reach'
import type { BoardView } from '@/lib/combinations/present'
import type { ActionResult } from '@/lib/errors'

import type { BoardState } from './board-state'
import { BoardStore } from './board-store'
import type { Move } from './order'

/** The action that moves a combination. */
export type MoveCombination = (
  brand: string,
  move: Move,
) => Promise<ActionResult<{ revision: number }>>

/** What others do is seen this often, in milliseconds. */
const POLL = 3_000

/** The board, or null while nothing has changed since `revision`. */
async function fetchBoard(url: string, revision: number): Promise<BoardView | null> {
  const answer = await fetch(`${url}?revision=${revision}`)
  if (!answer.ok) throw new Error(`the board answered ${answer.status}`)
  return (await answer.json()) as BoardView | null
}

/**
 * The board of a line: what the server rendered is the start, moves show at once, and what others
 * do arrives within 5 s.
 */
export function useBoard({
  brand,
  line,
  board,
  move,
}: {
  brand: string
  line: string
  board: BoardView
  move: MoveCombination
}): { store: BoardStore; state: BoardState; outOfTouch: boolean; lookNow: () => void } {
  const url = `/api/brands/${brand}/lines/${line}/board`
  const [store] = useState(
    () =>
      new BoardStore(board, {
        send: (one) => reach(move(brand, one)),
        storage: () => window.sessionStorage,
        storageKey: `woadmap:moves:${brand}/${line}`,
        onRefused: () => void mutate(url),
      }),
  )
  const state = useSyncExternalStore(store.subscribe, store.read, store.read)

  useEffect(() => store.start(), [store])
  useEffect(() => {
    window.addEventListener('online', store.sendNow)
    return () => window.removeEventListener('online', store.sendNow)
  }, [store])
  // A page that is rendered anew may know more.
  useEffect(() => store.hear(board), [store, board])

  const { error } = useSWR(url, () => fetchBoard(url, store.read().board.revision), {
    refreshInterval: POLL,
    dedupingInterval: 500,
    errorRetryInterval: POLL,
    revalidateOnMount: false,
    onSuccess: (latest) => {
      if (latest) store.hear(latest)
      // Whoever answers can be sent to.
      if (store.read().waits === 'unreached') store.sendNow()
    },
  })
  return { store, state, outOfTouch: error !== undefined, lookNow: () => void mutate(url) }
}
