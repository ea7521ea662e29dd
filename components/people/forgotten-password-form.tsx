'use client'

import { useState } from 'react'

import { Field } from '@/components/ui/field'
import { Input } from '@/components/ui/input'
import type { ActionResult } from '@/lib/errors'
import type { RequestPasswordResetInput } from '@/lib/people/schema'

import { LetterSent } from './letter-sent'
import { PersonForm } from './person-form'
import { usePersonForm } from './use-person-form'

/** Asks where to send the link that chooses a new password. */
export function ForgottenPasswordForm({
  requestReset,
}: {
  requestReset: (input: RequestPasswordResetInput) => Promise<ActionResult<void>>
}) {
  const [sentTo, setSentTo] = useState<string>()
  const form = usePersonForm<RequestPasswordResetInput, void>({
    schema: () => import('@/lib/people/schema').then((it) => it.requestPasswordResetSchema),
    values: { email: '' },
    send: requestReset,
    done: (_, { email }) => setSentTo(email),
  })
  if (sentTo) {
    return (
      <LetterSent to={sentTo}>
        <p>With the link in it you choose a new password. Until then the old one stays.</p>
      </LetterSent>
    )
  }
  return (
    <PersonForm form={form} submit="Send a letter" pendingLabel="Sending a letter…">
      <Field
        label="E-mail"
        required
        hint="The address you sign in with. We send a link to it."
        error={form.errorOf('email')}
      >
        <Input type="email" autoComplete="username" {...form.register('email')} />
      </Field>
    </PersonForm>
  )
}
