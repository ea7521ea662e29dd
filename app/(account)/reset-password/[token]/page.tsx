import type { Metadata } from 'next'
import { notFound } from 'next/navigation'

import { PlainPage } from '@/components/layout/plain-page'
import { ResetPasswordForm } from '@/components/people/reset-password-form'
import { findLink } from '@/lib/people/links'

import { resetPasswordAction } from '../../actions'

export const metadata: Metadata = { title: 'Choose a new password', referrer: 'no-referrer' }

export default async function ResetPasswordPage({ params }: PageProps<'/reset-password/[token]'>) {
  const { token } = await params
  const link = await findLink('reset-password', token)
  if (!link?.person) notFound()
  return (
    <PlainPage homeHref="/">
      <h1 className="mb-6 text-2xl">Choose a new password</h1>
      <ResetPasswordForm
        token={token}
        email={link.person.email}
        resetPassword={resetPasswordAction}
      />
    </PlainPage>
  )
}
