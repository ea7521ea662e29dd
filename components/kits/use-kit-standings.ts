'use client'

import { useRouter } from 'next/navigation'
import { useEffect, useRef } from 'react'
import useSWR from 'swr'

import { isUnbuilt, type KitStanding } from '@/lib/kits/constants'

/** Milliseconds between two looks: pictures of one combination take about half a second. */
const PAUSE = 1_000

async function fetchStandings(url: string): Promise<KitStanding[]> {
  const answer = await fetch(url)
  if (!answer.ok) throw new Error(`kits answered ${answer.status}`)
  return (await answer.json()) as KitStanding[]
}

/**
 * Follows the kits that are still being built and has the page rendered anew when one of them is
 * done. What the server rendered is the start, so a reload goes on where it was.
 * @returns where each stands now, and whether we are out of touch with the server
 */
export function useKitStandings(
  brand: string,
  rendered: readonly KitStanding[],
): { standings: ReadonlyMap<string, KitStanding>; outOfTouch: boolean } {
  const router = useRouter()
  const ids = rendered
    .filter(({ state }) => isUnbuilt(state))
    .map(({ id }) => id)
    .join(',')
  const { data, error } = useSWR(
    ids ? `/api/brands/${brand}/kits/states?ids=${ids}` : null,
    fetchStandings,
    { refreshInterval: PAUSE, dedupingInterval: PAUSE / 2, errorRetryInterval: 2_000 },
  )
  // A kit is built once and then stays so: what was heard of it is never older than the page.
  const unbuilt = data?.filter(({ state }) => isUnbuilt(state)).length
  const heard = useRef(unbuilt)
  useEffect(() => {
    const settled = unbuilt !== undefined && data !== undefined && unbuilt < ids.split(',').length
    if (ids && settled && heard.current !== unbuilt) router.refresh()
    heard.current = unbuilt
  }, [data, ids, router, unbuilt])
  return {
    standings: new Map([...rendered, ...(ids ? (data ?? []) : [])].map((one) => [one.id, one])),
    outOfTouch: error !== undefined,
  }
}
