'use client'

import { useState } from 'react'

import { Field } from '@/components/ui/field'
import { Input } from '@/components/ui/input'
import type { ActionResult } from '@/lib/errors'
import type { RequestEmailChangeInput } from '@/lib/people/schema'

import { LetterSent } from './letter-sent'
import { PasswordField } from './password-field'
import { PersonForm } from './person-form'
import { usePersonForm } from './use-person-form'

/** Asks for another address, which is used once it is confirmed there. */
export function EmailForm({
  email,
  request,
}: {
  email: string
  request: (input: RequestEmailChangeInput) => Promise<ActionResult<void>>
}) {
  const [sentTo, setSentTo] = useState<string>()
  const form = usePersonForm<RequestEmailChangeInput, void>({
    schema: () => import('@/lib/people/schema').then((it) => it.requestEmailChangeSchema),
    values: { email: '', password: '' },
    send: request,
    done: (_, input) => setSentTo(input.email),
  })
  if (sentTo) {
    return (
      <LetterSent to={sentTo}>
        <p>
          Confirm the new address with the link in it. Until then you sign in with{' '}
          <span className="break-words">{email}</span>.
        </p>
      </LetterSent>
    )
  }
  return (
    <PersonForm form={form} quiet submit="Change address" pendingLabel="Sending a letter…">
      <p className="break-words text-ink-soft">You sign in with {email}.</p>
      <Field label="New e-mail address" required error={form.errorOf('email')}>
        <Input type="email" autoComplete="email" {...form.register('email')} />
      </Field>
      <PasswordField
        label="Your password"
        error={form.errorOf('password')}
        {...form.register('password')}
      />
    </PersonForm>
  )
}
