import {
  NAME_STATES,
  NAME_VOTES,
  STATE_WORDS,
  VOTE_WORDS,
  type ListedState,
  type NameSort,
} from '@/lib/names/constants'
import type { NameRow, VoteView } from '@/lib/names/present'

/** LISTED_STATES as people read them. */
export const LISTED_WORDS: Record<ListedState, string> = { ...STATE_WORDS, none: 'No name yet' }

/** NAME_SORTS as people read them. */
export const SORT_WORDS: Record<NameSort, string> = {
  order: 'Order of the line',
  number: 'Number',
  name: 'Name',
  state: 'State',
  checks: 'Checks',
  family: 'Family',
}

/** "1 name", "4 names". */
export const countNames = (count: number): string => (count === 1 ? '1 name' : `${count} names`)

/** "2 more ideas: 1 in review, 1 put by"; null when the shade has no other. */
export function othersInWords({ idea, others }: Pick<NameRow, 'idea' | 'others'>): string | null {
  const parts = NAME_STATES.flatMap((state) => {
    const count = others[state] ?? 0
    return count > 0 ? [{ count, state: STATE_WORDS[state].toLowerCase() }] : []
  })
  const total = parts.reduce((sum, { count }) => sum + count, 0)
  if (total === 0) return null
  const ideas = `${total}${idea ? ' more' : ''} ${total === 1 ? 'idea' : 'ideas'}`
  if (parts.length === 1) return `${ideas}, ${parts[0]!.state}`
  return `${ideas}: ${parts.map(({ count, state }) => `${count} ${state}`).join(', ')}`
}

/** "2 yes, 1 no"; empty while nobody has said anything. */
export const votesInWords = (votes: readonly Pick<VoteView, 'vote'>[]): string =>
  NAME_VOTES.flatMap((vote) => {
    const count = votes.filter((one) => one.vote === vote).length
    return count > 0 ? [`${count} ${VOTE_WORDS[vote].toLowerCase()}`] : []
  }).join(', ')
