import {
  NAME_STATES,
  STATE_WORDS,
  VOTE_WORDS,
  NAME_VOTES,
  type ListedState,
} from '@/lib/names/constants'
import type { NameRow, VoteView } from '@/lib/names/present'

/** LISTED_STATES as people read them. */
export const LISTED_WORDS: Record<ListedState, string> = { ...STATE_WORDS, none: 'No name yet' }

/** "1 name", "4 names". */
export const countNames = (count: number): string => (count === 1 ? '1 name' : `${count} names`)

/** "2 more ideas: 1 in review, 1 put by"; null when the shade has no other. */
export function othersInWords({ idea, others }: Pick<NameRow, 'idea' | 'others'>): string | null {
  const parts = NAME_STATES.flatMap((state) => {
    const count = others[state] ?? 0
    return count > 0 ? [{ count, words: `${count} ${STATE_WORDS[state].toLowerCase()}` }] : []
  })
  const total = parts.reduce((sum, { count }) => sum + count, 0)
  if (total === 0) return null
  const ideas = `${total}${idea ? ' more' : ''} ${total === 1 ? 'idea' : 'ideas'}`
  return `${ideas}: ${parts.map(({ words }) => words).join(', ')}`
}

/** "2 yes, 1 no"; empty while nobody has said anything. */
export const votesInWords = (votes: readonly Pick<VoteView, 'vote'>[]): string =>
  NAME_VOTES.flatMap((vote) => {
    const count = votes.filter((one) => one.vote === vote).length
    return count > 0 ? [`${count} ${VOTE_WORDS[vote].toLowerCase()}`] : []
  }).join(', ')
