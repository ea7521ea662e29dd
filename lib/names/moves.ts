import { ConflictError, ForbiddenError, InvalidError, type AppError } from '@/lib/errors'
import type { Role } from '@/lib/people/constants'
import type { NameIdea } from '@/models'

import type { NameState, StateMove } from './constants'

/** Who asks, as far as names go. */
export interface Asker {
  personId: string
  role: Role
  /** Appointed to decide on the names of this line. */
  isReviewer: boolean
  /** The brand has no other owner. */
  isOnlyOwner: boolean
}

/** What a move looks at in an idea. */
export type Movable = Pick<NameIdea, 'state' | 'shadeId' | 'authorId' | 'wordedById'> & {
  /** It is approved, names are locked, and nobody has unlocked it. */
  locked: boolean
}

interface Rule {
  from: readonly NameState[]
  /** `unlock` alone leaves the state as it is. */
  to: NameState
  by: 'drafter' | 'decider' | 'owner'
  needsReason?: boolean
}

/** The one table of who may move an idea from where to where. */
export const MOVES: Record<StateMove, Rule> = {
  send: { from: ['draft', 'returned'], to: 'in-review', by: 'drafter' },
  recall: { from: ['in-review'], to: 'draft', by: 'drafter' },
  approve: { from: ['in-review'], to: 'approved', by: 'decider' },
  return: { from: ['in-review'], to: 'returned', by: 'decider', needsReason: true },
  'put-by': { from: ['draft', 'returned', 'in-review'], to: 'put-by', by: 'drafter' },
  'take-up': { from: ['put-by'], to: 'draft', by: 'drafter' },
  reopen: { from: ['approved'], to: 'in-review', by: 'decider', needsReason: true },
  unlock: { from: ['approved'], to: 'approved', by: 'owner', needsReason: true },
}

const STANDS: Record<NameState, string> = {
  draft: 'is a draft',
  'in-review': 'is in review',
  approved: 'is approved',
  returned: 'was returned',
  'put-by': 'was put by',
}

/** Owners and appointed reviewers. A dyer who was appointed before their role changed is none. */
export const isDecider = ({ role, isReviewer }: Pick<Asker, 'role' | 'isReviewer'>): boolean =>
  role === 'owner' || (isReviewer && role !== 'dyer')

/** Whether the idea is theirs: they brought it, or its words are theirs now. */
export const isOwn = (
  { authorId, wordedById }: Pick<Movable, 'authorId' | 'wordedById'>,
  personId: string,
): boolean => authorId === personId || wordedById === personId

/**
 * Why this person may not make this move with this idea now; null when they may. Role first, then
 * the state, then whose idea it is.
 */
export function reasonAgainst(
  move: StateMove,
  idea: Movable,
  asker: Asker,
  reason = '',
): AppError | null {
  const { from, by, needsReason } = MOVES[move]
  const decides = isDecider(asker)
  if (asker.role === 'dyer') return new ForbiddenError()
  // In review it is the deciders' to put by; before, whoever drafts may.
  const asksDecider = by === 'decider' || (move === 'put-by' && idea.state === 'in-review')
  if (asksDecider && !decides)
    return new ForbiddenError('Only an owner or an appointed reviewer decides on names.')
  if (by === 'owner' && asker.role !== 'owner')
    return new ForbiddenError('Only an owner unlocks a name.')
  if (!from.includes(idea.state))
    return new ConflictError(`It ${STANDS[idea.state]} now. Nothing was changed.`)
  if (move === 'unlock' && !idea.locked)
    return new ConflictError('It is not locked. Nothing was changed.')
  if (move === 'reopen' && idea.locked)
    return new ConflictError(
      'Names are locked for the label printer. An owner must unlock this one first.',
    )
  if (move === 'send' && idea.shadeId === null)
    return new ConflictError('It lies in the heap: give it to a shade first.')
  if (move === 'approve' && isOwn(idea, asker.personId) && !asker.isOnlyOwner)
    return new ForbiddenError('It is your own idea: somebody else must approve it.')
  if (needsReason && reason.trim() === '')
    return new InvalidError('Say why: whoever wrote it down will read it.', {
      reason: ['Give a reason.'],
    })
  return null
}

/** Why an idea that was seen in a state is left alone; null while it stands so. */
export const reasonUnseen = (idea: Pick<Movable, 'state'>, seen: NameState): AppError | null =>
  idea.state === seen
    ? null
    : new ConflictError(`It ${STANDS[idea.state]} now. Nothing was changed.`)

/** Why this person may not say yes or no to this idea now; null when they may. */
export function reasonAgainstVote(idea: Movable, asker: Asker): AppError | null {
  if (!isDecider(asker))
    return new ForbiddenError('Only an owner or an appointed reviewer says yes or no to names.')
  if (idea.state !== 'in-review')
    return new ConflictError(`It ${STANDS[idea.state]} now. What you said was not kept.`)
  if (isOwn(idea, asker.personId))
    return new ForbiddenError('It is your own idea: leave it to the others to say yes or no.')
  return null
}

/** The moves that may be made with an idea now, by this person; a reason can still be given. */
export const movesOpen = (idea: Movable, asker: Asker): StateMove[] =>
  (Object.keys(MOVES) as StateMove[]).filter(
    (move) => reasonAgainst(move, idea, asker, 'a reason') === null,
  )
