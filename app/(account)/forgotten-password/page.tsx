import type { Metadata } from 'next'

import { PlainPage } from '@/components/layout/plain-page'
import { ForgottenPasswordForm } from '@/components/people/forgotten-password-form'
import { TextLink } from '@/components/ui/text-link'

import { requestPasswordResetAction } from '../actions'

export const metadata: Metadata = { title: 'Forgotten password' }

export default function ForgottenPasswordPage() {
  return (
    <PlainPage homeHref="/">
      <h1 className="mb-6 text-2xl">Forgotten password</h1>
      <ForgottenPasswordForm requestReset={requestPasswordResetAction} />
      <p className="mt-8">
        <TextLink href="/sign-in">Back to signing in</TextLink>
      </p>
    </PlainPage>
  )
}
