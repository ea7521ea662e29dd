import { describe, expect, it } from 'vitest'

import { STATE_MOVES } from '@/lib/names/constants'
import {
  isDecider,
  isOwn,
  MOVES,
  movesOpen,
  reasonAgainst,
  reasonAgainstVote,
  reasonUnseen,
  type Asker,
  type Movable,
} from '@/lib/names/moves'
import {
  LEADS_TO,
  MOVE_CASES,
  REASONED,
  standingWords,
  STANDINGS,
  WHO,
  type Standing,
  type Who,
} from '@/tests/fixtures/name-moves'

const ANOTHER: Who = { role: 'owner' }

const askerOf = ({ role, isReviewer = undefined, isOnlyOwner = undefined }: Who): Asker => ({
  personId: 'me',
  role,
  isReviewer: isReviewer ?? false,
  isOnlyOwner: isOnlyOwner ?? false,
})
const ideaOf = ({ state, inHeap, locked }: Standing, { isOwn: own }: Who): Movable => ({
  state,
  shadeId: inHeap ? null : 'a shade',
  authorId: own ? 'me' : 'another',
  wordedById: own ? 'me' : 'another',
  locked: locked ?? false,
})

describe('the table of moves', () => {
  it.each(MOVE_CASES)('$who, $move, $standing: $answer', ({ who, move, standing, answer }) => {
    const idea = ideaOf(standing, WHO[who])
    const asker = askerOf(WHO[who])
    const against = reasonAgainst(move, idea, asker, 'It is too long.')
    expect(against?.code ?? 'ok').toBe(answer)
    expect(movesOpen(idea, asker).includes(move)).toBe(answer === 'ok')
  })

  it('asks for a reason to send back, to open again and to unlock, and for no other move', () => {
    const owner = askerOf(WHO['an owner'])
    for (const move of STATE_MOVES) {
      const standing = STANDINGS.find(
        (one) => reasonAgainst(move, ideaOf(one, ANOTHER), owner, 'why') === null,
      )!
      for (const reason of ['', '  \n'])
        expect(reasonAgainst(move, ideaOf(standing, ANOTHER), owner, reason)?.code, move).toBe(
          REASONED.includes(move) ? 'invalid' : undefined,
        )
    }
  })

  it('leaves alone what stands otherwise than it was seen', () => {
    expect(reasonUnseen({ state: 'in-review' }, 'in-review')).toBeNull()
    expect(reasonUnseen({ state: 'returned' }, 'in-review')?.code).toBe('conflict')
  })

  it('leads where it says', () => {
    for (const move of STATE_MOVES) expect(MOVES[move].to, move).toBe(LEADS_TO[move])
  })

  it('lets nobody approve words that are theirs, whoever brought the idea', () => {
    const reviewer = askerOf(WHO['a reviewer'])
    const idea = ideaOf({ state: 'in-review' }, ANOTHER)
    expect(reasonAgainst('approve', { ...idea, wordedById: 'me' }, reviewer)?.code).toBe(
      'forbidden',
    )
    expect(reasonAgainst('approve', { ...idea, authorId: 'me' }, reviewer)?.code).toBe('forbidden')
    // Whose account is gone is nobody.
    const orphan = { ...idea, authorId: null, wordedById: null }
    expect(isOwn(orphan, 'me')).toBe(false)
    expect(reasonAgainst('approve', orphan, reviewer)).toBeNull()
  })
})

describe('a vote', () => {
  it.each(Object.entries(WHO))('of %s counts on what is in review and is not theirs', (_, who) => {
    for (const standing of STANDINGS) {
      const asker = askerOf(who)
      const counts = isDecider(asker) && standing.state === 'in-review' && !('isOwn' in who)
      expect(
        reasonAgainstVote(ideaOf(standing, who), asker) === null,
        standingWords(standing),
      ).toBe(counts)
    }
  })

  it('is refused to a dyer who was appointed before', () => {
    const dyer = askerOf({ role: 'dyer', isReviewer: true })
    expect(reasonAgainstVote(ideaOf({ state: 'in-review' }, ANOTHER), dyer)?.code).toBe('forbidden')
  })
})
