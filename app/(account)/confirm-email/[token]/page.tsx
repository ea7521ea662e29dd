import type { Metadata } from 'next'
import { notFound } from 'next/navigation'

import { PlainPage } from '@/components/layout/plain-page'
import { ConfirmEmailForm } from '@/components/people/confirm-email-form'
import { findLink } from '@/lib/people/links'

import { confirmEmailChangeAction } from '../../actions'

export const metadata: Metadata = { title: 'Confirm your new address', referrer: 'no-referrer' }

export default async function ConfirmEmailPage({ params }: PageProps<'/confirm-email/[token]'>) {
  const { token } = await params
  const link = await findLink('change-email', token)
  if (!link?.newEmail) notFound()
  return (
    <PlainPage homeHref="/">
      <h1 className="mb-6 text-2xl">Confirm your new address</h1>
      <ConfirmEmailForm token={token} email={link.newEmail} confirm={confirmEmailChangeAction} />
    </PlainPage>
  )
}
