import { redirect } from 'next/navigation'

import { PlainPage } from '@/components/layout/plain-page'
import { EmptyState } from '@/components/ui/states'
import { LinkButton } from '@/components/ui/link-button'
import { SignOutButton } from '@/components/people/sign-out-button'
import { getPerson } from '@/lib/auth/get-actor'

import { signOutAction } from './(studio)/actions'

/** The front door: who is signed in goes on to their brand. */
export default async function FrontDoor() {
  const person = await getPerson()
  const brand = person?.memberships[0]
  if (brand) redirect(`/${brand.brandSlug}`)
  if (person) {
    return (
      <PlainPage>
        <EmptyState
          heading="h1"
          title="You belong to no brand yet"
          action={
            <>
              <LinkButton href="/account">Your account</LinkButton>
              <SignOutButton signOut={signOutAction} />
            </>
          }
        >
          <p>Once a brand’s owner has taken you in, its lines stand here.</p>
        </EmptyState>
      </PlainPage>
    )
  }
  return (
    <PlainPage>
      <h1 className="text-3xl text-balance">From the first photograph to launch day</h1>
      <p className="mt-4 text-ink-soft">
        Woadmap keeps a yarn line together: its shades as measured, the photographs it grew from,
        and the five shades that are each photograph, proved best by CIEDE2000.
      </p>
      <div className="mt-8 flex flex-wrap gap-3">
        <LinkButton href="/sign-in" variant="primary">
          Sign in
        </LinkButton>
        <LinkButton href="/sign-up">Sign up with your brand</LinkButton>
      </div>
    </PlainPage>
  )
}
