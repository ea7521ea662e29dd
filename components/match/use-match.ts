'use client'

import useSWR from 'swr'

import type { Match, NoMatch } from '@/lib/color/match'
import type { Failure } from '@/lib/errors'

import type { WishesControl } from './use-wishes'

/** A match as the page shows it. */
export interface MatchState {
  match: Match | NoMatch | undefined
  /** A newer one is on its way; the one shown is of before. */
  pending: boolean
  /** Why there is no newer one, in words. */
  problem: string | undefined
  retry: () => void
}

async function fetchMatch(url: string): Promise<Match | NoMatch> {
  const answer = await fetch(url).catch(() => null)
  if (answer?.ok) return (await answer.json()) as Match | NoMatch
  const failure = (await answer?.json().catch(() => null)) as Failure | null | undefined
  throw new Error(
    failure?.message ??
      'Woadmap could not be reached. Your wishes are kept in the address; the match shown is the one before.',
  )
}

/**
 * The match under the wishes: the stored one while nothing is asked, otherwise solved anew by the
 * server. The one before stays until the answer is there; a late answer to an older wish is left out.
 */
export function useMatch(
  { brand, photographId }: { brand: string; photographId: string },
  stored: readonly (Match | NoMatch)[],
  { wishes, any, query }: WishesControl,
): MatchState {
  const { data, error, isLoading, mutate } = useSWR<Match | NoMatch, Error>(
    any ? `/api/brands/${brand}/photographs/${photographId}/match?${query}` : null,
    fetchMatch,
    {
      keepPreviousData: true,
      revalidateOnFocus: false,
      revalidateIfStale: false,
      shouldRetryOnError: false,
    },
  )
  const plain = stored.find(({ kind }) => kind === wishes.reading)
  // The first wish of a reading has no answer before it but the stored match.
  const match = any && data?.kind === wishes.reading ? data : plain
  return {
    match,
    pending: any && isLoading,
    problem: any ? error?.message : undefined,
    retry: () => void mutate(),
  }
}
