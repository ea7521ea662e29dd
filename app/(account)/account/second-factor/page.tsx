import type { Metadata } from 'next'

import { PlainPage } from '@/components/layout/plain-page'
import { SheetHeader } from '@/components/layout/sheet-header'
import { SecondFactorPanel } from '@/components/people/second-factor-panel'
import { SignOutButton } from '@/components/people/sign-out-button'
import { LinkButton } from '@/components/ui/link-button'
import { Notice } from '@/components/ui/notice'
import { TextLink } from '@/components/ui/text-link'
import { getSecondFactor } from '@/lib/people/get-second-factor'
import { ownAddress } from '@/lib/server/own-address'
import { readForPerson } from '@/lib/server/page'

import { signOutAction } from '../../../(studio)/actions'
import {
  beginSecondFactorAction,
  confirmSecondFactorAction,
  removeSecondFactorAction,
  renewRecoveryCodesAction,
} from './actions'

export const metadata: Metadata = { title: 'Second factor' }

type Place = { name: string; href: string }

const inWords = (places: readonly Place[]) =>
  new Intl.ListFormat('en-GB').format(places.map(({ name }) => name))

export default async function SecondFactorPage({
  searchParams,
}: PageProps<'/account/second-factor'>) {
  const { recovery, next } = await searchParams
  const { email, inUse, begun, codesLeft, requiredBy, otherBrands, decidesIn } =
    await readForPerson(async (person) => ({
      email: person.email,
      ...(await getSecondFactor(person)),
    }))
  const asks = requiredBy.length === 1 ? 'asks' : 'ask'
  const goOn = (
    <div className="mt-4 flex flex-wrap gap-3">
      {[...requiredBy, ...otherBrands].map(({ name, href }) => (
        <LinkButton key={href} href={href}>
          Go to {name}
        </LinkButton>
      ))}
    </div>
  )
  return (
    <PlainPage homeHref="/">
      <div className="print:hidden">
        <SheetHeader title="Second factor" back={{ href: '/account', label: 'Your account' }} />
      </div>
      <div className="mb-6 space-y-5 print:hidden">
        <p className="text-ink-soft">
          A code that your telephone shows, asked for after your password. Who has only your
          password stays outside.
        </p>
        {recovery === 'used' && inUse ? (
          <Notice
            title="You signed in with a recovery code"
            actions={<LinkButton href={ownAddress(next)}>Go on</LinkButton>}
          >
            It is used up. If your authenticator is lost, change it here.
          </Notice>
        ) : null}
        {requiredBy.length > 0 && !inUse ? (
          <Notice kind="warning" title={`${inWords(requiredBy)} ${asks} for a second factor`}>
            <p>
              An owner has decided that everybody signs in with one. Set yours up, and the pages
              open again in this session; nothing there is lost.
            </p>
            {otherBrands.length > 0 ? (
              <p className="mt-2">
                Open meanwhile:{' '}
                {otherBrands.map(({ name, href }, at) => (
                  <span key={href}>
                    {at > 0 ? ', ' : ''}
                    <TextLink href={href}>{name}</TextLink>
                  </span>
                ))}
              </p>
            ) : null}
          </Notice>
        ) : null}
      </div>
      <SecondFactorPanel
        {...{ email, inUse, begun, codesLeft }}
        removable={requiredBy.length === 0}
        actions={{
          begin: beginSecondFactorAction,
          confirm: confirmSecondFactorAction,
          renew: renewRecoveryCodesAction,
          remove: removeSecondFactorAction,
        }}
        onwards={
          <div className="mt-8 space-y-4">
            {requiredBy.length > 0 ? (
              <p className="text-ink-soft">
                {inWords(requiredBy)} {asks} everybody for a second factor, so it cannot be removed.
              </p>
            ) : null}
            {goOn}
            {decidesIn.map(({ name, href }) => (
              <p key={href} className="text-ink-soft">
                <TextLink href={href}>Decide whether {name} requires one</TextLink>
              </p>
            ))}
          </div>
        }
      />
      {/* The quiet button's words, not its edge, stand in line with the page. */}
      <div className="mt-10 -ml-[0.6875rem] print:hidden">
        <SignOutButton signOut={signOutAction} />
      </div>
    </PlainPage>
  )
}
