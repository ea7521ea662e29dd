import type { StateMove } from '@/lib/names/constants'

/** The button of a move. */
export const MOVE_BUTTONS: Record<StateMove, string> = {
  send: 'Send for review',
  recall: 'Take back from review',
  approve: 'Approve name',
  return: 'Return name',
  'put-by': 'Put name by',
  'take-up': 'Take name up again',
  reopen: 'Open name again',
  unlock: 'Unlock name',
}

/** The button while its move is under way. */
export const MOVE_PENDING: Record<StateMove, string> = {
  send: 'Sending name…',
  recall: 'Taking name back…',
  approve: 'Approving name…',
  return: 'Returning name…',
  'put-by': 'Putting name by…',
  'take-up': 'Taking name up…',
  reopen: 'Opening name…',
  unlock: 'Unlocking name…',
}

/** What has been done, before the name: "Approved “Thyme Will Tell”". */
export const MOVE_DONE: Record<StateMove, string> = {
  send: 'Sent for review:',
  recall: 'Taken back from review:',
  approve: 'Approved:',
  return: 'Returned:',
  'put-by': 'Put by:',
  'take-up': 'Taken up again as a draft:',
  reopen: 'Open again, in review:',
  unlock: 'Unlocked:',
}

/** What the field for the reason asks, of a move that needs one. */
export const REASON_WORDS: Partial<Record<StateMove, { label: string; hint: string }>> = {
  return: {
    label: 'Why is it returned?',
    hint: 'Whoever wrote it reads this in a letter and on the name.',
  },
  reopen: {
    label: 'Why is it opened again?',
    hint: 'Its shade has no name until one is approved. The reason stays in the history.',
  },
  unlock: {
    label: 'Why is it unlocked?',
    hint: 'It can then change although names are locked for the label printer. The reason stays in the history.',
  },
}
