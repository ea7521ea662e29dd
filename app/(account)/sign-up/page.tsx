import type { Metadata } from 'next'
import { redirect } from 'next/navigation'

import { PlainPage } from '@/components/layout/plain-page'
import { SignUpForm } from '@/components/people/sign-up-form'
import { TextLink } from '@/components/ui/text-link'
import { getPerson } from '@/lib/auth/get-actor'

import { signUpAction } from '../actions'

export const metadata: Metadata = { title: 'Sign up' }

export default async function SignUpPage() {
  if (await getPerson()) redirect('/')
  return (
    <PlainPage homeHref="/">
      <h1 className="mb-6 text-2xl">Sign up with your brand</h1>
      <SignUpForm signUp={signUpAction} />
      <p className="mt-8 text-ink-soft">
        Is your brand here already? Ask its owner to invite you. You have an account?{' '}
        <TextLink href="/sign-in">Sign in</TextLink>
      </p>
    </PlainPage>
  )
}
