import { describe, expect, it } from 'vitest'

import { othersInWords, votesInWords } from '@/components/names/list-words'
import type { IdeaView, NameRow } from '@/lib/names/present'

const idea = {} as IdeaView

describe('the other ideas of a shade', () => {
  it.each([
    [{}, idea, null],
    [{ draft: 1 }, idea, '1 more idea, draft'],
    [{ 'put-by': 1 }, null, '1 idea, put by'],
    [{ 'in-review': 2 }, idea, '2 more ideas, in review'],
    [{ 'put-by': 1, 'in-review': 2 }, idea, '3 more ideas: 2 in review, 1 put by'],
    [{ 'put-by': 0 }, idea, null],
  ] as [NameRow['others'], IdeaView | null, string | null][])(
    '%j beside %j are said as %j',
    (others, leading, words) => {
      expect(othersInWords({ idea: leading, others })).toBe(words)
    },
  )
})

it('says what reviewers think, the kindest first, and nothing while nobody has', () => {
  const votes = (['no', 'yes', 'unsure', 'yes'] as const).map((vote) => ({ vote }))
  expect(votesInWords(votes)).toBe('2 yes, 1 not sure, 1 no')
  expect(votesInWords([])).toBe('')
})
