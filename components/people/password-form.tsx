'use client'

import { toastDone } from '@/components/ui/toast'
import type { ActionResult } from '@/lib/errors'
import type { ChangePasswordInput } from '@/lib/people/schema'

import { PasswordField } from './password-field'
import { PersonForm } from './person-form'
import { usePersonForm } from './use-person-form'

/** Changes the password of somebody who knows the old one. */
export function PasswordForm({
  email,
  change,
}: {
  email: string
  change: (input: ChangePasswordInput) => Promise<ActionResult<void>>
}) {
  const form = usePersonForm<ChangePasswordInput, void>({
    schema: () => import('@/lib/people/schema').then((it) => it.changePasswordSchema),
    values: { password: '', newPassword: '' },
    send: change,
    done: () => {
      form.reset()
      toastDone('Your password is changed. You are signed out everywhere else.')
    },
  })
  return (
    <PersonForm form={form} quiet submit="Change password" pendingLabel="Changing password…">
      <input type="hidden" autoComplete="username" value={email} readOnly />
      <PasswordField
        label="Current password"
        error={form.errorOf('password')}
        {...form.register('password')}
      />
      <PasswordField
        label="New password"
        fresh
        error={form.errorOf('newPassword')}
        {...form.register('newPassword')}
      />
    </PersonForm>
  )
}
