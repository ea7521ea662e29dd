import { allow } from '@/lib/auth/actor'

/** Sees in which family a shade stands. */
export const canReadFamilies = allow('owner', 'designer', 'marketer', 'dyer')
/** Sorts, merges, splits and orders families, and moves and pins shades. */
export const canEditFamilies = allow('owner', 'designer')
/** Gives a family its name. */
export const canRenameFamily = allow('owner', 'designer', 'marketer')
