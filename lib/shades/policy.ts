import { allow } from '@/lib/auth/actor'

/** Everybody in the brand sees a line's shades and takes them away as CSV. */
export const canReadShades = allow('owner', 'marketer', 'designer', 'dyer')
/** Adds, changes, orders, imports and deletes shades, and takes a deletion back. */
export const canEditShades = allow('owner', 'designer')
