/**
 * Where a photograph stands: `pending` (bytes expected in the object store), `waiting` (confirmed,
 * queued), `reading`, `ready`, `failed`.
 */
export const PHOTOGRAPH_STATES = ['pending', 'waiting', 'reading', 'ready', 'failed'] as const
/** One of PHOTOGRAPH_STATES. */
export type PhotographState = (typeof PHOTOGRAPH_STATES)[number]

/** The licence a photograph is used under. */
export const LICENCES = ['own-work', 'permission', 'cc0', 'cc-by', 'other'] as const
/** One of LICENCES. */
export type Licence = (typeof LICENCES)[number]
