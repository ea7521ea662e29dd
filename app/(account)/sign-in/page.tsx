import type { Metadata } from 'next'
import { redirect } from 'next/navigation'

import { PlainPage } from '@/components/layout/plain-page'
import { SignInForm } from '@/components/people/sign-in-form'
import { TextLink } from '@/components/ui/text-link'
import { getPerson } from '@/lib/auth/get-actor'
import { ownAddress } from '@/lib/server/own-address'

export const metadata: Metadata = { title: 'Sign in' }

export default async function SignInPage({ searchParams }: PageProps<'/sign-in'>) {
  const next = ownAddress((await searchParams).next)
  if (await getPerson()) redirect('/')
  return (
    <PlainPage homeHref="/">
      <h1 className="mb-6 text-2xl">Sign in</h1>
      <SignInForm next={next} />
      <div className="mt-8 space-y-2 text-ink-soft">
        <p>
          <TextLink href="/forgotten-password">Forgotten password?</TextLink>
        </p>
        <p>
          New here? <TextLink href="/sign-up">Sign up with your brand</TextLink>
        </p>
      </div>
    </PlainPage>
  )
}
