import type { Metadata } from 'next'
import { redirect } from 'next/navigation'

import { PlainPage } from '@/components/layout/plain-page'
import { AcceptInvitation } from '@/components/team/accept-invitation'
import { NewPersonForm } from '@/components/team/new-person-form'
import { LinkButton } from '@/components/ui/link-button'
import { Notice } from '@/components/ui/notice'
import { SubmitButton } from '@/components/ui/submit-button'
import { getPerson } from '@/lib/auth/get-actor'
import { readForAnyone } from '@/lib/server/page'
import { presentOffer } from '@/lib/team/present'
import { getOffer } from '@/lib/team/queries'

import {
  acceptInvitationAction,
  joinAsNewPersonAction,
  signOutForInvitationAction,
} from './actions'

export const metadata: Metadata = { title: 'Invitation' }

export default async function InvitationPage({ params }: PageProps<'/invitations/[token]'>) {
  const { token } = await params
  const person = await getPerson()
  const found = await readForAnyone(() => getOffer(person, token))
  if (found.kind === 'joined') redirect(`/${found.brandSlug}`)
  const offer = presentOffer(found)
  const signIn = `/sign-in?next=/invitations/${token}`
  return (
    <PlainPage homeHref="/">
      <h1 className="text-2xl text-balance">Join {offer.brandName}</h1>
      <div className="mt-3 mb-6 space-y-2 text-ink-soft">
        <p>
          {offer.invitedBy} invites you to join {offer.brandName} as {offer.role}.
        </p>
        <p className="break-words">
          The invitation is for {offer.email} and good until {offer.until}.
        </p>
      </div>
      {offer.next === 'join' ? (
        <AcceptInvitation
          token={token}
          brandName={offer.brandName}
          accept={acceptInvitationAction}
        />
      ) : null}
      {offer.next === 'other-account' ? (
        <Notice
          kind="warning"
          title={`You are signed in as ${person!.email}`}
          actions={
            <form action={signOutForInvitationAction.bind(null, token)}>
              <SubmitButton pendingLabel="Signing out…">Sign out and come back here</SubmitButton>
            </form>
          }
        >
          <p>Only {offer.email} can accept this invitation. Sign out first; nothing is lost.</p>
        </Notice>
      ) : null}
      {offer.next === 'sign-in' ? (
        <>
          <p className="mb-4 break-words">{offer.email} has an account. Sign in with it to join.</p>
          <LinkButton href={signIn} variant="primary">
            Sign in
          </LinkButton>
        </>
      ) : null}
      {offer.next === 'new-account' ? (
        <NewPersonForm
          token={token}
          email={offer.email}
          brandName={offer.brandName}
          signInHref={signIn}
          join={joinAsNewPersonAction}
        />
      ) : null}
    </PlainPage>
  )
}
