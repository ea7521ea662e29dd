import type { Metadata } from 'next'

import { Note } from '@/components/layout/note'
import { Sheet } from '@/components/layout/sheet'
import { SheetHeader, SheetSection } from '@/components/layout/sheet-header'
import { Invitations } from '@/components/team/invitations'
import { InviteForm } from '@/components/team/invite-form'
import { LeaveBrandButton } from '@/components/team/leave-brand-button'
import { Members } from '@/components/team/members'
import { TextLink } from '@/components/ui/text-link'
import { ROLES, ROLE_WORDS } from '@/lib/people/constants'
import { readForPage } from '@/lib/server/page'
import { ROLE_HINTS } from '@/lib/team/constants'
import { canManageTeam } from '@/lib/team/policy'
import { presentInvitation, presentMember } from '@/lib/team/present'
import { listInvitations, listMembers } from '@/lib/team/queries'

import {
  changeRoleAction,
  inviteMembersAction,
  leaveBrandAction,
  removeMemberAction,
  resendInvitationAction,
  withdrawInvitationAction,
} from './actions'

export const metadata: Metadata = { title: 'Team' }

export default async function TeamPage({ params }: PageProps<'/[brand]/team'>) {
  const { brand } = await params
  const { actor, members, invitations } = await readForPage(brand, async (one) => {
    const found = await listMembers(one)
    const open = canManageTeam(one) ? await listInvitations(one) : []
    return {
      actor: one,
      members: found.map((member) => presentMember(one, member)),
      invitations: open.map((invitation) => presentInvitation(invitation)),
    }
  })
  const manages = canManageTeam(actor)
  const isOnlyOwner = manages && members.filter(({ role }) => role === 'owner').length === 1
  return (
    <Sheet
      notes={
        <>
          <Note title="Roles">
            <dl className="space-y-2">
              {ROLES.map((role) => (
                <div key={role}>
                  <dt className="font-medium text-ink">{ROLE_WORDS[role]}</dt>
                  <dd>{ROLE_HINTS[role]}</dd>
                </div>
              ))}
            </dl>
            {manages ? null : <p>An owner of {actor.brandName} changes who is in the team.</p>}
          </Note>
          {manages ? (
            <Note title="Signing in">
              <p>
                You can ask a second factor of everybody:{' '}
                <TextLink href={`/${brand}/security`}>how {actor.brandName} signs in</TextLink>.
              </p>
            </Note>
          ) : null}
        </>
      }
    >
      <SheetHeader
        title="Team"
        meta={`${actor.brandName} · ${members.length === 1 ? '1 person' : `${members.length} people`}`}
      />
      <Members
        brand={{ slug: brand, name: actor.brandName }}
        members={members}
        actions={manages ? { changeRole: changeRoleAction, remove: removeMemberAction } : undefined}
      />
      {manages ? (
        <>
          <SheetSection title="Invite people">
            <InviteForm brand={brand} invite={inviteMembersAction} />
          </SheetSection>
          <Invitations
            brand={brand}
            invitations={invitations}
            resend={resendInvitationAction}
            withdraw={withdrawInvitationAction}
          />
        </>
      ) : null}
      <SheetSection title="Leave">
        <LeaveBrandButton
          brand={{ slug: brand, name: actor.brandName }}
          isOnlyOwner={isOnlyOwner}
          leave={leaveBrandAction}
        />
      </SheetSection>
    </Sheet>
  )
}
