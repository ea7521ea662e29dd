import { allow } from '@/lib/auth/actor'

/** Sees the kits of a line, and takes them away. */
export const canReadKits = allow('owner', 'designer', 'marketer')
/** Has a kit built. */
export const canBuildKits = allow('owner', 'designer', 'marketer')
/** Deletes a kit. */
export const canDeleteKits = allow('owner', 'designer', 'marketer')
