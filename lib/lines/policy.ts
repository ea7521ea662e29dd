import { allow } from '@/lib/auth/actor'

/** Everybody in the brand sees its lines. */
export const canReadLines = allow('owner', 'marketer', 'designer', 'dyer')
/** Makes a line. */
export const canCreateLine = allow('owner')
/** Changes what a line is. */
export const canUpdateLine = allow('owner')
