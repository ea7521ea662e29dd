'use client'

import { signIn } from 'next-auth/react'

import type { ActionResult } from '@/lib/errors'
import type { ConfirmSignUpInput } from '@/lib/people/schema'

import { PasswordField } from './password-field'
import { PersonForm } from './person-form'
import { usePersonForm } from './use-person-form'

/** Asks for the password that was chosen, makes the account with it, and signs in. */
export function ConfirmSignUpForm({
  token,
  email,
  brandName,
  confirm,
}: {
  token: string
  email: string
  brandName: string
  confirm: (
    input: ConfirmSignUpInput,
  ) => Promise<ActionResult<{ email: string; brandSlug: string }>>
}) {
  const form = usePersonForm<ConfirmSignUpInput, { email: string; brandSlug: string }>({
    schema: () => import('@/lib/people/schema').then((it) => it.confirmSignUpSchema),
    values: { token, password: '' },
    send: confirm,
    done: async ({ brandSlug, ...made }, { password }) => {
      // Signed in or not, the account is made: the brand's page leads to signing in where it must.
      await signIn('credentials', { ...made, password, redirect: false }).catch(() => null)
      const home = `/${brandSlug}`
      // A whole page load, so that nothing rendered for whoever was here before is kept.
      window.location.assign(home)
    },
  })
  return (
    <>
      <p className="mb-6 break-words text-ink-soft">
        {email} for {brandName}. Type the password you chose when you signed up; it shows that it
        was you.
      </p>
      <PersonForm form={form} submit="Confirm address" pendingLabel="Confirming address…">
        <input type="hidden" autoComplete="username" value={email} readOnly />
        <PasswordField error={form.errorOf('password')} {...form.register('password')} />
      </PersonForm>
    </>
  )
}
