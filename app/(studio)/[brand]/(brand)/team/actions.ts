'use server'

import { defineAction } from '@/lib/server/define-action'
import { changeRole } from '@/lib/team/change-role'
import { inviteMembers } from '@/lib/team/invite-members'
import { leaveBrand } from '@/lib/team/leave-brand'
import { removeMember } from '@/lib/team/remove-member'
import { resendInvitation } from '@/lib/team/resend-invitation'
import {
  changeRoleSchema,
  invitationIdSchema,
  inviteMembersSchema,
  leaveBrandSchema,
  membershipIdSchema,
} from '@/lib/team/schema'
import { withdrawInvitation } from '@/lib/team/withdraw-invitation'

export const inviteMembersAction = defineAction('inviteMembers', inviteMembersSchema, inviteMembers)

export const resendInvitationAction = defineAction(
  'resendInvitation',
  invitationIdSchema,
  async (actor, input) => {
    await resendInvitation(actor, input)
  },
)

export const withdrawInvitationAction = defineAction(
  'withdrawInvitation',
  invitationIdSchema,
  withdrawInvitation,
)

export const changeRoleAction = defineAction(
  'changeRole',
  changeRoleSchema,
  async (actor, input) => {
    await changeRole(actor, input)
  },
)

export const removeMemberAction = defineAction('removeMember', membershipIdSchema, removeMember)

// The page it is asked from is not open to the person any more.
export const leaveBrandAction = defineAction('leaveBrand', leaveBrandSchema, leaveBrand, {
  refreshes: false,
})
