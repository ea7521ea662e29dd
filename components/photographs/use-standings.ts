'use client'

import { useRouter } from 'next/navigation'
import { useEffect, useRef, useState } from 'react'
import useSWR from 'swr'

import { isUnsettled, type PhotographStanding } from '@/lib/photographs/constants'

/** Milliseconds until the next look, after so many: 1 s at first, 5 s in the end. */
export const pauseAfter = (looks: number): number => Math.min(5_000, 1_000 * 1.4 ** looks)

async function fetchStandings([url]: [url: string]): Promise<PhotographStanding[]> {
  const answer = await fetch(url)
  if (!answer.ok) throw new Error(`standings answered ${answer.status}`)
  return (await answer.json()) as PhotographStanding[]
}

/**
 * Follows the photographs that are still being read and has the page rendered anew when one of
 * them settles. What the server rendered is the start, so a reload goes on where it was.
 * @returns where each stands now, and whether we are out of touch with the server
 */
export function useStandings(
  brand: string,
  rendered: readonly PhotographStanding[],
): { standings: ReadonlyMap<string, PhotographStanding>; outOfTouch: boolean } {
  const router = useRouter()
  const followed = rendered.filter(({ state }) => isUnsettled(state)).map(({ id }) => id)
  const ids = followed.join(',')

  // A photograph may be followed, settle, and be read again: what was heard the first time must
  // not be taken for news the second time, so each round has a cache entry of its own.
  const [mount] = useState(() => crypto.randomUUID())
  const [round, setRound] = useState({ ids, number: 0 })
  if (round.ids !== ids) setRound({ ids, number: round.number + 1 })

  const looks = useRef(0)
  const settled = useRef(0)
  useEffect(() => {
    looks.current = 0
    settled.current = 0
  }, [round])

  const { data, error } = useSWR(
    ids ? [`/api/brands/${brand}/photographs/states?ids=${ids}`, mount, round.number] : null,
    fetchStandings,
    {
      dedupingInterval: 500,
      errorRetryInterval: 2_000,
      refreshInterval: (latest) =>
        latest && countUnsettled(latest) === 0 ? 0 : pauseAfter(looks.current),
      onSuccess: (latest) => {
        looks.current += 1
        // One that is gone has settled too: the page no longer shows it.
        const now = followed.length - countUnsettled(latest)
        if (now > settled.current) router.refresh()
        settled.current = now
      },
    },
  )
  return {
    standings: new Map([...rendered, ...(data ?? [])].map((one) => [one.id, one])),
    outOfTouch: error !== undefined,
  }
}

const countUnsettled = (standings: readonly PhotographStanding[]): number =>
  standings.filter(({ state }) => isUnsettled(state)).length
