'use client'

import { useState } from 'react'

import { LinkButton } from '@/components/ui/link-button'
import type { ActionResult } from '@/lib/errors'
import type { ResetPasswordInput } from '@/lib/people/schema'

import { Done } from './done'
import { PasswordField } from './password-field'
import { PersonForm } from './person-form'
import { usePersonForm } from './use-person-form'

/** Takes the new password, and leads on to signing in with it. */
export function ResetPasswordForm({
  token,
  email,
  resetPassword,
}: {
  token: string
  email: string
  resetPassword: (input: ResetPasswordInput) => Promise<ActionResult<void>>
}) {
  const [done, setDone] = useState(false)
  const form = usePersonForm<ResetPasswordInput, void>({
    schema: () => import('@/lib/people/schema').then((it) => it.resetPasswordSchema),
    values: { token, password: '' },
    send: resetPassword,
    done: () => setDone(true),
  })
  if (done) {
    return (
      <Done
        title="Your password is changed."
        action={
          <LinkButton href="/sign-in" variant="primary">
            Sign in
          </LinkButton>
        }
      >
        <p>Wherever you were signed in, you are signed out.</p>
      </Done>
    )
  }
  return (
    <PersonForm form={form} submit="Change password" pendingLabel="Changing password…">
      <input type="hidden" autoComplete="username" value={email} readOnly />
      <PasswordField
        label="New password"
        fresh
        error={form.errorOf('password')}
        {...form.register('password')}
      />
    </PersonForm>
  )
}
