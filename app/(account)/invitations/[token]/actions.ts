'use server'

import { redirect } from 'next/navigation'

import { definePersonAction, definePublicAction } from '@/lib/server/define-action'
import { endThisSession } from '@/lib/server/sign-out'
import { acceptInvitation } from '@/lib/team/accept-invitation'
import { joinAsNewPerson } from '@/lib/team/join-as-new-person'
import { acceptInvitationSchema, joinAsNewPersonSchema } from '@/lib/team/schema'

// Afterwards the browser goes to the brand; the invitation it came from is used up.
const terms = { refreshes: false }

export const acceptInvitationAction = definePersonAction(
  'acceptInvitation',
  acceptInvitationSchema,
  acceptInvitation,
  terms,
)

export const joinAsNewPersonAction = definePublicAction(
  'joinAsNewPerson',
  joinAsNewPersonSchema,
  joinAsNewPerson,
  terms,
)

/** Ends the session of this browser and shows the invitation to whoever is then there. */
export async function signOutForInvitationAction(token: string): Promise<never> {
  await endThisSession()
  redirect(`/invitations/${encodeURIComponent(String(token))}`)
}
