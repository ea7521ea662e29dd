'use client'

import { signIn } from 'next-auth/react'
import { useState } from 'react'

import { LinkButton } from '@/components/ui/link-button'
import type { ActionResult } from '@/lib/errors'
import type { ConfirmSignUpInput } from '@/lib/people/schema'

import { Done } from './done'
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
  const [done, setDone] = useState(false)
  const form = usePersonForm<ConfirmSignUpInput, { email: string; brandSlug: string }>({
    schema: () => import('@/lib/people/schema').then((it) => it.confirmSignUpSchema),
    values: { token, password: '' },
    send: confirm,
    done: ({ brandSlug, ...made }, { password }) => {
      setDone(true)
      // What stands here meanwhile leads on too, if the connection breaks now.
      void signIn('credentials', { ...made, password, callbackUrl: `/${brandSlug}` }).catch(
        () => undefined,
      )
    },
  })
  if (done) {
    return (
      <Done
        title="Your address is confirmed."
        action={<LinkButton href="/sign-in">Sign in</LinkButton>}
      >
        <p>You are being signed in to {brandName}.</p>
      </Done>
    )
  }
  return (
    <>
      <p className="mb-6 break-words text-ink-soft">
        You signed up {brandName} with {email}. Type the password you chose then: it shows that it
        was you.
      </p>
      <PersonForm form={form} submit="Confirm address" pendingLabel="Confirming address…">
        <input type="hidden" autoComplete="username" value={email} readOnly />
        <PasswordField error={form.errorOf('password')} {...form.register('password')} />
      </PersonForm>
    </>
  )
}
