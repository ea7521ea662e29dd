import type { Metadata } from 'next'

import { PlainPage } from '@/components/layout/plain-page'
import { LinkButton } from '@/components/ui/link-button'
import { NotFoundState } from '@/components/ui/states'
import { INVITATION_DAYS } from '@/lib/team/constants'

export const metadata: Metadata = { title: 'Invitation not found' }

export default function InvitationNotFound() {
  return (
    <PlainPage homeHref="/">
      <NotFoundState
        heading="h1"
        title="This invitation is not good any more"
        action={<LinkButton href="/">Go to Woadmap</LinkButton>}
      >
        <p>
          It was used or withdrawn, a newer letter has taken its place, or it is older than{' '}
          {INVITATION_DAYS} days. Ask whoever invited you to send it again.
        </p>
        <p>If you have joined already, sign in as usual.</p>
      </NotFoundState>
    </PlainPage>
  )
}
