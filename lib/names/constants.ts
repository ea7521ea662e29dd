import type { Role } from '@/lib/people/constants'

/** The states of an idea: written down, looked at, decided, sent back, kept for another time. */
export const NAME_STATES = ['draft', 'in-review', 'approved', 'returned', 'put-by'] as const
/** One of NAME_STATES. */
export type NameState = (typeof NAME_STATES)[number]

/** NAME_STATES as people read them. */
export const STATE_WORDS: Record<NameState, string> = {
  draft: 'Draft',
  'in-review': 'In review',
  approved: 'Approved',
  returned: 'Returned',
  'put-by': 'Put by',
}

/** How far the naming of a shade has come: as its leading idea, or without any. */
export const LISTED_STATES = ['none', 'draft', 'returned', 'in-review', 'approved'] as const
/** One of LISTED_STATES. */
export type ListedState = (typeof LISTED_STATES)[number]

/** The moves that take an idea from one state to another; lib/names/moves.ts says who and when. */
export const STATE_MOVES = [
  'send',
  'recall',
  'approve',
  'return',
  'put-by',
  'take-up',
  'reopen',
  'unlock',
] as const
/** One of STATE_MOVES. */
export type StateMove = (typeof STATE_MOVES)[number]

/** Everything the history of an idea tells of. `displace`: another was approved in its stead. */
export type NameMoveKind =
  StateMove | 'add' | 'reword' | 'place' | 'displace' | 'delete' | 'restore'

/** The history in words: what follows the person's name. */
export const MOVE_WORDS: Record<NameMoveKind, string> = {
  add: 'wrote it down',
  reword: 'changed its words',
  place: 'laid it elsewhere',
  send: 'sent it for review',
  recall: 'took it back from review',
  approve: 'approved it',
  return: 'returned it',
  'put-by': 'put it by',
  'take-up': 'took it up again',
  reopen: 'opened it again',
  unlock: 'unlocked it',
  displace: 'approved another in its stead',
  delete: 'deleted it',
  restore: 'brought it back',
}

/** What a reviewer may say of an idea. */
export const NAME_VOTES = ['yes', 'unsure', 'no'] as const
/** One of NAME_VOTES. */
export type NameVoteKind = (typeof NAME_VOTES)[number]
/** NAME_VOTES as people read them. */
export const VOTE_WORDS: Record<NameVoteKind, string> = {
  yes: 'Yes',
  unsure: 'Not sure',
  no: 'No',
}

/** What a search in a register of marks came to. */
export const SEARCH_OUTCOMES = ['nothing found', 'something found'] as const
/** One of SEARCH_OUTCOMES. */
export type SearchOutcome = (typeof SEARCH_OUTCOMES)[number]

/** What stands wherever marks are spoken of, in these words. */
export const MARKS_CAUTION =
  'No conflict found in the lists checked. This is not a clearance search; have a trademark professional search before use.'

/** The bounds of what names may hold. */
export const NAME_LIMITS = {
  text: 60,
  note: 500,
  reason: 300,
  comment: 500,
  remark: 1_000,
  register: 80,
  searchedBy: 80,
  /** Ideas of a line, in whatever state. */
  perLine: 5_000,
  /** Ideas that make one move together: each that is sent is checked. */
  together: 200,
  /** Rows of one paste or file. */
  atOnce: 1_000,
  /** Characters of one paste or file. */
  importText: 500_000,
  /** Remarks and searches of one idea. */
  perIdea: 200,
  page: 50,
  heapPage: 100,
  /** Drafts checked at once to sort or narrow the list by what is found. */
  sifted: 150,
  /** Ideas dealt at once: the assignment costs their number by that of the shades. */
  dealt: 400,
  /** Shades that ideas are dealt to at once. */
  dealtShades: 100,
  themes: 12,
  theme: 24,
  care: 200,
  reviewers: 20,
} as const

/** Between what a ball band may measure. */
export const LABEL_RANGES = {
  /** mm */
  width: [15, 200],
  /** pt */
  size: [5, 48],
} as const

/** What the list of names may be sorted by. */
export const NAME_SORTS = ['order', 'number', 'name', 'state', 'family', 'checks'] as const
/** One of NAME_SORTS. */
export type NameSort = (typeof NAME_SORTS)[number]

/** Who can be appointed to decide on names: owners decide anyway, and the dye house sees none. */
export const APPOINTABLE: readonly Role[] = ['marketer', 'designer']
