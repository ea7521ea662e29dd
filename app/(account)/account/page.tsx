import type { Metadata } from 'next'
import type { ReactNode } from 'react'

import { PlainPage } from '@/components/layout/plain-page'
import { SheetHeader } from '@/components/layout/sheet-header'
import { EmailForm } from '@/components/people/email-form'
import { NameForm } from '@/components/people/name-form'
import { PasswordForm } from '@/components/people/password-form'
import { SessionsList } from '@/components/people/sessions-list'
import { LedgerList } from '@/components/ui/ledger'
import { LinkButton } from '@/components/ui/link-button'
import { TextLink } from '@/components/ui/text-link'
import { ROLE_WORDS } from '@/lib/people/constants'
import { presentSession } from '@/lib/people/present'
import { listSessions } from '@/lib/people/queries'
import { readForPerson } from '@/lib/server/page'

import {
  changeNameAction,
  changePasswordAction,
  endOtherSessionsAction,
  endSessionAction,
  requestEmailChangeAction,
} from './actions'

export const metadata: Metadata = { title: 'Your account' }

export default async function AccountPage() {
  const { person, sessions } = await readForPerson(async (one) => ({
    person: one,
    sessions: (await listSessions(one)).map((row) => presentSession(row, one.sessionId)),
  }))
  const { name, email, hasSecondFactor, memberships } = person
  return (
    <PlainPage wide homeHref="/">
      <SheetHeader title="Your account" meta={email} back={{ href: '/', label: 'Your lines' }} />
      <Part title="Name">
        <NameForm name={name} save={changeNameAction} />
      </Part>
      <Part title="E-mail">
        <EmailForm key={email} email={email} request={requestEmailChangeAction} />
      </Part>
      <Part title="Password">
        <PasswordForm email={email} change={changePasswordAction} />
      </Part>
      <Part title="Second factor">
        <p className="mb-4 max-w-measure text-ink-soft">
          {hasSecondFactor
            ? 'Besides your password, signing in asks for a code of your authenticator.'
            : 'Besides your password, signing in can ask for a code that your telephone shows.'}
        </p>
        <LinkButton href="/account/second-factor">
          {hasSecondFactor ? 'Change second factor' : 'Set up second factor'}
        </LinkButton>
      </Part>
      <Part title="Sessions">
        <SessionsList
          sessions={sessions}
          end={endSessionAction}
          endOthers={endOtherSessionsAction}
        />
      </Part>
      <Part title="Brands">
        {memberships.length === 0 ? (
          <p className="text-ink-soft">You belong to no brand.</p>
        ) : (
          <LedgerList>
            {memberships.map(({ brandSlug, brandName, role }) => (
              <li
                key={brandSlug}
                className="flex flex-wrap items-baseline justify-between gap-x-6 gap-y-1 py-3"
              >
                <p className="min-w-0">
                  <TextLink href={`/${brandSlug}`}>{brandName}</TextLink>
                  <span className="text-ink-faint"> · {ROLE_WORDS[role]}</span>
                </p>
                <TextLink href={`/${brandSlug}/team`}>Leave {brandName}</TextLink>
              </li>
            ))}
          </LedgerList>
        )}
      </Part>
      <Part title="Closing the account">
        <p className="mb-4 max-w-measure text-ink-soft">
          Your name and address go; what you made in a brand that others are of stays there.
        </p>
        <LinkButton href="/account/close">Close your account</LinkButton>
      </Part>
    </PlainPage>
  )
}

/** A part of the page: its title in the margin, where there is one. */
function Part({ title, children }: { title: string; children: ReactNode }) {
  return (
    <section className="grid gap-x-10 gap-y-4 border-t border-hairline py-8 margins:grid-cols-[12rem_minmax(0,1fr)]">
      <h2 className="text-xl">{title}</h2>
      <div className="min-w-0">{children}</div>
    </section>
  )
}
