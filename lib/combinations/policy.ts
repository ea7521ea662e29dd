import { allow } from '@/lib/auth/actor'

/** Sees kept combinations. */
export const canReadCombinations = allow('owner', 'designer', 'marketer')
/** Keeps five shades as a combination. */
export const canKeepCombination = allow('owner', 'designer')
/** Changes a combination's title. */
export const canRenameCombination = allow('owner', 'designer', 'marketer')
/** Changes a combination's places, story and photograph, and begins an empty one. */
export const canEditCombination = allow('owner', 'designer')
/** Moves combinations on the board. */
export const canMoveCombination = allow('owner', 'designer')
/** Deletes a combination, and takes that back. */
export const canDeleteCombination = allow('owner', 'designer')
