import type { Metadata } from 'next'

import { PlainPage } from '@/components/layout/plain-page'
import { SheetHeader } from '@/components/layout/sheet-header'
import { CloseAccountForm } from '@/components/people/close-account-form'
import { Notice } from '@/components/ui/notice'
import { TextLink } from '@/components/ui/text-link'
import { listFarewells } from '@/lib/people/queries'
import { readForPerson } from '@/lib/server/page'

import { closeAccountAction } from '../actions'

export const metadata: Metadata = { title: 'Close your account' }

export default async function CloseAccountPage() {
  const farewells = await readForPerson(listFarewells)
  const having = (fate: (typeof farewells)[number]['fate']) =>
    farewells.filter((one) => one.fate === fate)
  const ownerless = having('ownerless')
  const removed = having('removed')
  return (
    <PlainPage homeHref="/">
      <SheetHeader title="Close your account" back={{ href: '/account', label: 'Your account' }} />
      {ownerless.length > 0 ? (
        <Notice kind="warning" title="Your account cannot be closed yet">
          <p>
            You are the last owner of a brand that others are of. Make one of them an owner, or
            remove them, on its team page; then come back.
          </p>
          <ul className="mt-2">
            {ownerless.map(({ brandSlug, brandName }) => (
              <li key={brandSlug}>
                <TextLink href={`/${brandSlug}/team`}>Team of {brandName}</TextLink>
              </li>
            ))}
          </ul>
        </Notice>
      ) : (
        <>
          <div className="mb-6 space-y-3 text-ink-soft">
            <p>
              Your name, your address and your sessions are removed, and cannot be brought back.
            </p>
            {having('stays').map(({ brandSlug, brandName }) => (
              <p key={brandSlug}>
                What you made in {brandName} stays there, under “a former member”.
              </p>
            ))}
            {removed.map(({ brandSlug, brandName }) => (
              <p key={brandSlug} className="font-semibold text-ink">
                Nobody else is of {brandName}: all its lines, shades, photographs and combinations
                are removed with your account.
              </p>
            ))}
          </div>
          <CloseAccountForm
            removed={removed.map(({ brandName }) => brandName)}
            close={closeAccountAction}
          />
        </>
      )}
    </PlainPage>
  )
}
