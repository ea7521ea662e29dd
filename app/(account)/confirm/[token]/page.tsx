import type { Metadata } from 'next'
import { notFound } from 'next/navigation'

import { PlainPage } from '@/components/layout/plain-page'
import { ConfirmSignUpForm } from '@/components/people/confirm-sign-up-form'
import { findSignUp } from '@/lib/people/confirm-sign-up'

import { confirmSignUpAction } from '../../actions'

export const metadata: Metadata = { title: 'Confirm your address', referrer: 'no-referrer' }

export default async function ConfirmSignUpPage({ params }: PageProps<'/confirm/[token]'>) {
  const { token } = await params
  const found = await findSignUp(token)
  if (!found) notFound()
  const { email, brandName } = found
  return (
    <PlainPage homeHref="/">
      <h1 className="mb-6 text-2xl">Confirm your address</h1>
      <ConfirmSignUpForm {...{ token, email, brandName }} confirm={confirmSignUpAction} />
    </PlainPage>
  )
}
