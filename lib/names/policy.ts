import { allow } from '@/lib/auth/actor'

/** Sees the ideas of a line and what is said of them; the dye house sees approved names only. */
export const canReadNames = allow('owner', 'marketer', 'designer')
/** Writes ideas down, words and places them, and sends them for review. */
export const canDraftNames = allow('owner', 'marketer', 'designer')
/** Sets the label, the print date and the reviewers; locks names and unlocks them. */
export const canRuleNames = allow('owner')
