import { allow } from '@/lib/auth/actor'

/** Sees who is of the brand, and as what. */
export const canReadTeam = allow('owner', 'marketer', 'designer', 'dyer')
/** Invites, changes roles and removes; sees addresses, invitations and second factors. */
export const canManageTeam = allow('owner')
/** Leaves the brand. */
export const canLeaveBrand = allow('owner', 'marketer', 'designer', 'dyer')
