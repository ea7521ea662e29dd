'use client'

import useSWR from 'swr'

import { isMatch, type Match, type NoMatch } from '@/lib/color/match'
import type { Failure } from '@/lib/errors'

/** The five of a photograph around the shades in place, or why there are none. */
export interface PhotographFive {
  match: Match | null
  pending: boolean
  /** Why there is no answer, in words. */
  problem: string | null
  retry: () => void
}

async function fetchFive(url: string): Promise<Match | NoMatch> {
  const answer = await fetch(url).catch(() => null)
  if (answer?.ok) return (await answer.json()) as Match | NoMatch
  const failure = (await answer?.json().catch(() => null)) as Failure | null | undefined
  throw new Error(
    failure?.message ?? 'Woadmap could not be reached. Your five are as they were; try again.',
  )
}

/**
 * Asks the match of a photograph for the five that cover it best with these shades locked. The
 * server solves it exactly. Nothing is asked while `matchUrl` is null.
 */
export function usePhotographFive(
  matchUrl: string | null,
  locked: readonly string[],
): PhotographFive {
  const query = locked.length > 0 ? `?lock=${locked.join(',')}` : ''
  const { data, error, isLoading, mutate } = useSWR<Match | NoMatch, Error>(
    matchUrl === null ? null : `${matchUrl}${query}`,
    fetchFive,
    { revalidateOnFocus: false, revalidateIfStale: false, shouldRetryOnError: false },
  )
  const none = data && !isMatch(data) ? data.unavailable : null
  return {
    match: data && isMatch(data) ? data : null,
    pending: isLoading,
    problem: error?.message ?? none,
    retry: () => void mutate(),
  }
}
