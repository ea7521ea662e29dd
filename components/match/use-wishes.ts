'use client'

import { usePathname, useSearchParams } from 'next/navigation'
import { useMemo, useState } from 'react'

import { DEFAULT_APART } from '@/lib/color/match'
import { readWishes, type MatchWishes } from '@/lib/photographs/wishes'

/** What is asked of the match, and the ways to ask for something else. */
export interface WishesControl {
  wishes: MatchWishes
  /** Anything besides which reading is shown. */
  any: boolean
  /** The query string that stands for them, empty when nothing is asked. */
  query: string
  change: (changes: Partial<MatchWishes>) => void
  lock: (shadeId: string) => void
  unlock: (shadeId: string) => void
  exclude: (shadeId: string) => void
  allow: (shadeId: string) => void
  swap: (shadeId: string, forShadeId: string) => void
  clear: () => void
  /** Takes the last change back; absent when this page has made none. */
  undo?: () => void
}

const without = (ids: readonly string[], id: string) => ids.filter((one) => one !== id)
const including = (ids: readonly string[], id: string) => [...without(ids, id), id]

/** The wishes as a query string, in one spelling. */
export function wishesQuery({ reading, lock, exclude, apart }: MatchWishes): string {
  const query = new URLSearchParams()
  if (reading !== 'true') query.set('reading', reading)
  if (lock.length > 0) query.set('lock', lock.join(','))
  if (exclude.length > 0) query.set('exclude', exclude.join(','))
  if (apart !== undefined && apart !== DEFAULT_APART) query.set('apart', String(apart))
  return query.toString()
}

/** What is asked besides which reading is shown. */
const askedOf = (wishes: MatchWishes) => wishesQuery({ ...wishes, reading: 'true' })

/**
 * The wishes of the page's address. Each change is a step of the browser's history, so that going
 * back undoes it and a reload keeps it.
 */
export function useWishes(): WishesControl {
  const path = usePathname()
  const search = useSearchParams()
  const text = search.toString()
  const wishes = useMemo(() => {
    const none: MatchWishes = { reading: 'true', lock: [], exclude: [] }
    return readWishes(Object.fromEntries(new URLSearchParams(text))) ?? none
  }, [text])

  // What was asked before each change made here; going back in the browser leaves some behind.
  const [before, setBefore] = useState<readonly MatchWishes[]>([])
  const query = wishesQuery(wishes)
  const go = (to: MatchWishes) => {
    const next = wishesQuery(to)
    window.history.pushState(null, '', next ? `${path}?${next}` : path)
  }
  const change = (changes: Partial<MatchWishes>) => {
    const to = { ...wishes, ...changes }
    if (wishesQuery(to) === query) return
    if (askedOf(to) !== askedOf(wishes)) setBefore([...before, wishes])
    go(to)
  }
  const last = before.findLastIndex((one) => askedOf(one) !== askedOf(wishes))
  const { reading, lock, exclude } = wishes
  return {
    wishes,
    any: askedOf(wishes) !== '',
    query,
    change,
    lock: (id) => change({ lock: including(lock, id), exclude: without(exclude, id) }),
    unlock: (id) => change({ lock: without(lock, id) }),
    exclude: (id) => change({ exclude: including(exclude, id), lock: without(lock, id) }),
    allow: (id) => change({ exclude: without(exclude, id) }),
    swap: (id, forId) =>
      change({
        lock: including(without(lock, id), forId),
        exclude: including(without(exclude, forId), id),
      }),
    clear: () => change({ lock: [], exclude: [], apart: undefined, reading }),
    ...(last >= 0 && {
      undo: () => {
        setBefore(before.slice(0, last))
        go({ ...before[last]!, reading })
      },
    }),
  }
}
