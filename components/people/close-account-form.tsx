'use client'

import { useState } from 'react'

import { Field } from '@/components/ui/field'
import { Input } from '@/components/ui/input'
import { LinkButton } from '@/components/ui/link-button'
import type { ActionResult } from '@/lib/errors'
import type { CloseAccountInput } from '@/lib/people/schema'

import { Done } from './done'
import { PasswordField } from './password-field'
import { PersonForm } from './person-form'
import { usePersonForm } from './use-person-form'

/** Closes the account; asks for the password, and for the name of each brand that goes with it. */
export function CloseAccountForm({
  removed,
  close,
}: {
  removed: readonly string[]
  close: (input: CloseAccountInput) => Promise<ActionResult<void>>
}) {
  const [done, setDone] = useState(false)
  const form = usePersonForm<CloseAccountInput, void>({
    schema: () => import('@/lib/people/schema').then((it) => it.closeAccountSchema),
    values: { password: '', brandNames: removed.map(() => '') },
    send: close,
    done: () => setDone(true),
  })
  if (done) {
    return (
      <Done
        title="Your account is closed."
        action={<LinkButton href="/">Go to the front door</LinkButton>}
      >
        <p>Thank you for the time you spent here. A last letter says what was removed.</p>
      </Done>
    )
  }
  return (
    <PersonForm form={form} danger submit="Close account" pendingLabel="Closing account…">
      {removed.map((name, at) => (
        <Field
          key={at}
          label={`Type “${name}” to remove it`}
          required
          error={at === 0 ? form.errorOf('brandNames') : undefined}
        >
          <Input autoComplete="off" {...form.register(`brandNames.${at}`)} />
        </Field>
      ))}
      <PasswordField error={form.errorOf('password')} {...form.register('password')} />
    </PersonForm>
  )
}
